package org.seamwatch.processors.intake;

import java.time.Instant;
import java.time.LocalDate;
import java.util.List;
import org.seamwatch.processors.watch.SeriesSpec;
import org.seamwatch.processors.watch.Watch;

/**
 * How far back reports are known: the longest time of revision of a report's series plus 30 days, against the
 * partition's time. Decided from log and plan alone; rows may be removed later.
 */
final class Horizon {

    private static final int EXTRA_DAYS = 30;

    private final Watch watch;

    Horizon(Watch watch) {
        this.watch = watch;
    }

    /** Whether every day a report counts in lies beyond the horizon. Series that left the plan do not keep it. */
    boolean isBeyond(List<Contribution> contributions, long time) {
        int longest = 0;
        for (Contribution c : contributions) {
            SeriesSpec spec = watch.series().get(c.series());
            longest = spec == null ? longest : Math.max(longest, spec.plan().reviseForDays());
        }
        Instant now = Instant.ofEpochMilli(time);
        for (Contribution c : contributions) {
            SeriesSpec spec = watch.series().get(c.series());
            if (spec == null) {
                continue;
            }
            LocalDate oldest = now.atZone(spec.zone()).toLocalDate().minusDays(longest + (long) EXTRA_DAYS);
            if (!c.day().isBefore(oldest)) {
                return false;
            }
        }
        return true;
    }
}
