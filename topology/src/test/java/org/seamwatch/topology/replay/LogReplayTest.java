package org.seamwatch.topology.replay;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.tuple;
import static org.seamwatch.topology.replay.Grid.clock;
import static org.seamwatch.topology.replay.Grid.millis;
import static org.seamwatch.topology.replay.Grid.report;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalLong;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seamwatch.processors.flow.InputSizes;
import org.seamwatch.processors.flow.SeriesMessage;
import org.seamwatch.processors.flow.Topics;
import org.seamwatch.processors.intake.IntakeOutput;
import org.seamwatch.processors.intake.LogRecord;
import org.seamwatch.processors.intake.Rejection;
import org.seamwatch.processors.intake.ReportIntake;
import org.seamwatch.processors.intake.ResponseIntake;
import org.seamwatch.processors.series.SeriesShelves;
import org.seamwatch.processors.series.SeriesStage;
import org.seamwatch.processors.state.MemoryShelf;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.schemas.record.AccountingLine;
import org.seamwatch.topology.Accounting;

class LogReplayTest {

    private static final InputSizes SIZES = new InputSizes(2, 2);

    private final Watch watch;

    LogReplayTest(@TempDir Path folder) {
        watch = Grid.watch(folder, 2);
    }

    private Results replay(OptionalLong until, LogRecord... records) {
        Results results = new Results();
        LogReplay replay = new LogReplay(watch, SIZES, until, results);
        List.of(records).forEach(replay::record);
        replay.finish();
        return results;
    }

    @Test
    void shouldNotWaitForPartitionsWithoutARecord() {
        Results results = replay(
                OptionalLong.of(millis("2024-03-03T23:59:59Z")), report(0, 0, "2024-03-01T10:00:00Z", "a", "R4"));
        // By the end of the hour that ends as 4 March begins, 2 March is due; the series begins five days before 1
        // March.
        assertThat(results.days())
                .containsExactly(
                        "2024-02-25#0",
                        "2024-02-26#0",
                        "2024-02-27#0",
                        "2024-02-28#0",
                        "2024-02-29#0",
                        "2024-03-01#0",
                        "2024-03-02#0");
        assertThat(results.regionDays).singleElement().satisfies(day -> {
            assertThat(day.region()).isEqualTo("R4");
            assertThat(day.count()).isEqualTo(1);
        });
    }

    @Test
    void shouldEndWithTheHourOfTheLastTimestampByDefault() {
        Results before = replay(
                OptionalLong.empty(),
                report(0, 0, "2024-03-01T10:00:00Z", "a", "R4"),
                clock(Topics.CASE_REPORTS, 0, 1, "2024-03-02T22:59:59Z"));
        Results within = replay(
                OptionalLong.empty(),
                report(0, 0, "2024-03-01T10:00:00Z", "a", "R4"),
                clock(Topics.CASE_REPORTS, 0, 1, "2024-03-02T23:00:00Z"));
        assertThat(before.days()).endsWith("2024-02-29#0");
        assertThat(within.days()).endsWith("2024-03-01#0");
    }

    @Test
    void shouldApplyTheHourOfTheEndWholeAndFeedNoLaterOne() {
        LogRecord[] log = {
            report(0, 0, "2024-03-01T10:00:00Z", "a", "R0"),
            report(0, 1, "2024-03-01T23:10:00Z", "b", "R1"),
            report(0, 2, "2024-03-01T23:50:00Z", "c", "R2"),
            report(0, 3, "2024-03-02T00:10:00Z", "d", "R3"),
            report(0, 4, "2024-03-01T23:55:00Z", "e", "R4"),
            report(1, 0, "2024-03-01T23:55:00Z", "f", "R5"),
            clock(Topics.CASE_REPORTS, 1, 1, "2024-03-08T00:00:00Z")
        };
        Results results = new Results();
        LogReplay replay = new LogReplay(watch, SIZES, OptionalLong.of(millis("2024-03-01T23:30:00Z")), results);
        List.of(log).forEach(replay::record);
        replay.finish();
        AccountingLine first = replay.accounts().get(2);
        assertThat(first.topic()).isEqualTo(Topics.CASE_REPORTS);
        // d is of a later hour, and so is e, which follows it in its partition.
        assertThat(first.read()).isEqualTo(3);
        assertThat(replay.accounts().get(3).read()).isEqualTo(1);
        assertThat(replay.notFed()).isEqualTo(3);
        assertThat(results.days()).endsWith("2024-02-28#0", "2024-02-29#0");
    }

