package org.seamwatch.processors.watch;

import java.time.LocalDate;
import java.time.ZoneId;
import java.util.List;
import java.util.function.Predicate;
import org.seamwatch.processors.statistics.Statistic;
import org.seamwatch.schemas.geography.Geography;
import org.seamwatch.schemas.geography.Region;
import org.seamwatch.schemas.geography.Regions;
import org.seamwatch.schemas.plan.HolidayPlan;
import org.seamwatch.schemas.plan.SeriesPlan;

/**
 * One series, made ready.
 *
 * @param id {@code geography/condition}
 * @param condition the condition
 * @param plan how it is watched
 * @param geography where
 * @param ground contiguity and populations of its regions
 * @param budget false alarms a year
 * @param statistics what is computed, in the plan's order
 * @param keepDays days before the last closed one that late reports may still reach
 * @param hash of what it learns from beside the log, in hexadecimal digits
 */
public record SeriesSpec(
        String id,
        String condition,
        SeriesPlan plan,
        Geography geography,
        Ground ground,
        Budget budget,
        List<Statistic> statistics,
        int keepDays,
        String hash) {

    /** A holiday and so many days after it are not judged. */
    private static final int DAYS_AFTER_HOLIDAY = 2;

    public SeriesSpec {
        statistics = List.copyOf(statistics);
    }

    public ZoneId zone() {
        return geography.plan().timeZone();
    }

    public List<Region> regions() {
        return geography.regions();
    }

    /** Regions that cannot be judged on a day, in the order of the geography. */
    public boolean[] unjudged(LocalDate day) {
        boolean[] unjudged = new boolean[regions().size()];
        for (HolidayPlan holiday : plan.holidays()) {
            if (!day.isBefore(holiday.day()) && !day.isAfter(holiday.day().plusDays(DAYS_AFTER_HOLIDAY))) {
                Predicate<String> theirs = Regions.pattern(holiday.regions());
                for (int i = 0; i < unjudged.length; i++) {
                    unjudged[i] |= theirs.test(regions().get(i).id());
                }
            }
        }
        return unjudged;
    }
}
