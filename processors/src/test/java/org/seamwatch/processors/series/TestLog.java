package org.seamwatch.processors.series;

import java.nio.charset.StandardCharsets;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import org.seamwatch.processors.flow.InputSizes;
import org.seamwatch.processors.flow.SeriesMessage;
import org.seamwatch.processors.flow.Topics;
import org.seamwatch.processors.intake.IntakeOutput;
import org.seamwatch.processors.intake.LogRecord;
import org.seamwatch.processors.intake.Rejection;
import org.seamwatch.processors.intake.ReportIntake;
import org.seamwatch.processors.intake.ResponseIntake;
import org.seamwatch.processors.intake.Say;
import org.seamwatch.processors.state.MemoryShelf;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.schemas.record.ClockRecord;

/** A log of reports and responses, and what intake makes of it. */
final class TestLog {

    private final List<List<LogRecord>> reports = new ArrayList<>();
    private final List<LogRecord> responses = new ArrayList<>();
    final List<Rejection> rejected = new ArrayList<>();

    TestLog(int partitions) {
        for (int i = 0; i < partitions; i++) {
            reports.add(new ArrayList<>());
        }
    }

    TestLog say(String time, Say say) {
        return say(Instant.parse(time), say);
    }

    TestLog say(Instant time, Say say) {
        int partition = Math.floorMod(say.id().hashCode(), reports.size());
        add(reports.get(partition), Topics.CASE_REPORTS, partition, time, say.key(), say.value());
        return this;
    }

    TestLog respond(String time, String series, String json) {
        add(
                responses,
                Topics.ALARM_RESPONSES,
                0,
                Instant.parse(time),
                series.getBytes(StandardCharsets.UTF_8),
                json.getBytes(StandardCharsets.UTF_8));
        return this;
    }

    TestLog clock(String time) {
        return clock(Instant.parse(time));
    }

    /** A clock record on every input partition. */
    TestLog clock(Instant time) {
        for (int i = 0; i < reports.size(); i++) {
            add(reports.get(i), Topics.CASE_REPORTS, i, time, ClockRecord.key(), ClockRecord.value());
        }
        add(responses, Topics.ALARM_RESPONSES, 0, time, ClockRecord.key(), ClockRecord.value());
        return this;
    }

    private static void add(List<LogRecord> log, String topic, int partition, Instant time, byte[] key, byte[] value) {
        log.add(new LogRecord(topic, partition, log.size(), time.toEpochMilli(), key, value));
    }

    /** What each input partition sends, in its order. */
    List<List<SeriesMessage>> messages(Watch watch) {
        InputSizes sizes = new InputSizes(reports.size(), 1);
        List<List<SeriesMessage>> streams = new ArrayList<>();
        for (int i = 0; i < reports.size(); i++) {
            Collected out = new Collected();
            ReportIntake intake =
                    new ReportIntake(watch, i, sizes, new MemoryShelf(), new MemoryShelf(), new MemoryShelf(), out);
            reports.get(i).forEach(intake::accept);
            streams.add(out.sent);
        }
        Collected out = new Collected();
        ResponseIntake intake = new ResponseIntake(watch, 0, sizes, new MemoryShelf(), out);
        responses.forEach(intake::accept);
        streams.add(out.sent);
        return streams;
    }

    private final class Collected implements IntakeOutput {

        private final List<SeriesMessage> sent = new ArrayList<>();

        @Override
        public void toSeries(String series, SeriesMessage message) {
            sent.add(message);
        }

        @Override
        public void toAll(SeriesMessage.Watermark watermark) {
            sent.add(watermark);
        }

        @Override
        public void reject(Rejection rejection) {
            rejected.add(rejection);
        }
    }
}