    @Test
    void shouldGiveThePrefixOfAWholeReplayWhereItEndsEarlier() {
        LogRecord[] log = {
            report(0, 0, "2024-03-01T10:00:00Z", "a", "R0"),
            report(1, 0, "2024-03-02T11:00:00Z", "b", "R1"),
            report(0, 1, "2024-03-02T12:30:00Z", "c", "R2"),
            report(1, 1, "2024-03-05T12:00:00Z", "d", "R3")
        };
        List<String> whole = replay(OptionalLong.of(millis("2024-03-09T00:00:00Z")), log).all;
        List<String> part = replay(OptionalLong.of(millis("2024-03-03T23:15:00Z")), log).all;
        assertThat(part).isNotEmpty();
        assertThat(whole).startsWith(part.toArray(String[]::new)).hasSizeGreaterThan(part.size());
    }

    @Test
    void shouldGiveTheSameWhetherHoursPassOnTheWayOrAtTheEnd() {
        List<LogRecord> log = List.of(
                report(0, 0, "2024-03-01T10:00:00Z", "a", "R0"),
                report(0, 1, "2024-03-01T10:20:00Z", "b", "R1"),
                report(0, 2, "2024-03-04T09:00:00Z", "c", "R2"),
                report(1, 0, "2024-03-04T09:30:00Z", "a2", "R0"),
                report(0, 3, "2024-03-06T01:00:00Z", "d", "R3"));
        Results onTheWay = new Results();
        LogReplay replay = new LogReplay(watch, SIZES, OptionalLong.empty(), onTheWay);
        for (LogRecord record : log) {
            replay.reached(record.timestamp());
            replay.record(record);
        }
        int before = onTheWay.seriesDays.size();
        replay.finish();
        assertThat(before).isPositive();
        assertThat(onTheWay.all).isEqualTo(replay(OptionalLong.empty(), log.toArray(LogRecord[]::new)).all);
    }

    @Test
    void shouldEqualALiveRunWhereTheLogEndsWithClockRecordsAtMidnight() {
        List<LogRecord> log = logEndingAt("2024-03-05T00:00:00Z");
        assertThat(replay(OptionalLong.empty(), log.toArray(LogRecord[]::new)).all)
                .isEqualTo(live(log).all)
                .hasSizeGreaterThan(8);
    }

    @Test
    void shouldCloseADayMoreThanALiveRunWhereTheLogEndsInTheHourBeforeMidnight() {
        List<LogRecord> log = logEndingAt("2024-03-04T23:00:00Z");
        assertThat(live(log).days()).endsWith("2024-03-02#0");
        assertThat(replay(OptionalLong.empty(), log.toArray(LogRecord[]::new)).days())
                .endsWith("2024-03-02#0", "2024-03-03#0");
    }

    private static List<LogRecord> logEndingAt(String end) {
        List<LogRecord> log = new ArrayList<>();
        log.add(report(0, 0, "2024-03-01T10:00:00Z", "a", "R0"));
        log.add(report(1, 0, "2024-03-02T10:00:00Z", "b", "R1"));
        log.add(report(1, 1, "2024-03-03T10:00:00Z", "c", "R2"));
        log.add(clock(Topics.CASE_REPORTS, 0, 1, end));
        log.add(clock(Topics.CASE_REPORTS, 1, 2, end));
        log.add(clock(Topics.ALARM_RESPONSES, 0, 0, end));
        log.add(clock(Topics.ALARM_RESPONSES, 1, 0, end));
        return log;
    }

