package org.seamwatch.processors.intake;

import java.time.LocalDate;
import java.util.SortedMap;
import java.util.TreeMap;
import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.flow.Cases;
import org.seamwatch.processors.flow.SeriesMessage.DayChange;
import org.seamwatch.processors.state.ByteReader;
import org.seamwatch.processors.state.ByteWriter;
import org.seamwatch.processors.state.Shelf;

/**
 * The differences of the partition's present hour, summed by series, day and region. Since a series applies an hour
 * only when it has passed, nothing is lost by sending its sum at its end, and far less is sent.
 */
final class HourTally {

    private static final int VERSION = 1;

    private final Shelf rows;

    HourTally(Shelf rows) {
        this.rows = rows;
    }

    void add(Contribution where, String region, Cases cases) {
        if (cases.isNone()) {
            return;
        }
        String key = where.series() + "|" + where.day() + "|" + region;
        byte @Nullable [] row = rows.get(key);
        Cases sum = row == null ? cases : cases.plus(read(row));
        if (sum.isNone()) {
            rows.remove(key);
        } else {
            rows.put(
                    key,
                    new ByteWriter(VERSION)
                            .number(sum.count())
                            .number(sum.preliminary())
                            .bytes());
        }
    }

    /** Sends the sums of the hour, one message for each day of a series, and starts anew. */
    void end(long hour, int partition, IntakeOutput out) {
        SortedMap<String, SortedMap<String, Cases>> days = new TreeMap<>();
        rows.visit((key, row) -> {
            int cut = key.lastIndexOf('|');
            days.computeIfAbsent(key.substring(0, cut), k -> new TreeMap<>()).put(key.substring(cut + 1), read(row));
            rows.remove(key);
        });
        days.forEach((seriesDay, cells) -> {
            int cut = seriesDay.lastIndexOf('|');
            String series = seriesDay.substring(0, cut);
            LocalDate day = LocalDate.parse(seriesDay.substring(cut + 1));
            out.toSeries(series, new DayChange(series, hour, partition, day, cells));
        });
    }

    private static Cases read(byte[] row) {
        ByteReader in = new ByteReader(row, VERSION);
        return new Cases(in.number(), in.number());
    }
}
