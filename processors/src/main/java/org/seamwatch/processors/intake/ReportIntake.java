package org.seamwatch.processors.intake;

import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.concurrent.TimeUnit;
import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.flow.InputSizes;
import org.seamwatch.processors.flow.Topics;
import org.seamwatch.processors.state.Shelf;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.schemas.record.CaseReport;
import org.seamwatch.schemas.record.CaseReportReader;
import org.seamwatch.schemas.record.ReadResult;
import org.seamwatch.schemas.record.RejectReason;

/** One partition of {@code case-reports}: each record's difference to what its report said before goes to its series. */
public final class ReportIntake implements Intake {

    private static final long SWEEP_HOURS = TimeUnit.DAYS.toHours(16);

    private final int partition;
    private final InputPartition input;
    private final Ledger ledger;
    private final HourTally tally;
    private final Placer placer;
    private final IntakeOutput out;

    /**
     * An intake over its stores.
     *
     * @param ledger rows by report id
     * @param tally rows of the present hour, and some of hours before
     * @param accounts rows by topic and partition
     */
    public ReportIntake(
            Watch watch, int partition, InputSizes sizes, Shelf ledger, Shelf tally, Shelf accounts, IntakeOutput out) {
        this.partition = partition;
        this.input = new InputPartition(Topics.CASE_REPORTS, partition, sizes, accounts, out);
        Horizon horizon = new Horizon(watch);
        this.ledger = new Ledger(ledger, horizon);
        this.tally = new HourTally(tally, input.hour());
        this.placer = new Placer(watch, horizon);
        this.out = out;
    }

    @Override
    public void accept(LogRecord record) {
        input.accept(record, this::endHour, this::take);
    }

    @Override
    public void pass(long hour, long logStart) {
        input.pass(hour, logStart, ended -> tally.end(ended, partition, out));
    }

    @Override
    public Account account() {
        return input.account();
    }

    private void endHour(long hour) {
        tally.end(hour, partition, out);
        if (Math.floorDiv(hour, SWEEP_HOURS) != Math.floorDiv(input.hour(), SWEEP_HOURS)) {
            ledger.sweep(input.time());
        }
    }

    /** Takes a report, or says why it cannot. */
    private @Nullable Refusal take(LogRecord record) {
        byte @Nullable [] key = record.key();
        byte @Nullable [] value = record.value();
        if (key == null) {
            return new Refusal(RejectReason.NULL_KEY, "reportId", "the record's key must be the report id, was null");
        }
        if (value == null) {
            return new Refusal(RejectReason.NULL_VALUE, "", "the record's value must be a report, was null");
        }
        ReadResult<CaseReport> result = CaseReportReader.read(value);
        if (result instanceof ReadResult.Unusable<CaseReport> unusable) {
            return Refusal.from(unusable);
        }
        CaseReport report = ((ReadResult.Parsed<CaseReport>) result).value();
        if (!Arrays.equals(key, report.reportId().getBytes(StandardCharsets.UTF_8))) {
            return new Refusal(
                    RejectReason.KEY_MISMATCH, "reportId", "the record's key must be the report id, was another");
        }
        return take(report, record.timestamp());
    }

    private @Nullable Refusal take(CaseReport report, long timestamp) {
        Placer.Placing placing = placer.place(report, timestamp, input.time());
        if (placing.why() != null) {
            return placing.why();
        }
        LedgerEntry now = placing.entry();
        LedgerEntry before = ledger.get(report.reportId(), input.time());
        if (before != null && report.revision() < before.report().revision()) {
            input.account().supersede();
        } else if (before != null && report.sameContent(before.report())) {
            input.account().duplicate();
        } else {
            count(before, now);
        }
        return null;
    }

    private void count(@Nullable LedgerEntry before, LedgerEntry now) {
        if (before != null) {
            before.contributions()
                    .forEach(c -> tally.add(
                            input.hour(), c, before.region(), before.cases().negated()));
        }
        now.contributions().forEach(c -> tally.add(input.hour(), c, now.region(), now.cases()));
        ledger.put(now);
        input.account().accept();
    }
}