    /** The plain steps, with nothing but the log to drive them. */
    private Results live(List<LogRecord> log) {
        Results results = new Results();
        SeriesShelves shelves = new SeriesShelves(
                new MemoryShelf(), new MemoryShelf(), new MemoryShelf(), new MemoryShelf(), new MemoryShelf());
        SeriesStage stage = new SeriesStage(watch, series -> true, shelves, results);
        IntakeOutput wire = new IntakeOutput() {
            @Override
            public void toSeries(String series, SeriesMessage message) {
                stage.accept(message);
            }

            @Override
            public void toAll(SeriesMessage.Watermark watermark) {
                stage.accept(watermark);
            }

            @Override
            public void reject(Rejection rejection) {
                results.rejected(rejection);
            }
        };
        ReportIntake[] reports = new ReportIntake[2];
        ResponseIntake[] responses = new ResponseIntake[2];
        for (int p = 0; p < 2; p++) {
            reports[p] =
                    new ReportIntake(watch, p, SIZES, new MemoryShelf(), new MemoryShelf(), new MemoryShelf(), wire);
            responses[p] = new ResponseIntake(watch, p, SIZES, new MemoryShelf(), wire);
        }
        for (LogRecord record : log) {
            if (record.topic().equals(Topics.CASE_REPORTS)) {
                reports[record.partition()].accept(record);
            } else {
                responses[record.partition()].accept(record);
            }
        }
        return results;
    }

    @Test
    void shouldAccountForEveryPartition() {
        Results results = new Results();
        LogReplay replay = new LogReplay(watch, SIZES, OptionalLong.empty(), results);
        replay.record(report(0, 0, "2024-03-01T10:00:00Z", "a", "R0"));
        replay.record(report(0, 1, "2024-03-01T10:00:00Z", "a", "R0"));
        replay.record(report(0, 2, "2024-03-01T10:01:00Z", "z", "R99"));
        replay.record(clock(Topics.ALARM_RESPONSES, 1, 0, "2024-03-01T11:00:00Z"));
        replay.finish();
        assertThat(replay.accounts())
                .extracting(
                        AccountingLine::topic,
                        AccountingLine::partition,
                        AccountingLine::read,
                        AccountingLine::accepted,
                        AccountingLine::duplicate,
                        AccountingLine::rejected,
                        AccountingLine::control)
                .containsExactly(
                        tuple(Topics.ALARM_RESPONSES, 0, 0L, 0L, 0L, 0L, 0L),
                        tuple(Topics.ALARM_RESPONSES, 1, 1L, 0L, 0L, 0L, 1L),
                        tuple(Topics.CASE_REPORTS, 0, 3L, 1L, 1L, 1L, 0L),
                        tuple(Topics.CASE_REPORTS, 1, 0L, 0L, 0L, 0L, 0L));
        assertThat(replay.accounts()).allMatch(Accounting::balances);
        assertThat(replay.accounts().get(2).reasons()).containsOnlyKeys("unknown-region");
        assertThat(results.reasons()).containsExactly("unknown-region");
    }

    @Test
    void shouldGiveNothingForALogWithoutARecord() {
        assertThat(replay(OptionalLong.of(millis("2024-03-03T00:00:00Z"))).all).isEmpty();
    }

    @Test
    void shouldNameAPartitionThatThePlanDoesNotHave() {
        LogReplay replay = new LogReplay(watch, SIZES, OptionalLong.empty(), new Results());
        assertThatThrownBy(() -> replay.record(report(2, 0, "2024-03-01T10:00:00Z", "a", "R0")))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("partition of case-reports must be in 0..1 (the plan's topics.partitions is 2), was 2");
        assertThatThrownBy(() -> replay.record(clock("alarms", 0, 0, "2024-03-01T10:00:00Z")))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("topic must be case-reports or alarm-responses, was alarms");
    }

    @Test
    void shouldRefuseToFinishTwice() {
        LogReplay replay = new LogReplay(watch, SIZES, OptionalLong.empty(), new Results());
        replay.finish();
        assertThatThrownBy(replay::finish)
                .isInstanceOf(IllegalStateException.class)
                .hasMessage("a replay must be finished once, was finished already");
    }
}
