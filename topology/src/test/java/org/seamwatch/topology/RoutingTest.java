package org.seamwatch.topology;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.util.Optional;
import java.util.Set;
import org.apache.kafka.clients.consumer.ConsumerRecord;
import org.apache.kafka.common.header.Headers;
import org.apache.kafka.common.header.internals.RecordHeaders;
import org.junit.jupiter.api.Test;

class RoutingTest {

    private static final Headers NONE = new RecordHeaders();

    private static byte[] bytes(String text) {
        return text.getBytes(StandardCharsets.UTF_8);
    }

    @Test
    void shouldPutASeriesWhereAProducerWouldPutItsKey() {
        // Murmur2 of Kafka's clients, as their own tests give it (Utils.murmur2 of "21", "foobar"): -973932308,
        // -790332482.
        assertThat(SeriesPartition.of("21", 1_000)).isEqualTo((-973_932_308 & 0x7fffffff) % 1_000);
        assertThat(SeriesPartition.of("foobar", 1_000)).isEqualTo((-790_332_482 & 0x7fffffff) % 1_000);
    }

    @Test
    void shouldSendWatermarksToAllAndTheRestToOne() {
        ChangesPartitioner partitioner = new ChangesPartitioner();
        byte[] series = bytes("northmarch/influenza");
        assertThat(partitioner.partitions("t", new byte[0], series, NONE, 3)).isEqualTo(Optional.of(Set.of(0, 1, 2)));
        assertThat(partitioner.partitions("t", series, series, NONE, 7))
                .isEqualTo(Optional.of(Set.of(SeriesPartition.of("northmarch/influenza", 7))));
    }

    @Test
    void shouldKeepResultsOfASeriesTogether() {
        ResultPartitioner partitioner = new ResultPartitioner();
        for (int n = 1; n < 50; n++) {
            Optional<Set<Integer>> own = Optional.of(Set.of(SeriesPartition.of("northmarch/influenza", n)));
            assertThat(partitioner.partitions("t", bytes("northmarch/influenza"), bytes(""), NONE, n))
                    .isEqualTo(own);
            assertThat(partitioner.partitions("t", bytes("northmarch/influenza|NM-001|2024-02-01"), bytes(""), NONE, n))
                    .isEqualTo(own);
        }
    }

    @Test
    void shouldKeepRejectedRecordsInTheirPartition() {
        Headers from = new RecordHeaders().add("partition", bytes("5"));
        RejectedPartitioner partitioner = new RejectedPartitioner();
        assertThat(partitioner.partitions("t", bytes(""), bytes(""), from, 6)).isEqualTo(Optional.of(Set.of(5)));
        assertThat(partitioner.partitions("t", bytes(""), bytes(""), from, 4)).isEqualTo(Optional.of(Set.of(1)));
    }

    @Test
    void shouldTakeTheLogsTimeAndNeverThrow() {
        LogTime time = new LogTime();
        assertThat(time.extract(new ConsumerRecord<>("t", 0, 0, "k", "v"), 77)).isZero();
        ConsumerRecord<Object, Object> record = new ConsumerRecord<>(
                "t",
                0,
                0,
                42,
                org.apache.kafka.common.record.TimestampType.CREATE_TIME,
                0,
                0,
                "k",
                "v",
                NONE,
                Optional.empty());
        assertThat(time.extract(record, 77)).isEqualTo(42);
    }
}
