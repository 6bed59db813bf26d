package org.seamwatch.topology.service;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.apache.kafka.clients.consumer.ConsumerRecord;
import org.apache.kafka.clients.producer.ProducerRecord;
import org.apache.kafka.common.header.Header;
import org.apache.kafka.common.header.internals.RecordHeader;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seamwatch.fixtures.broker.Brokers;
import org.seamwatch.fixtures.broker.EmbeddedBroker;
import org.seamwatch.fixtures.broker.TopicTool;
import org.seamwatch.fixtures.scenario.ClockRecords;
import org.seamwatch.processors.flow.Topics;
import org.seamwatch.schemas.record.AccountingLine;
import org.seamwatch.topology.RejectedHeaders;
import org.seamwatch.topology.TestPlan;

/** Nothing a sender can write stops the flow or gets further than it should. */
class RubbishTest {

    private static final String PREFIX = "rubbish.";
    private static final Instant DAY = Instant.parse("2024-02-01T10:00:00Z");
    private static final String SECRET = "Ada Lovelace";
    private static final Map<String, Object> LARGE = Map.of("max.request.size", 8 << 20, "compression.type", "lz4");

    private final Map<String, String> expected = new TreeMap<>();
    private final List<ProducerRecord<byte[], byte[]>> sent = new ArrayList<>();

    private static String report(String id) {
        return """
                {"reportId":"%s","source":"lab","status":"final","condition":"influenza","region":"NM-001",\
                "eventDate":"2024-02-01","reportDate":"2024-02-01","reportedAt":"2024-02-01T10:00:00Z"}""".formatted(id);
    }

    private static byte @Nullable [] bytes(@Nullable String text) {
        return text == null ? null : text.getBytes(StandardCharsets.UTF_8);
    }

    @SuppressWarnings("NullAway") // a record may have no key and no value
    private void send(@Nullable String key, byte @Nullable [] value, Header... headers) {
        sent.add(new ProducerRecord<>(
                PREFIX + Topics.CASE_REPORTS, 0, DAY.toEpochMilli(), bytes(key), value, List.of(headers)));
    }

    private void rubbish(String reason, @Nullable String key, byte @Nullable [] value) {
        expected.put(String.valueOf(sent.size()), reason);
        send(key, value, new RecordHeader("patient", SECRET.getBytes(StandardCharsets.UTF_8)));
    }

    private void rubbish(String reason, String key, String value) {
        rubbish(reason, key, value.getBytes(StandardCharsets.UTF_8));
    }

    private void everyKind() {
        String good = report("x");
        rubbish("not-json", "x", "case of flu in NM-001");
        rubbish("not-json", "x", "");
        rubbish("not-utf8", "x", good.replace("lab", "l\u00e4b").getBytes(StandardCharsets.ISO_8859_1));
        rubbish("wrong-type", "x", good.replace("\"influenza\"", "7"));
        rubbish("wrong-type", "x", good.replace("}", ",\"count\":\"one\"}"));
        rubbish("out-of-range", "x", good.replace("}", ",\"count\":1e400}"));
        rubbish("out-of-range", "x", good.replace("}", ",\"revision\":" + "9".repeat(5_000) + "}"));
        rubbish("too-deep", "x", "[".repeat(100_000));
        rubbish(
                "too-deep",
                "x",
                good.replace("}", ",\"more\":" + "{\"a\":".repeat(5_000) + "1" + "}".repeat(5_000) + "}"));
        rubbish("too-large", "x", good.replace("NM-001", "x".repeat(3 << 20)));
        rubbish("too-large", "x", good.replace("}", ",\"more\":\"" + "x".repeat(3 << 20) + "\"}"));
        rubbish("null-key", null, bytes(good));
        rubbish("null-value", "x", (byte[]) null);
        rubbish("key-mismatch", "y", good);
        rubbish("unknown-region", "x", good.replace("NM-001", "NM-999"));
    }

