package org.seamwatch.processors.series;

import java.time.LocalDate;
import java.util.Arrays;
import java.util.HashMap;
import java.util.Map;
import java.util.SortedMap;
import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.flow.Cases;
import org.seamwatch.processors.state.Shelf;
import org.seamwatch.processors.statistics.DayInput;
import org.seamwatch.processors.watch.SeriesSpec;

/** The counts of a series, day by day, as arrays in the order of its regions. */
final class CountBook {

    private final SeriesSpec spec;
    private final Shelf rows;
    private final Map<LocalDate, double[]> arrays = new HashMap<>();

    CountBook(SeriesSpec spec, Shelf rows) {
        this.spec = spec;
        this.rows = rows;
    }

    private String key(LocalDate day) {
        return spec.id() + "|" + day;
    }

    DayCounts get(LocalDate day) {
        byte @Nullable [] row = rows.get(key(day));
        return row == null ? new DayCounts() : DayCounts.from(row);
    }

    void put(LocalDate day, DayCounts counts) {
        rows.put(key(day), counts.row());
        arrays.remove(day);
    }

    void remove(LocalDate day) {
        rows.remove(key(day));
    }

    /** Adds a change to a day; whether it changes any count. */
    boolean add(LocalDate day, SortedMap<String, Cases> change, boolean closed) {
        DayCounts counts = get(day);
        boolean changed = counts.add(change, closed);
        put(day, counts);
        return changed;
    }

    /** Forgets the arrays of a close. */
    void rest() {
        arrays.clear();
    }

    /** Cases of each region on a day. Not to be changed. */
    double[] on(LocalDate day) {
        return arrays.computeIfAbsent(day, d -> {
            double[] cases = new double[spec.regions().size()];
            get(d).cells().forEach((region, cell) -> {
                int i = spec.ground().index(region);
                if (i >= 0) {
                    cases[i] = cell.count();
                }
            });
            return cases;
        });
    }

    /** Cases of each region over days, both included. */
    double[] over(LocalDate from, LocalDate to) {
        double[] sum = new double[spec.regions().size()];
        for (LocalDate day = from; !day.isAfter(to); day = day.plusDays(1)) {
            double[] cases = on(day);
            for (int i = 0; i < sum.length; i++) {
                sum[i] += cases[i];
            }
        }
        return sum;
    }

    /** Cases of each region over the days that shares are taken from. */
    double[] history(LocalDate day, LocalDate begins) {
        return over(historyFrom(day, begins), day.minusDays(DayInput.HISTORY_TO));
    }

    private static LocalDate historyFrom(LocalDate day, LocalDate begins) {
        LocalDate from = day.minusDays(DayInput.HISTORY_FROM);
        return from.isBefore(begins) ? begins : from;
    }

    /** What statistics of a day are computed from. */
    DayInput input(LocalDate day, LocalDate begins) {
        LocalDate from = historyFrom(day, begins);
        LocalDate to = day.minusDays(DayInput.HISTORY_TO);
        int days = Math.toIntExact(Math.max(0, to.toEpochDay() - from.toEpochDay() + 1));
        return new DayInput(
                day, over(day.minusDays(spec.plan().windowDays() - 1L), day), over(from, to), days, spec.unjudged(day));
    }

    /** Cases of the geography on a day, regions that left the plan not counted. */
    long total(LocalDate day) {
        return (long) Arrays.stream(on(day)).sum();
    }
}
