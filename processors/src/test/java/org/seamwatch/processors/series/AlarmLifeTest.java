package org.seamwatch.processors.series;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.seamwatch.processors.alarms.AlarmState;
import org.seamwatch.processors.intake.Say;
import org.seamwatch.processors.state.VersionedJson;
import org.seamwatch.processors.watch.TestDesk;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.schemas.record.AlarmChange;
import org.seamwatch.schemas.record.Change;
import org.seamwatch.schemas.record.Grade;
import org.seamwatch.schemas.record.MoranDay;
import org.seamwatch.schemas.record.SeriesDay;

/** Alarms through the whole stage: raised by a corner that rises, answered, ended, and what that does to learning. */
class AlarmLifeTest {

    private static final String SERIES = "gridland/influenza";
    private static final LocalDate FIRST = LocalDate.of(2024, 1, 1);
    private static final TestDesk DESK =
            TestDesk.small().from("2024-01-01").limits(5, 28, 6).measure("count", 0);

    private final TestLog log = new TestLog(1).clock("2024-01-01T00:00:00Z");

    /** A day of scattered cases, with many in a corner of six squares where it is high. */
    private void day(int n, boolean high) {
        LocalDate day = FIRST.plusDays(n);
        say(n, high, day + "T12:00:00Z", 0);
        log.clock(day + "T23:00:00Z");
    }

    private void say(int n, boolean high, String time, int revision) {
        for (int column = 0; column < 5; column++) {
            for (int row = 0; row < 5; row++) {
                int scattered = Math.floorMod((column * 31 + row * 17 + n * 7) * 2654435, 97) % 6;
                int count = scattered + (high && column < 2 && row < 3 ? 12 : 0);
                String day = FIRST.plusDays(n).toString();
                Say say = Say.of("r" + n + column + row, TestDesk.region(column, row), day);
                log.say(time, say.count(count).revision(revision));
            }
        }
    }

    private void days(int from, int to, boolean high) {
        for (int n = from; n < to; n++) {
            day(n, high);
        }
    }

    private StageBench run() {
        Watch watch = DESK.watch();
        return new StageBench(watch).takeAll(log.messages(watch));
    }

    private static MoranDay moran(SeriesDay day) {
        MoranDay moran = day.moran();
        if (moran == null) {
            throw new AssertionError("no moran on " + day.day());
        }
        return moran;
    }

    private static int learned(StageBench bench, int n) {
        MoranDay moran = moran(bench.lastDay(FIRST.plusDays(n).toString()));
        if (moran.learning() == null) {
            throw new AssertionError("nothing learned by " + n);
        }
        return moran.learning().days();
    }

    @Test
    void shouldRaiseOnceAndEndAfterTheSignal() {
        days(0, 60, false);
        days(60, 66, true);
        days(66, 100, false);
        StageBench bench = run();

        assertThat(bench.alarms).extracting(AlarmChange::change).containsExactly(Change.RAISED, Change.ENDED);
        AlarmChange raised = bench.alarms.get(0);
        assertThat(raised.alarm()).isEqualTo(SERIES + "/" + raised.day());
        assertThat(raised.day()).isBetween(FIRST.plusDays(60), FIRST.plusDays(65));
        assertThat(raised.statistics()).containsExactly("moran");
        assertThat(moran(bench.lastDay(raised.day().toString())).charts().get(0).grade())
                .isEqualTo(Grade.ACTION);
        AlarmState state = bench.alarms(SERIES).get(0);
        assertThat(bench.alarms.get(1).day()).isEqualTo(state.end());
        assertThat(state.lastSignal().plusDays(7)).isEqualTo(state.end());
    }

    /** Days of an open alarm, the seven inside at its end too, teach when it ends if 18 or fewer waited. */
    @ParameterizedTest
    @CsvSource({"4, true", "26, false"})
    void shouldLetDaysOfAShortAlarmTeachAndKeepThoseOfALongOneOut(int high, boolean teach) {
        days(0, 60, false);
        days(60, 60 + high, true);
        days(60 + high, 130, false);
        StageBench bench = run();

        assertThat(bench.alarms).extracting(AlarmChange::change).containsExactly(Change.RAISED, Change.ENDED);
        AlarmState state = bench.alarms(SERIES).get(0);
        int start = Math.toIntExact(state.start().toEpochDay() - FIRST.toEpochDay());
        LocalDate end = state.end();
        assertThat(end).isNotNull();
        int last = Math.toIntExact(end.toEpochDay() - FIRST.toEpochDay());
        int waited = last - start + 1;
        assertThat(waited <= 18).isEqualTo(teach);
        int atStart = learned(bench, start);
        for (int n = start; n <= last; n++) {
            assertThat(learned(bench, n)).isEqualTo(atStart);
        }
        assertThat(learned(bench, last + 1)).isEqualTo(atStart + (teach ? waited : 0));
        assertThat(learned(bench, last + 2)).isEqualTo(atStart + (teach ? waited : 0) + 1);
    }

    @Test
    void shouldWithdrawWhenTheReportsBehindItAreCorrected() {
        days(0, 60, false);
        days(60, 63, true);
        for (int n = 60; n < 63; n++) {
            say(n, false, "2024-03-07T12:00:00Z", 1);
        }
        log.clock("2024-03-10T00:00:00Z");
        StageBench bench = run();

        assertThat(bench.alarms).extracting(AlarmChange::change).containsExactly(Change.RAISED, Change.WITHDRAWN);
        assertThat(bench.alarms.get(1).evidence().summary())
                .startsWith("Influenza, Gridland: withdrawn; with the reports as they now stand no signal is left")
                .endsWith("a statistical signal, not a confirmed outbreak.");
    }

