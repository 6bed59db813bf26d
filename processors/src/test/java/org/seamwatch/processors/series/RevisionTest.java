package org.seamwatch.processors.series;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.Instant;
import java.time.LocalDate;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.seamwatch.processors.intake.Say;
import org.seamwatch.processors.watch.TestDesk;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.schemas.record.MoranDay;
import org.seamwatch.schemas.record.RegionDay;
import org.seamwatch.schemas.record.SeriesDay;

class RevisionTest {

    private static final String SERIES = "gridland/influenza";
    private static final LocalDate FIRST = LocalDate.of(2024, 2, 1);

    private final TestLog log = new TestLog(1).clock("2024-02-01T00:00:00Z");
    private int reports;

    /** A report at the hour of an instant. */
    private void say(String time, String region, LocalDate day, int count) {
        log.say(
                time,
                Say.of("r-" + reports++, region, day.toString()).count(count).at(Instant.parse(time)));
    }

    /** Cases of a day, uneven and different from day to day, reported at its noon. */
    private void ordinary(int day) {
        LocalDate date = FIRST.plusDays(day);
        for (int i = 0; i < 10; i++) {
            say(date + "T12:00:00Z", TestDesk.region((i * 7 + day) % 5, i % 5), date, 1 + (i * i + 3 * day) % 7);
        }
        log.clock(date + "T23:00:00Z");
    }

    private StageBench run(TestDesk desk) {
        Watch watch = desk.watch();
        StageBench bench = new StageBench(watch).takeAll(log.messages(watch));
        assertThat(log.rejected).isEmpty();
        return bench;
    }

    private static RegionDay regionDay(String region, LocalDate day, long count, int revision) {
        return new RegionDay(1, SERIES, region, day, count, revision);
    }

    @Test
    void shouldSayWhatChangedWithTheNextCloseAndNothingElse() {
        TestDesk desk = TestDesk.small().from("2024-02-01");
        say("2024-02-01T12:00:00Z", "R0000", FIRST, 4);
        say("2024-02-01T12:00:00Z", "R0101", FIRST, 2);
        log.clock("2024-02-04T09:00:00Z");
        say("2024-02-04T09:30:00Z", "R0101", FIRST, 3);
        log.clock("2024-02-04T12:00:00Z").clock("2024-02-06T00:00:00Z");
        StageBench bench = run(desk);

        assertThat(bench.regionDays)
                .containsExactly(
                        regionDay("R0000", FIRST, 4, 0),
                        regionDay("R0101", FIRST, 2, 0),
                        regionDay("R0101", FIRST, 5, 1));
        assertThat(bench.revisions("2024-02-01"))
                .extracting(d -> d.revision() + " " + d.closedAt() + " " + d.cases())
                .containsExactly("0 2024-02-03T00:00:00Z 6", "1 2024-02-05T00:00:00Z 9");
        assertThat(bench.revisions("2024-02-02")).hasSize(1);
        assertThat(bench.lines.get(0)).startsWith("region-days 2024-02-03T00:00:00Z ");
    }

    @Test
    void shouldSayZeroOnlyWhereItWasNotZeroBefore() {
        Say wrong = Say.of("w", "R0202", "2024-02-01").count(3);
        log.say("2024-02-01T12:00:00Z", wrong);
        Say neverSeen = Say.of("n", "R0303", "2024-02-01").count(5);
        log.say("2024-02-01T12:00:00Z", neverSeen);
        log.say("2024-02-01T14:00:00Z", neverSeen.revision(1).status("withdrawn"));
        log.clock("2024-02-03T10:00:00Z");
        log.say("2024-02-03T10:30:00Z", wrong.revision(1).status("withdrawn"));
        log.clock("2024-02-04T00:00:00Z");
        log.say("2024-02-04T10:30:00Z", wrong.revision(2).status("withdrawn").with("source", "lab-2"));
        log.clock("2024-02-06T00:00:00Z");
        StageBench bench = run(TestDesk.small().from("2024-02-01"));

        assertThat(bench.regionDays).containsExactly(regionDay("R0202", FIRST, 3, 0), regionDay("R0202", FIRST, 0, 1));
        assertThat(bench.revisions("2024-02-01")).hasSize(2);
    }

