package org.seamwatch.processors.spatial;

import java.util.List;
import java.util.stream.Collectors;

/** The measures a plan can name. */
public final class Measures {

    private static final List<Measure> ALL =
            List.of(new CountMeasure(), new RateMeasure(), new EbRateMeasure(), new ShareResidualMeasure());

    private Measures() {}

    /** The names known, in a fixed order. */
    public static List<String> names() {
        return ALL.stream().map(Measure::name).toList();
    }

    /**
     * The measure of this name.
     *
     * @throws IllegalArgumentException naming the known ones, where there is none
     */
    public static Measure named(String name) {
        return ALL.stream()
                .filter(measure -> measure.name().equals(name))
                .findFirst()
                .orElseThrow(() -> new IllegalArgumentException("measure must be one of "
                        + names().stream().collect(Collectors.joining(", ")) + ", was " + name));
    }
}