    private static String response(String alarm, String verdict) {
        return "{\"alarm\":\"" + alarm + "\",\"verdict\":\"" + verdict
                + "\",\"by\":\"M. Holm\",\"at\":\"2024-03-05T10:00:00Z\",\"note\":\"seen\"}";
    }

    @Test
    void shouldTakeAResponseWithItsHourAndCountOneWithoutAlarm() {
        days(0, 60, false);
        days(60, 64, true);
        LocalDate start = run().alarms.get(0).day();
        log.respond("2024-03-05T10:20:00Z", SERIES, response(SERIES + "/" + start, "outbreak"));
        log.respond("2024-03-05T10:30:00Z", SERIES, response(SERIES + "/1999-01-01", "outbreak"));
        log.clock("2024-03-05T12:00:00Z");
        StageBench bench = run();

        assertThat(bench.alarms).extracting(AlarmChange::change).containsExactly(Change.RAISED, Change.RESPONDED);
        AlarmChange responded = bench.alarms.get(1);
        assertThat(responded.sequence()).isEqualTo(2);
        assertThat(responded.response())
                .isNotNull()
                .extracting(r -> r.verdict().toString())
                .isEqualTo("OUTBREAK");
        assertThat(responded.evidence()).isEqualTo(bench.alarms.get(0).evidence());
        assertThat(bench.lines).last().asString().startsWith("alarms 2024-03-05T11:00:00Z ");
        byte[] row = bench.books.get(SERIES + "|book");
        assertThat(row).isNotNull();
        assertThat(VersionedJson.read(row, 1, SeriesBook.class).withoutEffect()).isEqualTo(1);
    }

    @Test
    void shouldTakeResponsesOfAnHourInTheOrderOfTheirOffsets() {
        days(0, 60, false);
        days(60, 64, true);
        String alarm = run().alarms.get(0).alarm();
        List<String> verdicts = List.of("acknowledged", "under-investigation", "known-event");
        for (int i = 0; i < 60; i++) {
            log.respond("2024-03-05T10:20:00Z", SERIES, response(alarm, verdicts.get(i % 3)));
        }
        log.clock("2024-03-05T12:00:00Z");
        StageBench bench = run();

        assertThat(bench.alarms).hasSize(61);
        for (int i = 0; i < 60; i++) {
            AlarmChange change = bench.alarms.get(i + 1);
            assertThat(change.response()).isNotNull();
            assertThat(change.response()
                            .verdict()
                            .name()
                            .toLowerCase(java.util.Locale.ROOT)
                            .replace('_', '-'))
                    .isEqualTo(verdicts.get(i % 3));
            assertThat(change.sequence()).isEqualTo(i + 2);
        }
    }

    @Test
    void shouldLearnAfreshUnderAnotherPlanAndSayWhyAnAlarmIsWithdrawn() {
        days(0, 60, false);
        days(60, 64, true);
        Watch before = DESK.watch();
        StageBench bench = new StageBench(before);
        var taken = log.messages(before);
        bench.takeAll(taken);
        assertThat(bench.alarms).extracting(AlarmChange::change).containsExactly(Change.RAISED);
        int closed = bench.seriesDays.size();
        String last = bench.seriesDays.get(closed - 1).day().toString();

        Watch after = DESK.limits(4, 28, 3).watch();
        bench.restart(after);
        days(64, 70, false);
        log.say("2024-03-11T12:00:00Z", Say.of("late", "R0000", "2024-03-01").count(2));
        log.clock("2024-03-12T00:00:00Z");
        var streams = log.messages(after);
        for (int i = 0; i < streams.size(); i++) {
            streams.get(i).subList(taken.get(i).size(), streams.get(i).size()).forEach(bench::accept);
        }

        assertThat(bench.alarms).extracting(AlarmChange::change).containsExactly(Change.RAISED, Change.WITHDRAWN);
        assertThat(bench.alarms.get(1).evidence().summary())
                .isEqualTo("Influenza, Gridland: withdrawn; the plan of this series has changed and learning has begun"
                        + " afresh, so the signals from " + dayWords(bench, 0) + " to " + dayWords(bench, 1)
                        + " are not followed any further; that does not say that anything is over; what was raised"
                        + " was a statistical signal, not a confirmed outbreak.");
        SeriesDay next = bench.seriesDays.get(closed);
        assertThat(next.day()).isEqualTo(LocalDate.parse(last).plusDays(1));
        assertThat(moran(next).learning()).isNotNull().extracting(l -> l.days()).isEqualTo(0);
        assertThat(bench.revisions("2024-03-01")).hasSize(1);
        assertThat(bench.regionDays("2024-03-01"))
                .filteredOn(d -> d.revision() > 0)
                .extracting(d -> d.region() + " " + d.revision())
                .containsExactly("R0000 1");
    }

    private static String dayWords(StageBench bench, int which) {
        AlarmState state = bench.alarms(SERIES).get(0);
        LocalDate day = which == 0 ? state.start() : state.lastSignal();
        return day.format(java.time.format.DateTimeFormatter.ofPattern("d MMMM", java.util.Locale.ENGLISH));
    }
}
