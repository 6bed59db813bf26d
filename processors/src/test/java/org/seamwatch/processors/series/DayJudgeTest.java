package org.seamwatch.processors.series;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.seamwatch.processors.state.VersionedJson;
import org.seamwatch.processors.statistics.DayInput;
import org.seamwatch.processors.watch.SeriesSpec;
import org.seamwatch.processors.watch.TestDesk;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.schemas.plan.HolidayPlan;
import org.seamwatch.schemas.record.SeriesDay;

class DayJudgeTest {

    private static final TestDesk DESK = TestDesk.small().limits(5, 8, 40).days(1, 20, 1);

    private static SeriesSpec spec(Watch watch) {
        return watch.series().values().iterator().next();
    }

    private static SeriesBook book(StageBench bench, SeriesSpec spec) {
        byte[] row = bench.books.get(spec.id() + "|book");
        if (row == null) {
            throw new AssertionError("no book is kept");
        }
        return VersionedJson.read(row, 1, SeriesBook.class);
    }

    /** After any run each day is what judging it once more gives, whether its reading is remembered or computed. */
    @ParameterizedTest
    @CsvSource({
        "1, count, 1, 9",
        "2, eb-rate, 1, 0",
        "3, share-residual, 1, 9",
        "4, share-residual, 7, 0",
        "5, rate, 3, 19"
    })
    void shouldGiveTheSameFromMemoryAndComputedAgain(int seed, String measure, int window, int permutations) {
        Watch watch = DESK.measure(measure, permutations)
                .days(1, 20, window)
                .holidays(new HolidayPlan(LocalDate.of(2024, 2, 10), "R00*,R0404"))
                .watch();
        SeriesSpec spec = spec(watch);
        StageBench bench = new StageBench(watch)
                .takeAll(new RandomFeed(seed, 48, 14).log(2).messages(watch));
        CountBook counts = new CountBook(spec, bench.counts);
        DayBook days = new DayBook(spec.id(), bench.days);
        SeriesBook book = book(bench, spec);
        DayJudge judge = new DayJudge(spec);
        LocalDate last = book.nextDay().minusDays(1);

        int compared = 0;
        for (LocalDate day = book.begins(); !day.isAfter(last); day = day.plusDays(1)) {
            LocalDate d = day;
            DayState before = day.equals(book.begins()) ? null : days.get(day.minusDays(1));
            DayState known = days.get(day);
            assertThat(known).isNotNull();
            long cases = counts.total(day);
            DayState remembered = judge.judge(d, cases, DayJudgeTest::refuse, before, known, Set.of());
            DayState computed = judge.judge(d, cases, () -> counts.input(d, book.begins()), before, known, Set.of(day));
            assertThat(remembered).isEqualTo(computed);
            SeriesDay said = known.day();
            assertThat(computed.day().at(said.revision(), said.closedAt())).isEqualTo(said);
            assertThat(computed.boards()).isEqualTo(known.boards());
            assertThat(computed.episode()).isEqualTo(known.episode());
            compared++;
        }
        assertThat(compared).isGreaterThan(48);
    }

    private static DayInput refuse() {
        throw new AssertionError("a remembered reading must need no counts");
    }

    @Test
    void shouldComputeAgainWhatReadsAChangedDay() {
        Watch watch = DESK.measure("share-residual", 0).watch();
        SeriesSpec spec = spec(watch);
        StageBench bench =
                new StageBench(watch).takeAll(new RandomFeed(6, 48, 5).log(1).messages(watch));
        CountBook counts = new CountBook(spec, bench.counts);
        DayBook days = new DayBook(spec.id(), bench.days);
        LocalDate day = LocalDate.of(2024, 2, 28);
        DayState known = days.get(day);
        DayJudge judge = new DayJudge(spec);
        int[] asked = new int[1];
        for (LocalDate changed :
                List.of(day, day.minusDays(14), day.minusDays(69), day.minusDays(13), day.plusDays(1))) {
            judge.judge(
                    day,
                    counts.total(day),
                    () -> {
                        asked[0]++;
                        return counts.input(day, RandomFeed.FIRST.minusDays(20));
                    },
                    days.get(day.minusDays(1)),
                    known,
                    Set.of(changed));
        }
        assertThat(asked[0]).isEqualTo(3);
    }

    @Test
    void shouldNameUnjudgedRegionsInTheDay() {
        Watch watch = DESK.holidays(new HolidayPlan(LocalDate.of(2024, 2, 10), "R0404,R0000"))
                .watch();
        StageBench bench =
                new StageBench(watch).takeAll(new RandomFeed(7, 40, 2).log(1).messages(watch));

        assertThat(bench.lastDay("2024-02-12").unjudged()).containsExactly("R0000", "R0404");
        assertThat(bench.lastDay("2024-02-13").unjudged()).isEmpty();
        assertThat(bench.lastDay("2024-02-12").regions()).isEqualTo(25);
    }
}