    @Test
    void shouldNotReviseADayWhenAReportOnlyBecomesFinal() {
        Say early = Say.of("p", "R0202", "2024-02-01").count(3).status("preliminary");
        log.say("2024-02-01T12:00:00Z", early);
        log.clock("2024-02-03T10:00:00Z");
        log.say("2024-02-03T10:30:00Z", early.revision(1).status("final"));
        log.clock("2024-02-06T00:00:00Z");
        StageBench bench = run(TestDesk.small().from("2024-02-01"));

        assertThat(bench.regionDays).hasSize(1);
        assertThat(bench.seriesDays).allMatch(d -> d.revision() == 0);
    }

    @Test
    void shouldReviseTheLaterDaysWhoseScoreAnEarlierDayMoves() {
        for (int day = 0; day < 12; day++) {
            ordinary(day);
        }
        say("2024-02-12T23:30:00Z", "R0000", FIRST.plusDays(8), 40);
        log.clock("2024-02-14T00:00:00Z");
        StageBench bench = run(TestDesk.small().from("2024-02-01"));

        assertThat(bench.revisions("2024-02-08")).hasSize(1);
        assertThat(bench.revisions("2024-02-09")).hasSize(2);
        assertThat(bench.revisions("2024-02-10")).hasSize(2);
        SeriesDay before = bench.revisions("2024-02-10").get(0);
        SeriesDay after = bench.revisions("2024-02-10").get(1);
        assertThat(after.cases()).isEqualTo(before.cases());
        assertThat(moran(after).i()).isEqualTo(moran(before).i());
        assertThat(moran(after).learning()).isNotEqualTo(moran(before).learning());
        assertThat(bench.regionDays("2024-02-10")).allMatch(d -> d.revision() == 0);
    }

    private static MoranDay moran(SeriesDay day) {
        MoranDay moran = day.moran();
        if (moran == null) {
            throw new AssertionError("no moran on " + day.day());
        }
        return moran;
    }

    @Test
    void shouldChangeRegionDaysOnlyBeyondTheTimeOfRevision() {
        TestDesk desk = TestDesk.small().days(1, 3, 1).from("2024-02-01");
        for (int day = 0; day < 10; day++) {
            ordinary(day);
        }
        say("2024-02-10T23:30:00Z", "R0404", FIRST.plusDays(2), 9);
        log.clock("2024-02-12T00:00:00Z");
        say("2024-02-12T12:30:00Z", "R0404", FIRST.plusDays(2), 1);
        log.clock("2024-02-13T00:00:00Z");
        StageBench bench = run(desk);

        assertThat(bench.revisions("2024-02-03")).hasSize(1);
        long base = bench.regionDays("2024-02-03").stream()
                .filter(d -> d.region().equals("R0404") && d.revision() == 0)
                .mapToLong(RegionDay::count)
                .sum();
        assertThat(bench.regionDays("2024-02-03"))
                .filteredOn(d -> d.revision() > 0)
                .containsExactly(
                        regionDay("R0404", FIRST.plusDays(2), base + 9, 1),
                        regionDay("R0404", FIRST.plusDays(2), base + 10, 2));
    }

