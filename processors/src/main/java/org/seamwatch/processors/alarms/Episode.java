package org.seamwatch.processors.alarms;

import java.time.LocalDate;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * One episode as the data now have it.
 *
 * @param start first signalling day
 * @param lastSignal last signalling day
 * @param end the day that ended it; null while it is open
 * @param statistics statistics that have signalled, in the plan's order
 */
public record Episode(
        LocalDate start, LocalDate lastSignal, @Nullable LocalDate end, List<String> statistics) {

    public Episode {
        statistics = List.copyOf(statistics);
    }
}
