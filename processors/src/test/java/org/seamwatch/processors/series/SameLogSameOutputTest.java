package org.seamwatch.processors.series;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.seamwatch.processors.flow.SeriesMessage;
import org.seamwatch.processors.intake.Say;
import org.seamwatch.processors.state.MemoryShelf;
import org.seamwatch.processors.state.Shelf;
import org.seamwatch.processors.watch.TestDesk;
import org.seamwatch.processors.watch.Watch;

/** The same log gives the same bytes, whatever the order in which its partitions are read. */
class SameLogSameOutputTest {

    private static final TestDesk DESK =
            TestDesk.small().limits(5, 8, 40).days(1, 12, 1).measure("share-residual", 9);
    private static final Watch WATCH = DESK.watch();

    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3, 4})
    void shouldNotDependOnTheOrderOfPartitionsNorOnRestarts(int seed) {
        List<List<SeriesMessage>> streams = new RandomFeed(seed, 45, 20).log(4).messages(WATCH);
        List<String> expected = new StageBench(WATCH).takeAll(streams).lines;
        for (int mix = 0; mix < 2; mix++) {
            StageBench mixed = new StageBench(WATCH).takeMixed(streams, new Random(100 * seed + mix), WATCH);
            assertThat(mixed.lines).isEqualTo(expected);
        }
        Collections.reverse(streams);
        assertThat(new StageBench(WATCH).takeAll(streams).lines)
                .isEqualTo(expected)
                .hasSizeGreaterThan(500);
    }

    @ParameterizedTest
    @ValueSource(ints = {1, 2})
    void shouldNotDependOnTheNumberOfInputPartitions(int seed) {
        RandomFeed feed = new RandomFeed(seed, 45, 20);
        List<String> one = new StageBench(WATCH).takeAll(feed.log(1).messages(WATCH)).lines;
        List<String> five = new StageBench(WATCH).takeAll(feed.log(5).messages(WATCH)).lines;
        assertThat(five).isEqualTo(one);
    }

    @Test
    void shouldNotDependOnHowSeriesAreSharedOut() {
        Watch watch = DESK.conditions("influenza", "norovirus", "mumps").watch();
        List<String> names = List.of("influenza", "norovirus", "mumps");
        List<List<SeriesMessage>> streams = new RandomFeed(5, 40, 8)
                .log(
                        2,
                        say -> say.with(
                                "condition", names.get(Math.floorMod(say.id().hashCode(), 3))))
                .messages(watch);
        List<String> together = new ArrayList<>(new StageBench(watch).takeAll(streams).lines);
        List<String> apart = new ArrayList<>();
        for (String name : names) {
            StageBench task = new StageBench(watch, series -> series.endsWith(name));
            streams.forEach(stream -> stream.stream()
                    .filter(m -> !(m instanceof SeriesMessage.DayChange c)
                            || c.series().endsWith(name))
                    .forEach(task::accept));
            apart.addAll(task.lines);
        }
        Collections.sort(together);
        Collections.sort(apart);
        assertThat(apart).isEqualTo(together).hasSizeGreaterThan(500);
    }

    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3})
    void shouldCountLateChangesBeyondRevisionToo(int seed) {
        RandomFeed feed = new RandomFeed(seed, 45, 38);
        StageBench bench = new StageBench(WATCH).takeAll(feed.log(2).messages(WATCH));
        assertThat(bench.lastCounts()).isEqualTo(feed.finalCounts());
    }

    /** Rows that a year of days leaves behind are removed, and no result misses them. */
    @Test
    void shouldLetOldRowsGoWithoutAnyResultChanging() {
        Watch watch = TestDesk.small()
                .limits(5, 8, 40)
                .days(1, 6, 7)
                .measure("share-residual", 0)
                .watch();
        List<List<SeriesMessage>> streams = new RandomFeed(9, 150, 33).log(1).messages(watch);
        StageBench bench = new StageBench(watch).takeAll(streams);
        StageBench hoarder =
                new StageBench(watch, series -> true, new MemoryShelf(), new Hoard(), new Hoard()).takeAll(streams);

        assertThat(bench.lines).isEqualTo(hoarder.lines).hasSizeGreaterThan(1_000);
        int keep = watch.series().values().iterator().next().keepDays();
        assertThat(keep).isEqualTo(6 + 69 + 7 + 7);
        assertThat(bench.days.rows("")).hasSize(keep);
        assertThat(bench.counts.rows("").size()).isLessThanOrEqualTo(keep + 3);
        assertThat(bench.pending.rows("")).isEmpty();
        assertThat(hoarder.days.rows("").size()).isGreaterThan(150);
    }

    @Test
    void shouldNotDependOnTheOrderOfAShelfsRows() {
        List<List<SeriesMessage>> streams = new RandomFeed(2, 45, 20).log(4).messages(WATCH);
        StageBench backwards = new StageBench(WATCH, series -> true, new Backwards(), new Backwards(), new Backwards());

        assertThat(backwards.takeAll(streams).lines).isEqualTo(new StageBench(WATCH).takeAll(streams).lines);
    }

    private static class Wrapped implements Shelf {

        private final MemoryShelf rows = new MemoryShelf();

        @Override
        public byte @Nullable [] get(String key) {
            return rows.get(key);
        }

        @Override
        public void put(String key, byte[] value) {
            rows.put(key, value);
        }

        @Override
        public void remove(String key) {
            rows.remove(key);
        }

        @Override
        public List<Row> rows(String prefix) {
            return rows.rows(prefix);
        }

        @Override
        public void visit(RowVisitor visitor) {
            rows("").forEach(row -> visitor.row(row.key(), row.value()));
        }
    }

    /** A shelf that keeps everything. */
    private static final class Hoard extends Wrapped {

        @Override
        public void remove(String key) {}
    }

    /** A shelf that gives its rows from the last to the first. */
    private static final class Backwards extends Wrapped {

        @Override
        public List<Row> rows(String prefix) {
            List<Row> rows = super.rows(prefix);
            Collections.reverse(rows);
            return rows;
        }
    }

    @Test
    void shouldWaitUntilEveryPartitionHasPassedAnHour() {
        Watch watch = TestDesk.small().from("2024-02-03").watch();
        TestLog log = new TestLog(2);
        log.clock("2024-02-03T00:00:00Z");
        log.say("2024-02-03T12:00:00Z", Say.of("r-1", "R0000", "2024-02-03"));
        log.clock("2024-02-05T00:00:00Z");
        List<List<SeriesMessage>> streams = log.messages(watch);

        StageBench bench = new StageBench(watch);
        bench.takeAll(streams.subList(0, 2));
        assertThat(bench.lines).isEmpty();
        List<SeriesMessage> last = streams.get(2);
        bench.accept(last.get(0));
        assertThat(bench.lines).isEmpty();
        bench.accept(last.get(1));
        assertThat(bench.lines).hasSize(2).allMatch(line -> line.contains(" 2024-02-05T00:00:00Z "));
    }
}