    private void clock(String at) {
        for (String topic : List.of(Topics.CASE_REPORTS, Topics.ALARM_RESPONSES)) {
            sent.add(new ProducerRecord<>(
                    PREFIX + topic,
                    0,
                    Instant.parse(at).toEpochMilli(),
                    ClockRecords.KEY.getBytes(StandardCharsets.UTF_8),
                    ClockRecords.value()));
        }
    }

    @Test
    void shouldGoOnAndKeepPersonalDataWhereItCame(@TempDir Path folder) {
        everyKind();
        String personal = report("good").replace("}", ",\"patient\":{\"name\":\"" + SECRET + "\"}}");
        send("good", bytes(personal), new RecordHeader("patient", SECRET.getBytes(StandardCharsets.UTF_8)));
        long read = sent.size() + 1L;
        clock("2024-02-03T00:00:00Z");
        TestPlan plan = TestPlan.in(folder);
        try (EmbeddedBroker broker = Brokers.embedded();
                TopicTool tool = TopicTool.of(broker.bootstrapServers(), LARGE);
                TopologyRun run = TopologyRun.of(broker, tool, folder, "rubbish", plan)) {
            tool.send(sent);
            StreamsService service = run.start("a");
            run.awaitEnd();

            checkRejected(tool.readCommitted(PREFIX + Topics.REJECTED_REPORTS));
            assertThat(run.outputs().regionDays())
                    .contains("\"day\":\"2024-02-01\",\"count\":1,")
                    .hasLineCount(1);
            checkNothingPersonal(tool);
            AccountingLine line = service.accounting().get(1);
            assertThat(line.topic()).isEqualTo(Topics.CASE_REPORTS);
            assertThat(line.read())
                    .isEqualTo(read)
                    .isEqualTo(tool.endOffsets(PREFIX + Topics.CASE_REPORTS).get(0));
            assertThat(line.rejected()).isEqualTo(expected.size());
            assertThat(line.accepted()).isEqualTo(1);
            assertThat(line.control()).isEqualTo(1);
            assertThat(service.failures()).isZero();
        }
    }

    private void checkRejected(List<ConsumerRecord<byte[], byte[]>> rejected) {
        Map<String, String> reasons = new TreeMap<>();
        for (ConsumerRecord<byte[], byte[]> record : rejected) {
            String offset = header(record, RejectedHeaders.OFFSET);
            reasons.put(offset, header(record, RejectedHeaders.REASON));
            byte[] value = sent.get(Integer.parseInt(offset)).value();
            assertThat(record.headers().lastHeader("patient")).isNull();
            if (value == null || value.length <= 256 * 1024) {
                assertThat(record.value()).isEqualTo(value);
            } else {
                assertThat(record.value()).hasSize(256 * 1024);
                assertThat(header(record, RejectedHeaders.LENGTH)).isEqualTo(String.valueOf(value.length));
            }
        }
        assertThat(reasons).isEqualTo(expected);
    }

    /** In no topic but the one it came in by, whoever owns it. */
    private static void checkNothingPersonal(TopicTool tool) {
        List<String> read = new ArrayList<>();
        for (String topic : tool.topics()) {
            if (!topic.startsWith("rubbish") || topic.equals(PREFIX + Topics.CASE_REPORTS)) {
                continue;
            }
            for (ConsumerRecord<byte[], byte[]> record : tool.read(topic)) {
                read.add(topic);
                String all = text(record.key()) + text(record.value()) + record.headers();
                assertThat(all).doesNotContain(SECRET);
            }
        }
        assertThat(read).contains("rubbish-report-ledger-changelog", PREFIX + Topics.SERIES_DAYS);
    }

    private static String header(ConsumerRecord<byte[], byte[]> record, String name) {
        return text(record.headers().lastHeader(name).value());
    }

    private static String text(byte @Nullable [] bytes) {
        return bytes == null ? "" : new String(bytes, StandardCharsets.UTF_8);
    }
}
