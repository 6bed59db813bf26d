package org.seamwatch.topology.service;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Base64;
import java.util.Comparator;
import java.util.List;
import java.util.function.Function;
import java.util.stream.StreamSupport;
import org.apache.kafka.clients.consumer.ConsumerRecord;
import org.seamwatch.fixtures.broker.TopicTool;
import org.seamwatch.processors.flow.Topics;

/**
 * What a run has said, one record a line, in an order that does not depend on partitions. Lines begin with their key
 * and timestamp, so that these are compared too.
 *
 * @param regionDays by series, region, day, revision
 * @param seriesDays by series, day, revision
 * @param alarms by series, alarm, sequence
 * @param rejected by topic, partition, offset, with their headers
 */
public record Outputs(String regionDays, String seriesDays, String alarms, String rejected) {

    private static final ObjectMapper MAPPER = new ObjectMapper();

    static Outputs read(TopicTool tool, String prefix) {
        return new Outputs(
                json(tool.readCommitted(prefix + Topics.REGION_DAYS), "series", "region", "day", "revision"),
                json(tool.readCommitted(prefix + Topics.SERIES_DAYS), "series", "day", "revision"),
                json(tool.readCommitted(prefix + Topics.ALARMS), "series", "alarm", "sequence"),
                rejected(tool.readCommitted(prefix + Topics.REJECTED_REPORTS)));
    }

    private static String json(List<ConsumerRecord<byte[], byte[]>> records, String... fields) {
        return lines(records, record -> sortKey(record.value(), fields), Outputs::line);
    }

    private static String sortKey(byte[] value, String... fields) {
        try {
            JsonNode node = MAPPER.readTree(value);
            StringBuilder key = new StringBuilder();
            for (String field : fields) {
                JsonNode at = node.path(field);
                key.append(at.isNumber() ? String.format("%09d", at.intValue()) : at.asText())
                        .append('\0');
            }
            return key.toString();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static String line(ConsumerRecord<byte[], byte[]> record) {
        if (record.headers().iterator().hasNext()) {
            throw new AssertionError("a record of " + record.topic() + " must have no headers");
        }
        return text(record.key()) + " " + record.timestamp() + " " + text(record.value());
    }

    private static String rejected(List<ConsumerRecord<byte[], byte[]>> records) {
        return lines(
                records,
                r -> header(r, "topic")
                        + '\0'
                        + String.format("%09d", Integer.parseInt(header(r, "partition")))
                        + '\0'
                        + String.format("%012d", Long.parseLong(header(r, "offset"))),
                Outputs::rejectedLine);
    }

    private static String rejectedLine(ConsumerRecord<byte[], byte[]> record) {
        StringBuilder line = new StringBuilder();
        StreamSupport.stream(record.headers().spliterator(), false)
                .forEach(h ->
                        line.append(h.key()).append('=').append(text(h.value())).append(' '));
        return line.append(record.timestamp())
                .append(' ')
                .append(base64(record.key()))
                .append(' ')
                .append(base64(record.value()))
                .toString();
    }

    static String header(ConsumerRecord<byte[], byte[]> record, String name) {
        return text(record.headers().lastHeader(name).value());
    }

    private static String lines(
            List<ConsumerRecord<byte[], byte[]>> records,
            Function<ConsumerRecord<byte[], byte[]>, String> order,
            Function<ConsumerRecord<byte[], byte[]>, String> line) {
        StringBuilder text = new StringBuilder();
        records.stream()
                .sorted(Comparator.comparing(order))
                .forEach(record -> text.append(line.apply(record)).append('\n'));
        return text.toString();
    }

    private static String base64(byte[] bytes) {
        return bytes == null ? "null" : Base64.getEncoder().encodeToString(bytes);
    }

    private static String text(byte[] bytes) {
        return new String(bytes, StandardCharsets.UTF_8);
    }
}
