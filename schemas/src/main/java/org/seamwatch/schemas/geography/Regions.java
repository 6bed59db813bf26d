package org.seamwatch.schemas.geography;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.Predicate;
import java.util.regex.Pattern;

/** Names sets of regions by patterns: ids with {@code *} for any characters, commas between patterns. */
public final class Regions {

    private Regions() {}

    /** Whether an id matches one of the patterns. Empty patterns match nothing. */
    public static Predicate<String> pattern(String patterns) {
        List<Pattern> compiled = new ArrayList<>();
        for (String pattern : patterns.split(",", -1)) {
            if (!pattern.isBlank()) {
                compiled.add(compile(pattern.strip()));
            }
        }
        return id -> compiled.stream().anyMatch(pattern -> pattern.matcher(id).matches());
    }

    private static Pattern compile(String pattern) {
        List<String> literals = Arrays.stream(pattern.split("\\*+", -1))
                .map(literal -> literal.isEmpty() ? "" : Pattern.quote(literal))
                .toList();
        return Pattern.compile(String.join(".*", literals), Pattern.DOTALL);
    }
}
