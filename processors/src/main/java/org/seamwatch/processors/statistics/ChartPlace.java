package org.seamwatch.processors.statistics;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.charts.ChartState;

/**
 * Where a chart stands.
 *
 * @param state what the chart remembers
 * @param began first day since the chart last stood at its centre; null at the centre
 */
public record ChartPlace(ChartState state, @Nullable LocalDate began) {

    ChartPlace moved(ChartState next, LocalDate day) {
        if (next.runDays() == 0) {
            return new ChartPlace(next, null);
        }
        return new ChartPlace(next, next.runDays() == 1 || began == null ? day : began);
    }
}
