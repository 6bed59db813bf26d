package org.seamwatch.topology.service;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.nio.file.Path;
import java.util.Properties;
import org.apache.kafka.common.errors.DisconnectException;
import org.apache.kafka.streams.StreamsConfig;
import org.apache.kafka.streams.errors.StreamsException;
import org.apache.kafka.streams.errors.StreamsUncaughtExceptionHandler.StreamThreadExceptionResponse;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.schemas.InputException;
import org.seamwatch.topology.TestPlan;

class StreamsSettingsTest {

    @Test
    void shouldKeepPrefixesApart(@TempDir Path folder) {
        assertThat(ApplicationId.of(TestPlan.in(folder).plan())).isEqualTo("seamwatch");
        assertThat(ApplicationId.of(TestPlan.in(folder).prefix("north.watch-").plan()))
                .isEqualTo("north.watch");
        assertThat(ApplicationId.of(TestPlan.in(folder).prefix("").plan())).isEqualTo("seamwatch");
        assertThat(ApplicationId.of(
                        TestPlan.in(folder).kafka("application.id", "own").plan()))
                .isEqualTo("own");
    }

    @Test
    void shouldTakeThePlansPropertiesButForTheGuarantees(@TempDir Path folder) {
        Properties properties = StreamsSettings.of(TestPlan.in(folder)
                .kafka("commit.interval.ms", 77)
                .kafka("processing.guarantee", "at_least_once")
                .kafka("default.timestamp.extractor", "x")
                .plan());
        StreamsConfig config = new StreamsConfig(properties);
        assertThat(config.getLong(StreamsConfig.COMMIT_INTERVAL_MS_CONFIG)).isEqualTo(77);
        assertThat(config.getString(StreamsConfig.PROCESSING_GUARANTEE_CONFIG)).isEqualTo("exactly_once_v2");
        assertThat(properties).containsEntry("topic.retention.ms", "-1");
    }

    @Test
    void shouldGivePlainClientsOnlyWhatIsTheirs(@TempDir Path folder) {
        Properties properties = StreamsSettings.client(TestPlan.in(folder)
                .kafka("security.protocol", "SSL")
                .kafka("ssl.truststore.location", "/t")
                .kafka("state.dir", "/s")
                .plan());
        assertThat(properties).containsOnlyKeys("bootstrap.servers", "security.protocol", "ssl.truststore.location");
    }

    @Test
    void shouldSayWhichPropertyIsWrong(@TempDir Path folder) {
        Watch watch = TestPlan.in(folder).kafka("commit.interval.ms", "often").watch();
        assertThatThrownBy(() -> new StreamsService(watch))
                .isInstanceOf(InputException.class)
                .hasMessageContaining("yaml: kafka: Invalid value often for configuration commit.interval.ms");
    }

    @Test
    void shouldReplaceAThreadOnlyForAPassingFault() {
        FailureRule rule = new FailureRule();
        assertThat(rule.handle(new StreamsException(new DisconnectException("away"))))
                .isEqualTo(StreamThreadExceptionResponse.REPLACE_THREAD);
        assertThat(rule.stops()).isFalse();
        assertThat(rule.handle(new StreamsException(new IllegalStateException("ours"))))
                .isEqualTo(StreamThreadExceptionResponse.SHUTDOWN_CLIENT);
        assertThat(rule.stops()).isTrue();
        assertThat(rule.failures()).isEqualTo(2);
    }
}
