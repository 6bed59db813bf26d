package org.seamwatch.processors.series;

import java.util.SortedMap;
import java.util.TreeMap;
import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.flow.Hours;
import org.seamwatch.processors.flow.SeriesMessage.Watermark;
import org.seamwatch.processors.state.ByteReader;
import org.seamwatch.processors.state.ByteWriter;
import org.seamwatch.processors.state.Shelf;

/** How far the input partitions are, and the last hour applied. */
final class Progress {

    private static final int VERSION = 1;
    private static final String KEY = "progress";

    private record Place(long passedHour, long firstTimestamp) {}

    private final Shelf rows;
    private final SortedMap<String, Place> places = new TreeMap<>();
    private int expected;
    private long applied;
    private boolean begun;

    Progress(Shelf rows) {
        this.rows = rows;
        byte @Nullable [] row = rows.get(KEY);
        if (row != null) {
            ByteReader in = new ByteReader(row, VERSION);
            expected = in.integer();
            begun = in.integer() == 1;
            applied = in.number();
            for (int n = in.integer(); n > 0; n--) {
                places.put(in.text(), new Place(in.number(), in.number()));
            }
        }
    }

    void save() {
        ByteWriter out = new ByteWriter(VERSION).number(expected).number(begun ? 1 : 0);
        out.number(applied).number(places.size());
        places.forEach((key, p) -> out.text(key).number(p.passedHour()).number(p.firstTimestamp()));
        rows.put(KEY, out.bytes());
    }

    /** Takes a promise; once every input partition has made one, hours can be applied. */
    void take(Watermark mark) {
        expected = mark.sizes().caseReports() + mark.sizes().alarmResponses();
        places.merge(
                mark.topic() + "|" + mark.partition(),
                new Place(mark.passedHour(), mark.firstTimestamp()),
                (old, now) -> now.passedHour() > old.passedHour() ? now : old);
        if (!begun && isComplete()) {
            begun = true;
            applied = Hours.of(logStart()) - 1;
        }
    }

    private boolean isComplete() {
        return expected > 0 && places.size() == expected;
    }

    boolean hasBegun() {
        return begun;
    }

    /** The first timestamp of the log, milliseconds since 1970. */
    long logStart() {
        return places.values().stream()
                .mapToLong(Place::firstTimestamp)
                .min()
                .orElseThrow(() -> new IllegalStateException("no input partition is known"));
    }

    /** The last hour that every input partition has passed. */
    long passed() {
        return places.values().stream()
                .mapToLong(Place::passedHour)
                .min()
                .orElseThrow(() -> new IllegalStateException("no input partition is known"));
    }

    /** The last hour applied. */
    long applied() {
        return applied;
    }

    void applied(long hour) {
        applied = hour;
    }
}
