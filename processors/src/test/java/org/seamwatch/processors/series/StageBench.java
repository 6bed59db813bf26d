package org.seamwatch.processors.series;

import java.time.Instant;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.function.Predicate;
import org.seamwatch.processors.alarms.AlarmState;
import org.seamwatch.processors.flow.SeriesMessage;
import org.seamwatch.processors.state.MemoryShelf;
import org.seamwatch.processors.state.Shelf;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.schemas.json.Json;
import org.seamwatch.schemas.record.AlarmChange;
import org.seamwatch.schemas.record.RegionDay;
import org.seamwatch.schemas.record.SeriesDay;

/** A task of the series stage with its stores, and all it sends. */
final class StageBench implements SeriesOutput {

    final MemoryShelf progress = new MemoryShelf();
    final Shelf pending;
    final Shelf counts;
    final Shelf days;
    final MemoryShelf books = new MemoryShelf();
    final List<RegionDay> regionDays = new ArrayList<>();
    final List<SeriesDay> seriesDays = new ArrayList<>();
    final List<AlarmChange> alarms = new ArrayList<>();
    /** Everything sent, with its time. */
    final List<String> lines = new ArrayList<>();

    private final Predicate<String> mine;
    private SeriesStage stage;

    StageBench(Watch watch) {
        this(watch, series -> true);
    }

    StageBench(Watch watch, Predicate<String> mine) {
        this(watch, mine, new MemoryShelf(), new MemoryShelf(), new MemoryShelf());
    }

    StageBench(Watch watch, Predicate<String> mine, Shelf pending, Shelf counts, Shelf days) {
        this.pending = pending;
        this.mine = mine;
        this.counts = counts;
        this.days = days;
        this.stage = open(watch);
    }

    private SeriesStage open(Watch watch) {
        return new SeriesStage(watch, mine, new SeriesShelves(progress, pending, counts, days, books), this);
    }

    /** Goes on with what the stores hold, maybe under another plan. */
    void restart(Watch watch) {
        stage = open(watch);
    }

    void accept(SeriesMessage message) {
        stage.accept(message);
    }

    /** Takes one partition after the other. */
    StageBench takeAll(List<List<SeriesMessage>> streams) {
        streams.forEach(stream -> stream.forEach(stage::accept));
        return this;
    }

    /** Takes the partitions mixed at random, each in its own order, with a restart now and then. */
    StageBench takeMixed(List<List<SeriesMessage>> streams, Random random, Watch watch) {
        int[] next = new int[streams.size()];
        List<Integer> open = new ArrayList<>();
        for (int i = 0; i < next.length; i++) {
            open.add(i);
        }
        while (!open.isEmpty()) {
            int at = random.nextInt(open.size());
            int stream = open.get(at);
            for (int run = 1 + random.nextInt(30);
                    run > 0 && next[stream] < streams.get(stream).size();
                    run--) {
                stage.accept(streams.get(stream).get(next[stream]++));
            }
            if (next[stream] == streams.get(stream).size()) {
                open.remove(at);
            }
            if (random.nextInt(10) == 0) {
                restart(watch);
            }
        }
        return this;
    }

    /** The last count of each region and day, those that are zero left out. */
    SortedMap<String, Long> lastCounts() {
        SortedMap<String, Long> last = new TreeMap<>();
        regionDays.forEach(d -> last.put(d.key(), d.count()));
        last.values().removeIf(count -> count == 0);
        return last;
    }

    /** The last revision of each day, without revision and closing time. */
    SortedMap<String, SeriesDay> lastDays() {
        SortedMap<String, SeriesDay> last = new TreeMap<>();
        seriesDays.forEach(d -> last.put(d.series() + "|" + d.day(), d.at(0, Instant.EPOCH)));
        return last;
    }

    SeriesDay lastDay(String day) {
        List<SeriesDay> revisions = revisions(day);
        return revisions.get(revisions.size() - 1);
    }

    List<SeriesDay> revisions(String day) {
        return seriesDays.stream()
                .filter(d -> d.day().equals(LocalDate.parse(day)))
                .toList();
    }

    List<RegionDay> regionDays(String day) {
        return regionDays.stream()
                .filter(d -> d.day().equals(LocalDate.parse(day)))
                .toList();
    }

    /** The alarms as the stage keeps them. */
    List<AlarmState> alarms(String series) {
        return List.copyOf(new AlarmShelf(series, books).states());
    }

    @Override
    public void regionDay(RegionDay day, long timestamp) {
        regionDays.add(day);
        line("region-days", day, timestamp);
    }

    @Override
    public void seriesDay(SeriesDay day, long timestamp) {
        seriesDays.add(day);
        line("series-days", day, timestamp);
    }

    @Override
    public void alarm(AlarmChange change, long timestamp) {
        alarms.add(change);
        line("alarms", change, timestamp);
    }

    private void line(String topic, Object record, long timestamp) {
        lines.add(topic + " " + Instant.ofEpochMilli(timestamp) + " " + Json.line(record));
    }
}
