package org.seamwatch.processors.learning;

import java.time.LocalDate;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * What learning knows after a day: plain immutable data, equal by value.
 *
 * @param days usable values that have taught
 * @param regression the regression of the values on those before them
 * @param lags the previous usable values
 * @param lastDay day of the newest value, taught or waiting; null before the first
 * @param waiting values kept out of learning so far by an open alarm, in day order
 */
public record LearningState(
        int days,
        Regression regression,
        Lags lags,
        @Nullable LocalDate lastDay,
        List<WaitingDay> waiting) {

    public LearningState {
        if (days < 0) {
            throw new IllegalArgumentException("days must be at least 0, were " + days);
        }
        waiting = List.copyOf(waiting);
    }
}
