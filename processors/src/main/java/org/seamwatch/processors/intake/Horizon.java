package org.seamwatch.processors.intake;

import java.time.LocalDate;
import java.util.ArrayList;
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
    private final LocalDays days = new LocalDays();

    Horizon(Watch watch) {
        this.watch = watch;
    }

    /**
     * The contributions whose day lies within the horizon; the others are neither made nor taken back. None where the
     * report is too old. Those to series that left the plan are dropped.
     */
    List<Contribution> within(List<Contribution> contributions, long time) {
        int longest = 0;
        for (Contribution c : contributions) {
            SeriesSpec spec = watch.series().get(c.series());
            longest = spec == null ? longest : Math.max(longest, spec.plan().reviseForDays());
        }
        List<Contribution> within = new ArrayList<>(contributions.size());
        for (Contribution c : contributions) {
            SeriesSpec spec = watch.series().get(c.series());
            if (spec != null && !c.day().isBefore(oldest(time, spec, longest))) {
                within.add(c);
            }
        }
        return within;
    }

    private LocalDate oldest(long time, SeriesSpec spec, int reviseForDays) {
        return days.at(time, spec.zone()).minusDays(reviseForDays + (long) EXTRA_DAYS);
    }
}
