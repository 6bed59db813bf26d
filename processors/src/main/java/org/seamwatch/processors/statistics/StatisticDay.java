package org.seamwatch.processors.statistics;

import java.util.List;
import org.jspecify.annotations.Nullable;
import org.seamwatch.schemas.record.ChartDay;
import org.seamwatch.schemas.record.Grade;
import org.seamwatch.schemas.record.LearningDay;
import org.seamwatch.schemas.record.StatisticStatus;

/**
 * What an emitted day says of a statistic, whichever that is.
 *
 * @param status whether it was usable
 * @param value its value; null where it was not usable
 * @param learning what was known; null where it was not usable
 * @param charts where its charts stood
 */
public record StatisticDay(
        StatisticStatus status,
        @Nullable Double value,
        @Nullable LearningDay learning,
        List<ChartDay> charts) {

    public StatisticDay {
        charts = List.copyOf(charts);
    }

    /** The highest grade of its charts; null where there is none. */
    public @Nullable Grade grade() {
        return Judgement.highest(charts);
    }
}
