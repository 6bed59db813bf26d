package org.seamwatch.ops;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import java.util.List;
import java.util.Map;
import org.apache.kafka.clients.consumer.ConsumerRecord;
import org.apache.kafka.clients.producer.ProducerRecord;
import org.apache.kafka.clients.producer.internals.BuiltInPartitioner;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seamwatch.fixtures.broker.Brokers;
import org.seamwatch.fixtures.broker.KafkaBroker;
import org.seamwatch.fixtures.broker.TopicTool;
import org.seamwatch.schemas.record.ClockRecord;

/** Sends to a real broker in this process; each test has a topic of its own. */
class SendCommandTest {

    private static KafkaBroker broker = Brokers.embedded();
    private static TopicTool topics = TopicTool.of(broker.bootstrapServers());

    private final Path folder;
    private final PlanFiles files;

    SendCommandTest(@TempDir Path folder) {
        this.folder = folder;
        this.files = new PlanFiles(folder);
    }

    @AfterAll
    static void stop() {
        topics.close();
        broker.close();
    }

    private String topic(String prefix) {
        files.plan("kafka: { bootstrap.servers: \"" + broker.bootstrapServers() + "\" }\n"
                + PlanFiles.PLAN.replace("partitions: 2", "prefix: \"" + prefix + ".\", partitions: 2"));
        return prefix + ".case-reports";
    }

    private static String report(String id, String reportedAt) {
        return "{\"reportId\":\"" + id + "\",\"source\":\"lab\",\"status\":\"final\",\"condition\":\"flu\","
                + "\"region\":\"A\",\"eventDate\":\"2024-03-01\",\"reportedAt\":\"" + reportedAt + "\"}";
    }

    private Path reports(String... lines) throws IOException {
        return Files.write(folder.resolve("reports.ndjson"), List.of(lines));
    }

    private static String text(byte[] bytes) {
        return new String(bytes, StandardCharsets.UTF_8);
    }

    @Test
    void shouldSendHistoryUnderTheTimesOfAReplay() throws IOException {
        String topic = topic("history");
        String[] lines = {
            report("a", "2024-03-01T10:00:00Z"),
            report("b", "2024-03-01T12:00:00Z"),
            report("c", "2024-03-01T11:00:00Z")
        };
        Run run = Run.of("send", "--plan", files.plan(), "--history", reports(lines));
        assertThat(run.code()).as(run.err()).isZero();
        assertThat(run.err()).isEmpty();
        assertThat(run.out().strip())
                .isEqualTo("3 reports sent to history.case-reports; 0 lines are no reports and were not sent");
        List<ConsumerRecord<byte[], byte[]>> sent = topics.read(topic);
        assertThat(sent)
                .extracting(record -> text(record.key()) + " " + Instant.ofEpochMilli(record.timestamp()))
                .containsExactlyInAnyOrder(
                        "a 2024-03-01T10:00:00Z", "b 2024-03-01T12:00:00Z", "c 2024-03-01T12:00:00Z");
        assertThat(sent).allSatisfy(record -> {
            assertThat(lines).contains(text(record.value()));
            assertThat(record.partition()).isEqualTo(BuiltInPartitioner.partitionForKey(record.key(), 2));
        });
    }

    @Test
    void shouldGiveThePresentWithoutHistory() throws IOException {
        String topic = topic("present");
        long before = System.currentTimeMillis();
        assertThat(Run.of("send", "--plan", files.plan(), reports(report("a", "2024-03-01T10:00:00Z")))
                        .code())
                .isZero();
        assertThat(topics.read(topic))
                .singleElement()
                .satisfies(record -> assertThat(record.timestamp()).isBetween(before, System.currentTimeMillis()));
    }

    @Test
    void shouldNameLinesThatAreNoReportsAndSendTheRest() throws IOException {
        String topic = topic("faults");
        Path input = reports(
                report("a", "2024-03-01T10:00:00Z"),
                "rubbish",
                report("b", "when the secret patient came"),
                report("c", "2024-03-01T10:00:00Z"));
        Run run = Run.of("send", "--plan", files.plan(), input);
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.out()).contains("2 reports sent to faults.case-reports; 2 lines are no reports and were not");
        assertThat(run.errLines()).containsExactly(input + ":2: not-json", input + ":3: reportedAt: bad-value");
        assertThat(topics.read(topic)).hasSize(2);
    }

    @Test
    void shouldWarnOfHistoryBehindTheTopicsTimeOrOutOfOrder() throws IOException {
        String topic = topic("late");
        topics.create(topic, 2, Map.of("retention.ms", "-1"));
        long clock = Instant.parse("2024-05-01T00:00:00Z").toEpochMilli();
        topics.send(new ProducerRecord<>(topic, 1, clock, ClockRecord.key(), ClockRecord.value()));
        Run run = Run.of(
                "send",
                "--plan",
                files.plan(),
                "--history",
                reports(report("a", "2024-03-05T10:00:00Z"), report("b", "2024-03-01T10:00:00Z")));
        assertThat(run.code()).isZero();
        assertThat(run.errLines()).hasSize(2);
        assertThat(run.errLines().get(0))
                .startsWith("seamwatch: warning: case-reports already reaches 2024-05-01T00:00:00Z: history before");
        assertThat(run.errLines().get(1))
                .startsWith("seamwatch: warning: history must be in time order: a report lies 4 days before");
    }

    @Test
    void shouldAskForHistoryWhereReportsAreOld() throws IOException {
        String topic = topic("old");
        String old = "2024-03-01T10:00:00Z";
        Run run = Run.of(
                "send",
                "--plan",
                files.plan(),
                reports(
                        report("a", old),
                        report("b", old),
                        report("c", old),
                        report("d", old),
                        report("e", Instant.now().toString())));
        assertThat(run.code()).isZero();
        assertThat(run.errLines())
                .containsExactly("seamwatch: warning: 4 of 5 reports are older than a day and are stamped with the"
                        + " present time; did you mean --history?");
        assertThat(topics.read(topic)).hasSize(5);
    }

    @Test
    void shouldMakeTheTopicsSoThatHistoryCanBeSentBeforeTheServiceRuns() throws IOException {
        topic("first");
        Run run = Run.of("send", "--plan", files.plan(), "--history", reports(report("a", "2024-03-01T10:00:00Z")));
        assertThat(run.code()).as(run.err()).isZero();
        assertThat(run.out().strip())
                .isEqualTo("1 report sent to first.case-reports; 0 lines are no reports and were not sent");
        assertThat(topics.topics()).contains("first.case-reports", "first.alarm-responses", "first.alarms");
    }

    @Test
    void shouldSayThatNoBrokerAnswers() throws IOException {
        files.plan("kafka: { bootstrap.servers: \"localhost:1\", default.api.timeout.ms: \"2000\","
                + " request.timeout.ms: \"1000\" }\n" + PlanFiles.PLAN);
        Run run = Run.of("send", "--plan", files.plan(), reports(report("a", "2024-03-01T10:00:00Z")));
        assertThat(run.code()).isEqualTo(1);
        assertThat(run.errLines())
                .containsExactly("seamwatch: " + files.plan() + ": kafka.bootstrap.servers: no broker answers at"
                        + " localhost:1 (listing topics)");
    }
}
