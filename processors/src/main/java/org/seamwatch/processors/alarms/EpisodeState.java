package org.seamwatch.processors.alarms;

import com.fasterxml.jackson.annotation.JsonIgnore;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * The episode of a series after a day: a function of the data alone. An episode begins with a signalling day and ends
 * after 7 consecutive days on which all its statistics are usable and inside their action limits; days that cannot be
 * judged neither count nor end it.
 *
 * @param start first signalling day; null where there is no episode
 * @param lastSignal last signalling day so far
 * @param end the day that ended it, on that day; null while it is open
 * @param statistics statistics that have signalled, in the plan's order
 * @param quiet days inside since the last signal
 */
public record EpisodeState(
        @Nullable LocalDate start,
        @Nullable LocalDate lastSignal,
        @Nullable LocalDate end,
        List<String> statistics,
        int quiet) {

    /** So many days inside end an episode. */
    public static final int QUIET_DAYS = 7;

    public static final EpisodeState NONE = new EpisodeState(null, null, null, List.of(), 0);

    public EpisodeState {
        statistics = List.copyOf(statistics);
    }

    /** Whether an episode is under way after the day. */
    @JsonIgnore
    public boolean isOpen() {
        return start != null && end == null;
    }

    /** Whether the day ended an episode. */
    public boolean hasEnded() {
        return end != null;
    }

    /**
     * The state after the next day.
     *
     * @param signals one for each statistic, in the plan's order
     */
    public EpisodeState next(LocalDate day, List<Signal> signals) {
        EpisodeState before = isOpen() ? this : NONE;
        if (signals.stream().anyMatch(Signal::beyond)) {
            LocalDate from = before.start == null ? day : before.start;
            return new EpisodeState(from, day, null, before.joined(signals), 0);
        }
        if (!before.isOpen() || !signals.stream().allMatch(before::isInside)) {
            return before;
        }
        int days = quiet + 1;
        return new EpisodeState(start, lastSignal, days == QUIET_DAYS ? day : null, statistics, days);
    }

    private boolean isInside(Signal signal) {
        return signal.usable() || !statistics.contains(signal.statistic());
    }

    private List<String> joined(List<Signal> signals) {
        List<String> all = new ArrayList<>();
        for (Signal s : signals) {
            if (s.beyond() || statistics.contains(s.statistic())) {
                all.add(s.statistic());
            }
        }
        return all;
    }
}
