package org.seamwatch.topology.service;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.Clock;
import java.time.Instant;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.util.List;
import org.apache.kafka.clients.producer.MockProducer;
import org.apache.kafka.clients.producer.ProducerRecord;
import org.apache.kafka.common.KafkaException;
import org.apache.kafka.common.TopicPartition;
import org.apache.kafka.common.serialization.ByteArraySerializer;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.seamwatch.schemas.record.ClockRecord;

class ClockmakerTest {

    private static final List<TopicPartition> PARTITIONS = List.of(
            new TopicPartition("case-reports", 0),
            new TopicPartition("case-reports", 1),
            new TopicPartition("alarm-responses", 0));

    private final Hand clock = new Hand(Instant.parse("2024-02-01T10:07:30Z"));
    private final MockProducer<byte[], byte[]> producer =
            new MockProducer<>(true, null, new ByteArraySerializer(), new ByteArraySerializer());
    private final Clockmaker clockmaker = new Clockmaker(producer, PARTITIONS, clock);

    /** A clock that stands until it is set. */
    private static final class Hand extends Clock {

        private Instant now;

        private Hand(Instant now) {
            this.now = now;
        }

        private void set(String text) {
            now = Instant.parse(text);
        }

        @Override
        public Instant instant() {
            return now;
        }

        @Override
        public ZoneId getZone() {
            return ZoneOffset.UTC;
        }

        @Override
        public Clock withZone(ZoneId zone) {
            return this;
        }
    }

    @AfterEach
    void close() {
        clockmaker.close();
    }

    private List<String> times() {
        return producer.history().stream()
                .map(r -> Instant.ofEpochMilli(r.timestamp()).toString())
                .distinct()
                .toList();
    }

    @Test
    void shouldWriteToEveryPartitionWhatIntakeKnowsAsAClockRecord() {
        clockmaker.tick();
        assertThat(producer.history())
                .extracting(r -> new TopicPartition(r.topic(), r.partition()))
                .containsExactlyElementsOf(PARTITIONS);
        assertThat(producer.history()).allMatch(r -> ClockRecord.is(r.key(), r.value()));
        assertThat(clockmaker.written())
                .isEqualTo(Instant.parse("2024-02-01T10:00:00Z").toEpochMilli());
    }

    @Test
    void shouldWriteEachStepOnceWithItsOwnTime() {
        clockmaker.tick();
        clockmaker.tick();
        clock.set("2024-02-01T10:10:00.001Z");
        clockmaker.tick();
        clock.set("2024-02-01T10:19:59.999Z");
        clockmaker.tick();
        clock.set("2024-02-01T11:00:00Z");
        clockmaker.tick();
        assertThat(times()).containsExactly("2024-02-01T10:00:00Z", "2024-02-01T10:10:00Z", "2024-02-01T11:00:00Z");
        assertThat(producer.history()).hasSize(3 * PARTITIONS.size());
    }

    @Test
    void shouldWriteNothingWhileTheClockIsSetBack() {
        clockmaker.tick();
        clock.set("2024-02-01T09:30:00Z");
        clockmaker.tick();
        assertThat(times()).containsExactly("2024-02-01T10:00:00Z");
    }

    @Test
    void shouldTryAStepAgainThatCouldNotBeWritten() {
        producer.sendException = new KafkaException("the broker is away");
        clockmaker.tick();
        assertThat(clockmaker.failures()).isEqualTo(1);
        assertThat(clockmaker.written()).isEqualTo(-1);
        producer.sendException = null;
        clockmaker.tick();
        assertThat(producer.history()).extracting(ProducerRecord::timestamp).hasSize(PARTITIONS.size());
        assertThat(clockmaker.written())
                .isEqualTo(Instant.parse("2024-02-01T10:00:00Z").toEpochMilli());
    }
}
