package org.seamwatch.schemas.plan;

import java.util.Collections;
import java.util.List;
import java.util.SortedSet;
import java.util.TreeSet;

/**
 * A plan, with what only its reader knows.
 *
 * @param plan the plan
 * @param given paths of the keys that the file gives, such as {@code series[0].closeAfter}; all others are defaults
 * @param warnings what is odd but not wrong, one line each
 */
public record ReadPlan(Plan plan, SortedSet<String> given, List<String> warnings) {

    public ReadPlan {
        given = Collections.unmodifiableSortedSet(new TreeSet<>(given));
        warnings = List.copyOf(warnings);
    }
}
