package org.seamwatch.topology.service;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.nio.charset.StandardCharsets;
import java.util.Base64;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Collectors;
import org.apache.kafka.clients.consumer.ConsumerRecord;
import org.jspecify.annotations.Nullable;
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
        return of(
                said(tool.readCommitted(prefix + Topics.REGION_DAYS)),
                said(tool.readCommitted(prefix + Topics.SERIES_DAYS)),
                said(tool.readCommitted(prefix + Topics.ALARMS)),
                tool.readCommitted(prefix + Topics.REJECTED_REPORTS).stream()
                        .map(Outputs::rejectedLine)
                        .toList());
    }

    /** Sorts what was said in any order. */
    static Outputs of(List<Said> regionDays, List<Said> seriesDays, List<Said> alarms, List<String> rejected) {
        return new Outputs(
                lines(regionDays, "series", "region", "day", "revision"),
                lines(seriesDays, "series", "day", "revision"),
                lines(alarms, "series", "alarm", "sequence"),
                rejected.stream().sorted().map(line -> line + "\n").collect(Collectors.joining()));
    }

    /** A record of our own, as text. */
    record Said(String key, long timestamp, String value) {}

    private static List<Said> said(List<ConsumerRecord<byte[], byte[]>> records) {
        assertThat(records).allSatisfy(r -> assertThat(r.headers()).isEmpty());
        return records.stream()
                .map(r -> new Said(text(r.key()), r.timestamp(), text(r.value())))
                .toList();
    }

    private static String lines(List<Said> records, String... fields) {
        return records.stream()
                .sorted(Comparator.comparing(record -> sortKey(record.value(), fields)))
                .map(r -> r.key() + " " + r.timestamp() + " " + r.value() + "\n")
                .collect(Collectors.joining());
    }

    /** A rejected record: where it came from, why, when, and its bytes. */
    static String rejectedLine(
            String topic,
            int partition,
            long offset,
            Map<String, String> headers,
            long timestamp,
            byte @Nullable [] key,
            byte @Nullable [] value) {
        return String.format("%s %09d %012d ", topic, partition, offset) + new TreeMap<>(headers) + " " + timestamp
                + " " + base64(key) + " " + base64(value);
    }

    private static String rejectedLine(ConsumerRecord<byte[], byte[]> record) {
        Map<String, String> headers = new TreeMap<>();
        record.headers().forEach(h -> headers.put(h.key(), text(h.value())));
        return rejectedLine(
                headers.getOrDefault("topic", ""),
                Integer.parseInt(headers.getOrDefault("partition", "")),
                Long.parseLong(headers.getOrDefault("offset", "")),
                headers,
                record.timestamp(),
                record.key(),
                record.value());
    }

    private static String sortKey(String value, String... fields) {
        try {
            JsonNode node = MAPPER.readTree(value);
            StringBuilder key = new StringBuilder();
            for (String field : fields) {
                JsonNode at = node.path(field);
                key.append(at.isNumber() ? String.format("%09d", at.intValue()) : at.asText())
                        .append('\0');
            }
            return key.toString();
        } catch (JsonProcessingException e) {
            throw new AssertionError(value, e);
        }
    }

    private static String base64(byte @Nullable [] bytes) {
        return bytes == null ? "null" : Base64.getEncoder().encodeToString(bytes);
    }

    private static String text(byte[] bytes) {
        return new String(bytes, StandardCharsets.UTF_8);
    }
}
