package org.seamwatch.schemas.record;

import java.util.List;

/**
 * How a signal was found.
 *
 * @param statistics what was computed, in words, one for each statistic
 * @param deskFalseAlarmsPerYear what the plan allows the whole desk
 * @param seriesFalseAlarmsPerYear the share of it that this series' limits were set for
 * @param learningDays days that had taught when the day was judged, the fewest of its statistics
 * @param youngLearning whether learning is young: under 120 days
 */
public record Method(
        List<String> statistics,
        double deskFalseAlarmsPerYear,
        double seriesFalseAlarmsPerYear,
        int learningDays,
        boolean youngLearning) {

    public Method {
        statistics = List.copyOf(statistics);
    }
}
