package org.seamwatch.processors.intake;

import java.nio.charset.StandardCharsets;
import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.flow.InputSizes;
import org.seamwatch.processors.flow.SeriesMessage;
import org.seamwatch.processors.flow.Topics;
import org.seamwatch.processors.state.Shelf;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.schemas.record.AlarmResponse;
import org.seamwatch.schemas.record.AlarmResponseReader;
import org.seamwatch.schemas.record.ReadResult;
import org.seamwatch.schemas.record.RejectReason;

/** One partition of {@code alarm-responses}. Judges a response's form only; whether its alarm is known, the series says. */
public final class ResponseIntake implements Intake {

    private final Watch watch;
    private final InputPartition input;
    private final IntakeOutput out;

    /**
     * An intake over its store.
     *
     * @param accounts rows by topic and partition
     */
    public ResponseIntake(Watch watch, int partition, InputSizes sizes, Shelf accounts, IntakeOutput out) {
        this.watch = watch;
        this.input = new InputPartition(Topics.ALARM_RESPONSES, partition, sizes, accounts, out);
        this.out = out;
    }

    @Override
    public void accept(LogRecord record) {
        input.accept(record, hour -> {}, this::take);
    }

    @Override
    public void pass(long hour, long logStart) {
        input.pass(hour, logStart, ended -> {});
    }

    @Override
    public Account account() {
        return input.account();
    }

    private @Nullable Refusal take(LogRecord record) {
        byte @Nullable [] key = record.key();
        byte @Nullable [] value = record.value();
        if (key == null) {
            return new Refusal(RejectReason.NULL_KEY, "alarm", "the record's key must be the series, was null");
        }
        if (value == null) {
            return new Refusal(RejectReason.NULL_VALUE, "", "the record's value must be a response, was null");
        }
        ReadResult<AlarmResponse> result = AlarmResponseReader.read(value);
        if (result instanceof ReadResult.Unusable<AlarmResponse> unusable) {
            return Refusal.from(unusable);
        }
        AlarmResponse response = ((ReadResult.Parsed<AlarmResponse>) result).value();
        String series = new String(key, StandardCharsets.UTF_8);
        if (!response.alarm().startsWith(series + "/")) {
            return new Refusal(
                    RejectReason.KEY_MISMATCH,
                    "alarm",
                    "the record's key must be the series of the alarm, was another");
        }
        if (!watch.series().containsKey(series)) {
            return new Refusal(RejectReason.NO_SERIES_TAKES_IT, "alarm", "no series of the plan is " + series);
        }
        out.toSeries(
                series,
                new SeriesMessage.Response(series, input.hour(), record.partition(), record.offset(), response));
        input.account().accept();
        return null;
    }
}
