package org.seamwatch.ops;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.PrintWriter;
import java.io.StringWriter;
import java.time.Clock;
import java.time.Duration;
import java.time.Instant;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.util.List;
import java.util.Map;
import org.apache.kafka.streams.KafkaStreams;
import org.apache.kafka.streams.errors.InvalidStateStoreException;
import org.junit.jupiter.api.Test;
import org.seamwatch.schemas.record.AccountingLine;

class RunReportTest {

    private final StringWriter out = new StringWriter();
    private final HandClock clock = new HandClock();
    private final Engine engine = new Engine();
    private boolean answers = true;
    private final RunReport report = new RunReport(
            new RunLog(new Console(new PrintWriter(out), new PrintWriter(out), false), clock), engine, () -> answers);

    private static final class HandClock extends Clock {
        private Instant now = Instant.parse("2024-03-01T10:00:00Z");

        @Override
        public ZoneId getZone() {
            return ZoneOffset.UTC;
        }

        @Override
        public Clock withZone(ZoneId zone) {
            throw new UnsupportedOperationException();
        }

        @Override
        public Instant instant() {
            return now;
        }
    }

    private static final class Engine implements RunReport.Subject {
        private KafkaStreams.State state = KafkaStreams.State.REBALANCING;
        private long left;
        private long restored;
        private boolean moving;
        private List<AccountingLine> lines = List.of();

        @Override
        public KafkaStreams.State state() {
            return state;
        }

        @Override
        public long toRestore() {
            return left;
        }

        @Override
        public long restored() {
            return restored;
        }

        @Override
        public List<AccountingLine> accounting() {
            if (moving) {
                throw new InvalidStateStoreException("moving");
            }
            return lines;
        }
    }

    private List<String> after(Duration pause) {
        clock.now = clock.now.plus(pause);
        out.getBuffer().setLength(0);
        report.look();
        return out.toString().lines().toList();
    }

    @Test
    void shouldSayOnceThatStateIsRebuiltAndThatItRuns() {
        engine.left = 12_345;
        assertThat(after(Duration.ZERO))
                .containsExactly("2024-03-01T10:00:00Z  rebuilding local state from Kafka: about 12,345 records to go");
        engine.left = 9_000;
        assertThat(after(Duration.ofSeconds(1))).isEmpty();
        assertThat(after(Duration.ofSeconds(29)))
                .containsExactly("2024-03-01T10:00:30Z  rebuilding local state from Kafka: about 9,000 records to go");
        engine.left = 0;
        engine.restored = 12_345;
        engine.state = KafkaStreams.State.RUNNING;
        assertThat(after(Duration.ofSeconds(1)))
                .containsExactly("2024-03-01T10:00:31Z  12,345 records of local state have been read back from Kafka;"
                        + " running");
        assertThat(after(Duration.ofSeconds(1))).isEmpty();
        engine.state = KafkaStreams.State.REBALANCING;
        engine.left = 2;
        assertThat(after(Duration.ofMinutes(1)))
                .containsExactly("2024-03-01T10:01:32Z  partitions are being shared out anew");
        engine.state = KafkaStreams.State.RUNNING;
        assertThat(after(Duration.ofSeconds(1))).startsWith("2024-03-01T10:01:33Z  running");
    }

    @Test
    void shouldSayThatTheBrokerWentAndCame() {
        answers = false;
        assertThat(after(Duration.ZERO))
                .containsExactly("2024-03-01T10:00:00Z  the broker does not answer; nothing is read until it does");
        assertThat(after(Duration.ofSeconds(10))).isEmpty();
        answers = true;
        assertThat(after(Duration.ofSeconds(10)))
                .containsExactly(
                        "2024-03-01T10:00:20Z  the broker answers again; it was away since 2024-03-01T10:00:00Z");
    }

    @Test
    void shouldCountAtGrowingPausesAndWarnOfWhatIsRejected() {
        engine.state = KafkaStreams.State.RUNNING;
        assertThat(after(Duration.ZERO)).containsExactly("2024-03-01T10:00:00Z  running");
        engine.lines = List.of(RunCountsTest.line("case-reports", 0, 97, Map.of("too-old", 100L)));
        assertThat(after(Duration.ofSeconds(9))).isEmpty();
        assertThat(after(Duration.ofSeconds(1)))
                .containsExactly(
                        "2024-03-01T10:00:10Z  200 reports read so far: 97 accepted, 2 duplicate, 1 superseded,"
                                + " 100 rejected",
                        "2024-03-01T10:00:10Z  warning: so far 100 of 200 reports were rejected, most often as too-old"
                                + " (100)");
        engine.lines = List.of(RunCountsTest.line("case-reports", 0, 197, Map.of("too-old", 101L)));
        engine.moving = true;
        assertThat(after(Duration.ofMinutes(1))).isEmpty();
        engine.moving = false;
        assertThat(after(Duration.ofSeconds(1)))
                .as("one more rejected of 101")
                .containsExactly("2024-03-01T10:01:11Z  301 reports read so far: 197 accepted, 2 duplicate,"
                        + " 1 superseded, 101 rejected");
        assertThat(after(Duration.ofMinutes(9))).isEmpty();
        assertThat(after(Duration.ofMinutes(1))).hasSize(1);
    }
}
