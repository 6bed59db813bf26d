package org.seamwatch.processors.spatial;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.function.Predicate;
import java.util.stream.Stream;
import org.assertj.core.data.Offset;
import org.seamwatch.fixtures.reference.ReferenceEntry;
import org.seamwatch.fixtures.reference.ReferenceValues;

/** Reads reference entries as this package's arguments, and holds the tolerances they are compared at. */
final class Reference {

    /**
     * Relative, for I and its variances: both sides are sums of at most some thousands of terms in double precision, and
     * the file prints fifteen digits.
     */
    static final double RELATIVE = 1e-9;

    /** Absolute, where the expected value is near zero and a relative tolerance would ask for more digits than exist. */
    static final double NEAR_ZERO = 1e-12;

    private Reference() {}

    static Stream<ReferenceEntry> entries(String family, Predicate<ReferenceEntry> chosen) {
        return ReferenceValues.all(family).stream().filter(chosen);
    }

    static Offset<Double> relative(double expected) {
        return Offset.offset(Math.max(NEAR_ZERO, RELATIVE * Math.abs(expected)));
    }

    /** Binary, row-standardised or general weights, as the entry says. */
    static Weights weights(ReferenceEntry entry) {
        if (entry.hasInput("weights")) {
            return Weights.of(entry.neighbours(), rows(entry.input().path("weights")));
        }
        String style = entry.input().path("weights_style").asText();
        return style.equals("W") ? Weights.rowStandardised(entry.neighbours()) : Weights.binary(entry.neighbours());
    }

    private static double[][] rows(JsonNode lists) {
        double[][] rows = new double[lists.size()][];
        for (int i = 0; i < rows.length; i++) {
            rows[i] = new double[lists.get(i).size()];
            for (int k = 0; k < rows[i].length; k++) {
                rows[i][k] = lists.get(i).get(k).asDouble();
            }
        }
        return rows;
    }
}