    @Test
    void shouldNumberALateRegionDayOneAboveItsSeriesDay() {
        TestDesk desk = TestDesk.small().days(1, 3, 1).from("2024-02-01");
        for (int day = 0; day < 12; day++) {
            ordinary(day);
            if (day == 11) {
                // Within the time of revision: the score of the day after moves too, its counts do not.
                say("2024-02-12T23:30:00Z", "R0000", FIRST.plusDays(8), 40);
            }
        }
        log.clock("2024-02-16T10:00:00Z");
        say("2024-02-16T10:30:00Z", "R0404", FIRST.plusDays(9), 9);
        log.clock("2024-02-17T00:00:00Z");
        StageBench bench = run(desk);

        assertThat(bench.lastDay("2024-02-10").revision()).isEqualTo(1);
        assertThat(bench.regionDays("2024-02-10"))
                .filteredOn(d -> d.revision() > 0)
                .extracting(d -> d.region() + " " + d.revision())
                .containsExactly("R0404 2");
    }

    /** 11 February is counted anew too late to be judged again; the days that read it and are judged again later see it. */
    @Test
    void shouldJudgeADayAgainOnTheCountsAsTheyNowStand() {
        TestDesk desk = TestDesk.small().days(1, 6, 1).from("2024-02-01").measure("share-residual", 0);
        for (int day = 0; day < 40; day++) {
            ordinary(day);
        }
        say("2024-03-11T12:30:00Z", "R0404", FIRST.plusDays(10), 200);
        log.clock("2024-03-12T00:00:00Z");
        // After that close 6 March is dirty, and the days up to the 9th, judged before it, are judged again.
        say("2024-03-12T12:30:00Z", "R0404", LocalDate.of(2024, 3, 6), 1);
        log.clock("2024-03-14T00:00:00Z");
        StageBench late = run(desk);

        RevisionTest inTime = new RevisionTest();
        for (int day = 0; day < 40; day++) {
            if (day == 10) {
                inTime.say("2024-02-11T10:00:00Z", "R0404", FIRST.plusDays(10), 200);
            }
            inTime.ordinary(day);
            if (day == 34) {
                inTime.say("2024-03-06T23:10:00Z", "R0404", LocalDate.of(2024, 3, 6), 1);
            }
        }
        inTime.log.clock("2024-03-14T00:00:00Z");
        StageBench cold = inTime.run(desk);

        for (String day : List.of("2024-03-06", "2024-03-07", "2024-03-08", "2024-03-09", "2024-03-10")) {
            assertThat(moran(late.lastDay(day)).i())
                    .isNotNull()
                    .isEqualTo(moran(cold.lastDay(day)).i());
        }
        assertThat(late.revisions("2024-03-08")).hasSize(2);
        assertThat(late.revisions("2024-03-05")).hasSize(1);
    }

    @Test
    void shouldOnlyCountDaysBeforeTheBeginning() {
        say("2024-02-03T12:00:00Z", "R0101", FIRST, 3);
        log.clock("2024-02-05T00:00:00Z");
        say("2024-02-05T12:00:00Z", "R0101", FIRST, 1);
        log.clock("2024-02-06T00:00:00Z").clock("2024-02-07T00:00:00Z");
        StageBench bench = run(TestDesk.small().from("2024-02-03"));

        assertThat(bench.seriesDays)
                .extracting(d -> d.day().toString())
                .containsExactly("2024-02-03", "2024-02-04", "2024-02-05");
        assertThat(bench.regionDays).containsExactly(regionDay("R0101", FIRST, 3, 0), regionDay("R0101", FIRST, 4, 1));
    }

    @Test
    void shouldReviseTheFirstDaysWhoseWindowReachesBeforeTheBeginning() {
        say("2024-02-03T12:00:00Z", "R0101", LocalDate.of(2024, 2, 3), 3);
        log.clock("2024-02-05T12:00:00Z");
        say("2024-02-05T12:30:00Z", "R0404", FIRST, 5);
        log.clock("2024-02-07T00:00:00Z");
        StageBench bench = run(TestDesk.small().from("2024-02-03").days(1, 28, 3));

        assertThat(bench.revisions("2024-02-03")).hasSize(2);
        assertThat(moran(bench.revisions("2024-02-03").get(1)).i())
                .isNotEqualTo(moran(bench.revisions("2024-02-03").get(0)).i());
    }
}
