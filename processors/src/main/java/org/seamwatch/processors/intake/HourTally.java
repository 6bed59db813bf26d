package org.seamwatch.processors.intake;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.concurrent.TimeUnit;
import org.seamwatch.processors.flow.Cases;
import org.seamwatch.processors.flow.SeriesMessage.DayChange;
import org.seamwatch.processors.state.ByteReader;
import org.seamwatch.processors.state.ByteWriter;
import org.seamwatch.processors.state.Shelf;

/**
 * The differences of the partition's present hour, summed by series, day and region. Since a series applies an hour
 * only when it has passed, nothing is lost by sending its sum at its end, and far less is sent. A row says which hour
 * it is of; it is left lying after that, for most are written again within days, and swept when it is some days old.
 */
final class HourTally {

    private static final int VERSION = 2;

    /** Rows without an hour, which were removed with it. */
    private static final int OF_PRESENT_HOUR = 1;

    private static final long KEPT_HOURS = TimeUnit.DAYS.toHours(3);

    private static final Comparator<Contribution> ORDER =
            Comparator.comparing(Contribution::series).thenComparing(Contribution::day);

    private final Shelf rows;
    private final Map<Contribution, Map<String, Cases>> days = new HashMap<>();
    private final List<String> withoutHour = new ArrayList<>();
    private long lastSweep;

    /**
     * Takes the present hour up from its rows.
     *
     * @param hour the present hour; any where there are no rows
     */
    HourTally(Shelf rows, long hour) {
        this.rows = rows;
        this.lastSweep = sweepOf(hour);
        rows.visit((key, row) -> load(hour, key, row));
    }

    /** The number of the sweep that comes with the end of an hour. */
    private static long sweepOf(long hour) {
        return Math.floorDiv(hour, KEPT_HOURS);
    }

    private void load(long hour, String key, byte[] row) {
        boolean old = row[0] == OF_PRESENT_HOUR;
        ByteReader in = new ByteReader(row, old ? OF_PRESENT_HOUR : VERSION);
        if (old) {
            withoutHour.add(key);
        } else if (in.number() != hour) {
            return;
        }
        String[] parts = key.split("\\|", -1);
        Contribution where = new Contribution(parts[0], LocalDate.parse(parts[1]));
        cells(where).put(parts[2], new Cases(in.number(), in.number()));
    }

    private Map<String, Cases> cells(Contribution where) {
        return days.computeIfAbsent(where, k -> new HashMap<>());
    }

    /** Adds to an hour, which is the present one until it ends. */
    void add(long hour, Contribution where, String region, Cases cases) {
        if (cases.isNone()) {
            return;
        }
        String key = where.series() + "|" + where.day() + "|" + region;
        Map<String, Cases> cells = cells(where);
        Cases sum = cells.merge(region, cases, Cases::plus);
        if (sum.isNone()) {
            cells.remove(region);
            rows.remove(key);
        } else {
            rows.put(key, row(hour, sum));
        }
    }

    private static byte[] row(long hour, Cases sum) {
        return new ByteWriter(VERSION)
                .number(hour)
                .number(sum.count())
                .number(sum.preliminary())
                .bytes();
    }

    /** Sends the sums of the hour, one message for each day of a series that changed, and starts anew. */
    void end(long hour, int partition, IntakeOutput out) {
        days.entrySet().stream().sorted(Map.Entry.comparingByKey(ORDER)).forEach(day -> {
            Contribution where = day.getKey();
            SortedMap<String, Cases> cells = new TreeMap<>(day.getValue());
            if (!cells.isEmpty()) {
                out.toSeries(where.series(), new DayChange(where.series(), hour, partition, where.day(), cells));
            }
        });
        days.clear();
        withoutHour.forEach(rows::remove);
        withoutHour.clear();
        if (sweepOf(hour) != lastSweep) {
            lastSweep = sweepOf(hour);
            sweep(hour - KEPT_HOURS);
        }
    }

    private void sweep(long oldest) {
        rows.visit((key, row) -> {
            if (new ByteReader(row, VERSION).number() < oldest) {
                rows.remove(key);
            }
        });
    }
}
