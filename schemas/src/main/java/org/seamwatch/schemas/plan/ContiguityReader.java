package org.seamwatch.schemas.plan;

import java.util.List;
import org.jspecify.annotations.Nullable;

/** Reads {@code contiguity}: a word, or one key with a number. */
final class ContiguityReader {

    private static final String FORMS = "edge, corner, { nearest: 5 } or { within: 40km }";

    private ContiguityReader() {}

    static ContiguityRule read(@Nullable YamlValue value) {
        if (value == null) {
            return new ContiguityRule.Edge();
        }
        if (value.isScalar()) {
            return value.word("contiguity", List.of("edge", "corner")).equals("edge")
                    ? new ContiguityRule.Edge()
                    : new ContiguityRule.Corner();
        }
        YamlMap map = value.map().only(List.of("nearest", "within"));
        if (map.values().size() != 1) {
            throw value.rule("must be " + FORMS + ", has " + map.values().size() + " rules");
        }
        YamlValue nearest = map.get("nearest");
        return nearest == null
                ? new ContiguityRule.Within(map.required("within").kilometres())
                : new ContiguityRule.Nearest(nearest.integer(1, 1000));
    }
}
