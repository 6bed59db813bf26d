package org.seamwatch.processors.series;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.seamwatch.processors.alarms.AlarmState;
import org.seamwatch.processors.watch.TestDesk;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.schemas.record.AlarmChange;
import org.seamwatch.schemas.record.Change;

/** Whatever way reports take, what is known in the end is what the final reports alone say. */
class FinalReportsPropertyTest {

    private static final String SERIES = "gridland/influenza";
    private static final int DAYS = 48;
    /** Reports are at most so late; with a day moved back by two, all changes arrive within 20 days. */
    private static final int LONGEST_DELAY = 14;

    private static final TestDesk DESK = TestDesk.small().limits(5, 8, 40).days(1, 20, 1);

    private static final List<Watch> WATCHES = List.of(
            DESK.measure("count", 9).watch(),
            DESK.measure("eb-rate", 0).watch(),
            DESK.measure("share-residual", 9).watch(),
            DESK.measure("rate", 0).days(1, 20, 3).watch(),
            DESK.measure("count", 0).from("2024-01-20").days(2, 21, 7).watch());

    static Stream<Arguments> cases() {
        Stream.Builder<Arguments> cases = Stream.builder();
        for (int seed = 0; seed < 60; seed++) {
            cases.add(Arguments.of(seed, seed % WATCHES.size()));
        }
        return cases.build();
    }

    @ParameterizedTest(name = "seed {0}, plan {1}")
    @MethodSource("cases")
    void shouldEndWhereAColdStartOnTheFinalReportsEnds(int seed, int plan) {
        Watch watch = WATCHES.get(plan);
        RandomFeed feed = new RandomFeed(seed, DAYS, LONGEST_DELAY);
        TestLog log = feed.log(1 + seed % 3);
        StageBench live = new StageBench(watch).takeMixed(log.messages(watch), new Random(seed), watch);
        StageBench cold = new StageBench(watch).takeAll(feed.finals(2).messages(watch));

        assertThat(log.rejected).isEmpty();
        assertThat(live.lastCounts()).isEqualTo(feed.finalCounts());
        assertThat(cold.lastCounts()).isEqualTo(feed.finalCounts());
        assertThat(live.lastDays()).isEqualTo(cold.lastDays());
        assertThat(episodes(live)).isEqualTo(episodes(cold));
        assertConsistent(live);
        assertConsistent(cold);
    }

    /** Start, last signal, end and statistics of all alarms that stand. */
    private static List<List<Object>> episodes(StageBench bench) {
        List<List<Object>> episodes = new ArrayList<>();
        for (AlarmState a : bench.alarms(SERIES)) {
            if (!a.withdrawn()) {
                episodes.add(List.of(a.start(), a.lastSignal(), String.valueOf(a.end()), a.statistics()));
            }
        }
        episodes.sort((a, b) -> a.get(0).toString().compareTo(b.get(0).toString()));
        return episodes;
    }

    /** Sequences have no gaps, the newest change is the state that is kept, and changes of days have no gaps either. */
    private static void assertConsistent(StageBench bench) {
        Map<String, AlarmChange> last = new TreeMap<>();
        for (AlarmChange change : bench.alarms) {
            AlarmChange before = last.put(change.alarm(), change);
            assertThat(change.sequence()).isEqualTo(before == null ? 1 : before.sequence() + 1);
            assertThat(before == null).isEqualTo(change.change() == Change.RAISED && change.sequence() == 1);
            if (before != null && (before.change() == Change.WITHDRAWN || before.change() == Change.ENDED)) {
                assertThat(change.change()).isIn(Change.RAISED, Change.STRENGTHENED, Change.WITHDRAWN);
            }
        }
        for (AlarmState state : bench.alarms(SERIES)) {
            AlarmChange change = last.get(state.id());
            assertThat(change).isNotNull();
            assertThat(change.sequence()).isEqualTo(state.sequence());
            assertThat(change.change() == Change.WITHDRAWN).isEqualTo(state.withdrawn());
            assertThat(change.change() == Change.ENDED).isEqualTo(!state.withdrawn() && state.end() != null);
        }
        Map<String, Integer> revisions = new TreeMap<>();
        bench.seriesDays.forEach(d ->
                assertThat(d.revision()).isEqualTo(revisions.merge(d.day().toString(), 0, (old, zero) -> old + 1)));
    }

    /** The property says something only where things happen. */
    @Test
    void shouldHaveRevisionsAndEveryKindOfAlarmChangeInItsCases() {
        List<Change> changes = new ArrayList<>();
        int revised = 0;
        int usable = 0;
        for (int seed = 0; seed < 10; seed++) {
            Watch watch = WATCHES.get(seed % WATCHES.size());
            StageBench live = new StageBench(watch)
                    .takeAll(new RandomFeed(seed, DAYS, LONGEST_DELAY).log(2).messages(watch));
            live.alarms.forEach(a -> changes.add(a.change()));
            revised +=
                    (int) live.seriesDays.stream().filter(d -> d.revision() > 0).count();
            usable += (int) live.seriesDays.stream()
                    .filter(d -> d.moran() != null && d.moran().i() != null)
                    .count();
        }
        assertThat(changes).contains(Change.RAISED, Change.ENDED, Change.WITHDRAWN);
        assertThat(revised).isGreaterThan(1_000);
        assertThat(usable).isGreaterThan(1_000);
    }
}
