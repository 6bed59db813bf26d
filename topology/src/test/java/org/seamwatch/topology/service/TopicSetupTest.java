package org.seamwatch.topology.service;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import java.util.Map;
import org.apache.kafka.clients.admin.Config;
import org.apache.kafka.common.config.ConfigResource;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;
import org.junit.jupiter.api.io.TempDir;
import org.seamwatch.fixtures.broker.Brokers;
import org.seamwatch.fixtures.broker.EmbeddedBroker;
import org.seamwatch.fixtures.broker.TopicTool;
import org.seamwatch.schemas.InputException;
import org.seamwatch.schemas.plan.Plan;
import org.seamwatch.topology.TestPlan;

@TestInstance(TestInstance.Lifecycle.PER_CLASS)
class TopicSetupTest {

    private final EmbeddedBroker broker = Brokers.embedded();
    private final TopicTool tool = TopicTool.of(broker.bootstrapServers());
    private final Path folder;

    TopicSetupTest(@TempDir Path folder) {
        this.folder = folder;
    }

    @AfterAll
    void close() {
        tool.close();
        broker.close();
    }

    private Plan plan(String prefix, int partitions, int seriesPartitions) {
        return TestPlan.in(folder)
                .kafka("bootstrap.servers", broker.bootstrapServers())
                .prefix(prefix)
                .partitions(partitions)
                .seriesPartitions(seriesPartitions)
                .plan();
    }

    private Config config(String topic) throws Exception {
        ConfigResource resource = new ConfigResource(ConfigResource.Type.TOPIC, topic);
        Map<ConfigResource, Config> configs =
                tool.admin().describeConfigs(List.of(resource)).all().get();
        return configs.values().iterator().next();
    }

    private String value(String topic, String key) throws Exception {
        return config(topic).get(key).value();
    }

    @Test
    void shouldCreateWhatIsMissingAndBeContentWithItAfterwards() throws Exception {
        assertThat(TopicSetup.prepare(plan("new.", 3, 2))).isEmpty();
        assertThat(tool.topics())
                .contains(
                        "new.case-reports",
                        "new.alarm-responses",
                        "new.rejected-reports",
                        "new.region-days",
                        "new.series-days",
                        "new.alarms");
        assertThat(tool.endOffsets("new.case-reports")).hasSize(3);
        assertThat(tool.endOffsets("new.alarm-responses")).hasSize(3);
        assertThat(tool.endOffsets("new.alarms")).hasSize(2);
        assertThat(value("new.case-reports", "message.timestamp.type")).isEqualTo("CreateTime");
        assertThat(value("new.case-reports", "message.timestamp.after.max.ms")).isEqualTo("600000");
        assertThat(value("new.case-reports", "cleanup.policy")).isEqualTo("delete");
        assertThat(value("new.case-reports", "retention.ms")).isEqualTo("-1");
        assertThat(value("new.region-days", "cleanup.policy")).isEqualTo("compact");
        assertThat(value("new.alarms", "cleanup.policy")).isEqualTo("delete");
        assertThat(value("new.alarms", "retention.ms")).isEqualTo("-1");
        assertThat(value("new.alarms", "message.timestamp.after.max.ms")).isEqualTo(String.valueOf(Long.MAX_VALUE));
        assertThat(value("new.rejected-reports", "retention.ms"))
                .isEqualTo(String.valueOf(Duration.ofDays(36_500).toMillis()));
        assertThat(TopicSetup.prepare(plan("new.", 3, 2))).isEmpty();
    }

    @Test
    void shouldRefuseAnotherNumberOfInputPartitions() {
        TopicSetup.prepare(plan("grown.", 2, 1));
        Plan plan = plan("grown.", 3, 1);
        assertThatThrownBy(() -> TopicSetup.prepare(plan))
                .isInstanceOf(InputException.class)
                .hasMessageMatching(
                        ".*yaml: topics.partitions: topic grown\\.(case-reports|alarm-responses|rejected-reports)"
                                + " has 2 partitions, the plan says 3: .*replay into topics under a new prefix");
    }

    @Test
    void shouldRefuseAnotherNumberOfSeriesPartitionsThanAnEarlierRunHad() {
        tool.create("earlier-report-changes-repartition", 4, Map.of());
        Plan plan = plan("earlier.", 2, 3);
        assertThatThrownBy(() -> TopicSetup.prepare(plan))
                .isInstanceOf(InputException.class)
                .hasMessageContaining("topics.seriesPartitions: topic earlier-report-changes-repartition has 4"
                        + " partitions, the plan says 3: set it back, or replay into topics under a new prefix");
        assertThat(tool.topics()).doesNotContain("earlier.case-reports");
    }

    @Test
    void shouldRefuseACompactedInput() {
        tool.create("compacted.case-reports", 1, Map.of("cleanup.policy", "compact"));
        Plan plan = plan("compacted.", 1, 1);
        assertThatThrownBy(() -> TopicSetup.prepare(plan))
                .isInstanceOf(InputException.class)
                .hasMessage(
                        "topic compacted.case-reports: cleanup.policy must be delete, was compact: compaction removes"
                                + " earlier revisions");
    }

    @Test
    void shouldWarnOfAnInputThatForgets() {
        tool.create("forgetful.case-reports", 1, Map.of("retention.ms", "604800000"));
        assertThat(TopicSetup.prepare(plan("forgetful.", 1, 1)))
                .containsExactly(
                        "topic forgetful.case-reports: retention.ms should be -1, was 604800000: what it deletes"
                                + " can never be replayed");
    }

    @Test
    void shouldSayWhichBrokerDoesNotAnswer() {
        Plan plan = TestPlan.in(folder)
                .kafka("bootstrap.servers", "127.0.0.1:1")
                .kafka("default.api.timeout.ms", 1_000)
                .kafka("request.timeout.ms", 500)
                .plan();
        assertThatThrownBy(() -> TopicSetup.prepare(plan))
                .isInstanceOf(NoBrokerException.class)
                .hasMessageContaining("kafka.bootstrap.servers: no broker answers at 127.0.0.1:1");
    }
}
