package org.seamwatch.processors.series;

import java.time.Instant;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.function.Predicate;
import org.seamwatch.processors.flow.SeriesMessage;
import org.seamwatch.processors.flow.SeriesMessage.DayChange;
import org.seamwatch.processors.flow.SeriesMessage.Response;
import org.seamwatch.processors.flow.SeriesMessage.Watermark;
import org.seamwatch.processors.flow.SeriesMessageCodec;
import org.seamwatch.processors.state.Shelf;
import org.seamwatch.processors.watch.SeriesSpec;
import org.seamwatch.processors.watch.Watch;

/**
 * One task of the series stage. What intake sends waits for its hour; an hour is applied when every input partition has
 * passed it, whatever the order in which things came.
 */
public final class SeriesStage {

    private static final int HOUR_DIGITS = 12;

    private static final Comparator<Response> RESPONSE_ORDER =
            Comparator.comparingInt(Response::partition).thenComparingLong(Response::offset);

    private final Watch watch;
    private final Predicate<String> mine;
    private final SeriesShelves shelves;
    private final SeriesOutput out;
    private final Progress progress;
    private final SortedMap<String, SeriesKeeper> keepers = new TreeMap<>();

    /**
     * A stage over its stores.
     *
     * @param mine whether a series, by id, belongs to this task
     */
    public SeriesStage(Watch watch, Predicate<String> mine, SeriesShelves shelves, SeriesOutput out) {
        this.watch = watch;
        this.mine = mine;
        this.shelves = shelves;
        this.out = out;
        this.progress = new Progress(shelves.progress());
    }

    /** Takes the next message. */
    public void accept(SeriesMessage message) {
        if (message instanceof Watermark mark) {
            progress.take(mark);
            applyPassedHours();
            progress.save();
        } else if (message instanceof DayChange change) {
            hold(change.hour(), "c|" + change.series() + "|" + change.day() + "|" + change.partition(), change);
        } else if (message instanceof Response response) {
            hold(response.hour(), "r|" + response.partition() + "|" + response.offset(), response);
        }
    }

    private void hold(long hour, String rest, SeriesMessage message) {
        if (progress.hasBegun() && hour <= progress.applied()) {
            throw new IllegalStateException("a message must not be of an hour applied already, was of " + hour
                    + " after " + progress.applied());
        }
        shelves.pending().put(prefix(hour) + rest, SeriesMessageCodec.write(message));
    }

    private static String prefix(long hour) {
        String digits = Long.toString(hour);
        return "0".repeat(HOUR_DIGITS - digits.length()) + digits + "|";
    }

    private void applyPassedHours() {
        if (!progress.hasBegun()) {
            return;
        }
        long passed = progress.passed();
        for (long hour = progress.applied() + 1; hour <= passed; hour++) {
            apply(hour);
            progress.applied(hour);
        }
    }

    private void apply(long hour) {
        openKeepers();
        List<Shelf.Row> rows = shelves.pending().rows(prefix(hour));
        Map<String, SeriesKeeper> touched = new HashMap<>();
        List<Response> responses = new ArrayList<>();
        for (Shelf.Row row : rows) {
            SeriesMessage message = SeriesMessageCodec.read(row.value());
            if (message instanceof DayChange change) {
                SeriesKeeper keeper = keepers.get(change.series());
                if (keeper != null) {
                    keeper.apply(change);
                    touched.put(change.series(), keeper);
                }
            } else if (message instanceof Response response) {
                responses.add(response);
            }
            shelves.pending().remove(row.key());
        }
        responses.sort(RESPONSE_ORDER);
        for (Response response : responses) {
            SeriesKeeper keeper = keepers.get(response.series());
            if (keeper != null) {
                keeper.apply(response);
                touched.put(response.series(), keeper);
            }
        }
        keepers.forEach((id, keeper) -> {
            boolean closed = keeper.close(hour);
            if (closed || touched.containsKey(id)) {
                keeper.save();
            }
        });
    }

    private void openKeepers() {
        if (!keepers.isEmpty()) {
            return;
        }
        Instant logStart = Instant.ofEpochMilli(progress.logStart());
        for (SeriesSpec spec : watch.series().values()) {
            if (mine.test(spec.id())) {
                keepers.put(spec.id(), SeriesKeeper.open(watch, spec, shelves, out, logStart));
            }
        }
    }
}
