package org.seamwatch.topology.replay;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalLong;
import org.seamwatch.processors.flow.Hours;
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

/**
 * Runs a log through the steps of the live service in this process: one intake for each input partition, one series
 * stage for all series. It looks at no clock; the same log and plan give the same output as live.
 *
 * <p><b>Where a replay ends.</b> It applies every hour up to and including the one that contains its end (by default
 * the last timestamp of the log), and that hour whole: records of later hours are not fed, and what follows them in
 * their partition belongs to later hours too. A live run applies an hour only once every partition has a record of a
 * later one. So the output of a live run equals that of a replay of its log to the default end where the last record of
 * every partition lies in one hour H, no report or response lies in H, and no day closes with H: then the live run has
 * applied H - 1, and H changes nothing. Clock records at a full hour after which no geography's midnight comes within
 * the hour end a log so: 00:00:00Z where all geographies are in UTC.
 */
public final class LogReplay implements LogSink {

    private final InputSizes sizes;
    private final List<ReplayPartition> partitions = new ArrayList<>();
    private final long lastHour;
    private long logStart = Long.MAX_VALUE;
    private long logEnd = -1;
    private long reachedHour = Long.MIN_VALUE;
    private long notFed;
    private boolean finished;

    /**
     * A replay of a log from its start.
     *
     * @param watch the plan
     * @param sizes how many partitions each input topic has
     * @param until the end, milliseconds since 1970-01-01T00Z; empty for the last timestamp of the log
     * @param out takes the results
     */
    public LogReplay(Watch watch, InputSizes sizes, OptionalLong until, ReplayOutput out) {
        this.sizes = sizes;
        this.lastHour = until.isPresent() ? Hours.of(until.getAsLong()) : Long.MAX_VALUE;
        SeriesShelves shelves = new SeriesShelves(
                new MemoryShelf(), new MemoryShelf(), new MemoryShelf(), new MemoryShelf(), new MemoryShelf());
        IntakeOutput wire = new Wire(new SeriesStage(watch, series -> true, shelves, out), out);
        for (int p = 0; p < sizes.caseReports(); p++) {
            partitions.add(new ReplayPartition(
                    Topics.CASE_REPORTS,
                    p,
                    new ReportIntake(watch, p, sizes, new MemoryShelf(), new MemoryShelf(), new MemoryShelf(), wire)));
        }
        for (int p = 0; p < sizes.alarmResponses(); p++) {
            partitions.add(new ReplayPartition(
                    Topics.ALARM_RESPONSES, p, new ResponseIntake(watch, p, sizes, new MemoryShelf(), wire)));
        }
    }

    /**
     * Takes the next record.
     *
     * @throws IllegalArgumentException when no input topic or none of its partitions is the record's
     */
    @Override
    public void record(LogRecord record) {
        ReplayPartition partition = partition(record);
        long time = partition.moveTo(record.timestamp());
        if (Hours.of(time) > lastHour) {
            notFed++;
            return;
        }
        logStart = Math.min(logStart, time);
        logEnd = Math.max(logEnd, time);
        partition.intake().accept(record);
    }

    private ReplayPartition partition(LogRecord record) {
        boolean reports = record.topic().equals(Topics.CASE_REPORTS);
        if (!reports && !record.topic().equals(Topics.ALARM_RESPONSES)) {
            throw new IllegalArgumentException("topic must be " + Topics.CASE_REPORTS + " or " + Topics.ALARM_RESPONSES
                    + ", was " + record.topic());
        }
        int size = reports ? sizes.caseReports() : sizes.alarmResponses();
        if (record.partition() < 0 || record.partition() >= size) {
            throw new IllegalArgumentException("partition of " + record.topic() + " must be in 0.." + (size - 1)
                    + " (the plan's topics.partitions is " + size + "), was " + record.partition());
        }
        return partitions.get(reports ? record.partition() : sizes.caseReports() + record.partition());
    }

    /** Passes the hours before a promise on all partitions, so that they need not wait for the end of the log. */
    @Override
    public void reached(long timestamp) {
        long hour = Math.min(Hours.of(timestamp) - 1, lastHour);
        if (hour > reachedHour && isBegun()) {
            passAll(hour);
            reachedHour = hour;
        }
    }

    /** Whether a record has been fed. */
    public boolean isBegun() {
        return logEnd >= 0;
    }

    /** Records that lay beyond the end and were not fed. */
    public long notFed() {
        return notFed;
    }

    /** Applies what is left. Partitions without a record do not hold it up. A log without a record has no output. */
    public void finish() {
        if (finished) {
            throw new IllegalStateException("a replay must be finished once, was finished already");
        }
        finished = true;
        if (isBegun()) {
            passAll(lastHour == Long.MAX_VALUE ? Hours.of(logEnd) : lastHour);
        }
    }

    private void passAll(long hour) {
        for (ReplayPartition partition : partitions) {
            partition.intake().pass(hour, logStart);
        }
    }

    /** What became of the records of each input partition, by topic and partition. */
    public List<AccountingLine> accounts() {
        List<AccountingLine> lines = new ArrayList<>();
        for (ReplayPartition partition : partitions) {
            lines.add(Accounting.line(
                    partition.topic(), partition.number(), partition.intake().account()));
        }
        lines.sort(Accounting.ORDER);
        return lines;
    }

    private record Wire(SeriesStage stage, ReplayOutput out) implements IntakeOutput {

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
            out.rejected(rejection);
        }
    }
}
