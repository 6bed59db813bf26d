package org.seamwatch.ops;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.apache.kafka.clients.consumer.ConsumerRecord;
import org.jspecify.annotations.Nullable;
import org.seamwatch.fixtures.broker.TopicTool;
import org.seamwatch.processors.flow.Topics;
import org.seamwatch.processors.intake.LogRecord;
import org.seamwatch.schemas.json.Json;
import org.seamwatch.schemas.record.AccountingLine;
import org.seamwatch.schemas.record.AlarmChange;
import org.seamwatch.schemas.record.ReadResult;
import org.seamwatch.schemas.record.RegionDay;
import org.seamwatch.schemas.record.RejectReason;
import org.seamwatch.schemas.record.RejectedLine;
import org.seamwatch.schemas.record.SeriesDay;
import org.seamwatch.topology.RejectedHeaders;
import org.seamwatch.topology.replay.LogSink;
import org.seamwatch.topology.replay.LogWriter;
import org.seamwatch.topology.replay.ResultFiles;

/** Reads what a run has left in its topics, and writes it as the files that {@code replay} writes, with the log. */
final class DemoResults {

    private static final String LOG = "log.ndjson";

    private final TopicTool topics;
    private final String prefix;
    private final ResultFiles files = new ResultFiles();

    DemoResults(TopicTool topics, String prefix) {
        this.topics = topics;
        this.prefix = prefix;
    }

    /** All changes of alarms, by series, alarm and sequence. */
    List<AlarmChange> alarms() {
        return files.alarms();
    }

    /** Reads all results. */
    void read() {
        for (ConsumerRecord<byte[], byte[]> r : of(Topics.REGION_DAYS)) {
            files.regionDay(Json.read(r.value(), RegionDay.class), r.timestamp());
        }
        for (ConsumerRecord<byte[], byte[]> r : of(Topics.SERIES_DAYS)) {
            files.seriesDay(Json.read(r.value(), SeriesDay.class), r.timestamp());
        }
        for (ConsumerRecord<byte[], byte[]> r : of(Topics.ALARMS)) {
            files.alarm(Json.read(r.value(), AlarmChange.class), r.timestamp());
        }
        for (ConsumerRecord<byte[], byte[]> r : of(Topics.REJECTED_REPORTS)) {
            files.rejected(rejected(r));
        }
    }

    private List<ConsumerRecord<byte[], byte[]>> of(String topic) {
        return topics.readCommitted(prefix + topic);
    }

    private static RejectedLine rejected(ConsumerRecord<byte[], byte[]> record) {
        Map<String, String> headers = new HashMap<>();
        record.headers().forEach(h -> headers.put(h.key(), new String(h.value(), StandardCharsets.UTF_8)));
        String length = headers.get(RejectedHeaders.LENGTH);
        return RejectedLine.of(
                header(headers, RejectedHeaders.TOPIC),
                Integer.parseInt(header(headers, RejectedHeaders.PARTITION)),
                Long.parseLong(header(headers, RejectedHeaders.OFFSET)),
                new ReadResult.Unusable<>(
                        RejectReason.named(header(headers, RejectedHeaders.REASON)),
                        header(headers, RejectedHeaders.FIELD),
                        header(headers, RejectedHeaders.DETAIL)),
                record.key(),
                record.value(),
                length == null ? null : Long.valueOf(length),
                headers.get(RejectedHeaders.SHA256));
    }

    private static String header(Map<String, String> headers, String name) {
        String value = headers.get(name);
        if (value == null) {
            throw new IllegalStateException("a rejected record must have the header " + name);
        }
        return value;
    }

    /** Writes results, accounts and the input log. */
    void write(Path folder, List<AccountingLine> accounts) {
        files.write(folder, accounts);
        List<Timed> log = new ArrayList<>();
        for (String topic : List.of(Topics.CASE_REPORTS, Topics.ALARM_RESPONSES)) {
            addLog(topic, log);
        }
        log.sort(Comparator.comparingLong(Timed::time));
        try (LogWriter writer = new LogWriter(folder.resolve(LOG), new Nowhere())) {
            log.forEach(timed -> writer.record(timed.record()));
        }
    }

    /** A record with the time of its partition, which never steps back, so that sorting by it keeps offsets in order. */
    private record Timed(long time, LogRecord record) {}

    private void addLog(String topic, List<Timed> log) {
        Map<Integer, Long> times = new HashMap<>();
        for (ConsumerRecord<byte[], byte[]> r : topics.read(prefix + topic)) {
            long time = times.merge(r.partition(), r.timestamp(), Math::max);
            byte @Nullable [] key = r.key();
            byte @Nullable [] value = r.value();
            log.add(new Timed(time, new LogRecord(topic, r.partition(), r.offset(), r.timestamp(), key, value)));
        }
    }

    private static final class Nowhere implements LogSink {

        @Override
        public void record(LogRecord record) {
            // The log is only written.
        }

        @Override
        public void reached(long timestamp) {
            // The log is only written.
        }
    }
}
