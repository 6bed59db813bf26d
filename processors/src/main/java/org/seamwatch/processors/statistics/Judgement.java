package org.seamwatch.processors.statistics;

import java.util.List;
import org.jspecify.annotations.Nullable;
import org.seamwatch.schemas.record.ChartDay;
import org.seamwatch.schemas.record.Grade;
import org.seamwatch.schemas.record.LearningDay;

/**
 * What a board says of a usable value.
 *
 * @param learning what was known before, and the score
 * @param charts where the charts stand now
 * @param moved the board with its charts moved on; the value has not taught yet
 */
public record Judgement(LearningDay learning, List<ChartDay> charts, BoardState moved) {

    public Judgement {
        charts = List.copyOf(charts);
    }

    /** The highest grade of the charts; null where there is none. */
    public @Nullable Grade grade() {
        return highest(charts);
    }

    static @Nullable Grade highest(List<ChartDay> charts) {
        return charts.stream().map(ChartDay::grade).max(Enum::compareTo).orElse(null);
    }

    /** Whether a chart is beyond its action limit. */
    public boolean signals() {
        return grade() == Grade.ACTION;
    }
}
