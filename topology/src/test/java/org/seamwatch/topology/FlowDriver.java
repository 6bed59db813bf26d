package org.seamwatch.topology;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Properties;
import org.apache.kafka.common.header.Headers;
import org.apache.kafka.common.header.internals.RecordHeaders;
import org.apache.kafka.common.serialization.ByteArrayDeserializer;
import org.apache.kafka.common.serialization.ByteArraySerializer;
import org.apache.kafka.common.serialization.StringDeserializer;
import org.apache.kafka.streams.StreamsConfig;
import org.apache.kafka.streams.TestInputTopic;
import org.apache.kafka.streams.TestOutputTopic;
import org.apache.kafka.streams.TopologyTestDriver;
import org.apache.kafka.streams.test.TestRecord;
import org.jspecify.annotations.Nullable;
import org.seamwatch.fixtures.scenario.ClockRecords;
import org.seamwatch.processors.flow.Topics;

/** The topology over one partition of everything, without a broker. */
final class FlowDriver implements AutoCloseable {

    private static final String PREFIX = "seamwatch.";

    private final TopologyTestDriver driver;
    private final TestInputTopic<byte[], byte[]> reports;
    private final TestInputTopic<byte[], byte[]> responses;

    /** A driver; one over the same folder as an earlier, closed one finds its state. */
    FlowDriver(Path folder) {
        Properties properties = new Properties();
        properties.put(StreamsConfig.APPLICATION_ID_CONFIG, "flow");
        properties.put(StreamsConfig.STATE_DIR_CONFIG, folder.resolve("state").toString());
        driver = new TopologyTestDriver(FlowTopology.of(TestPlan.in(folder).watch()), properties);
        reports = input(Topics.CASE_REPORTS);
        responses = input(Topics.ALARM_RESPONSES);
    }

    private TestInputTopic<byte[], byte[]> input(String topic) {
        return driver.createInputTopic(PREFIX + topic, new ByteArraySerializer(), new ByteArraySerializer());
    }

    /** Passes time on both inputs. */
    void clock(String at) {
        byte[] key = ClockRecords.KEY.getBytes(StandardCharsets.UTF_8);
        long time = Instant.parse(at).toEpochMilli();
        reports.pipeInput(key, ClockRecords.value(), time);
        responses.pipeInput(key, ClockRecords.value(), time);
    }

    /** A final influenza report of one case, region NM-001, sent and logged at one time. */
    void report(String id, String at, String day, int revision, int count) {
        report(id, json(id, at, day, revision, count), at);
    }

    static String json(String id, String at, String day, int revision, int count) {
        return """
                {"reportId":"%s","source":"lab","revision":%d,"status":"final","condition":"influenza","region":"NM-001",\
                "eventDate":"%s","reportDate":"%s","reportedAt":"%s","count":%d}""".formatted(id, revision, day, day, at, count);
    }

    void report(@Nullable String key, @Nullable String value, String at) {
        report(key, value, at, new RecordHeaders());
    }

    @SuppressWarnings("NullAway") // records may have no key and no value
    void report(@Nullable String key, @Nullable String value, String at, Headers headers) {
        reports.pipeInput(new TestRecord<>(bytes(key), bytes(value), headers, Instant.parse(at)));
    }

    void response(String key, String value, String at) {
        responses.pipeInput(new TestRecord<>(bytes(key), bytes(value), new RecordHeaders(), Instant.parse(at)));
    }

    private static byte @Nullable [] bytes(@Nullable String text) {
        return text == null ? null : text.getBytes(StandardCharsets.UTF_8);
    }

    /** What was said of region-days since the last look, as {@code day count revision}. */
    List<String> regionDays() {
        return read(Topics.REGION_DAYS).stream()
                .map(TestRecord::value)
                .map(json -> json.replaceAll(
                        ".*\"region\":\"(.*?)\",\"day\":\"(.*?)\",\"count\":(\\d+),\"revision\":(\\d+).*",
                        "$1 $2 $3 $4"))
                .toList();
    }

    List<TestRecord<String, String>> read(String topic) {
        TestOutputTopic<String, String> out =
                driver.createOutputTopic(PREFIX + topic, new StringDeserializer(), new StringDeserializer());
        return new ArrayList<>(out.readRecordsToList());
    }

    List<TestRecord<byte[], byte[]>> rejected() {
        return driver.createOutputTopic(
                        PREFIX + Topics.REJECTED_REPORTS, new ByteArrayDeserializer(), new ByteArrayDeserializer())
                .readRecordsToList();
    }

    /** Everything the topology has sent anywhere, internal topics and changelogs included. */
    List<ProducedRecord> produced() {
        List<ProducedRecord> all = new ArrayList<>();
        for (String topic : driver.producedTopicNames()) {
            driver.createOutputTopic(topic, new ByteArrayDeserializer(), new ByteArrayDeserializer())
                    .readRecordsToList()
                    .forEach(record -> all.add(new ProducedRecord(topic, record)));
        }
        return all;
    }

    /** A record and its topic. */
    record ProducedRecord(String topic, TestRecord<byte[], byte[]> record) {

        String text() {
            return text(record.key()) + text(record.value());
        }

        private static String text(byte @Nullable [] bytes) {
            return bytes == null ? "" : new String(bytes, StandardCharsets.UTF_8);
        }
    }

    @Override
    public void close() {
        driver.close();
    }
}
