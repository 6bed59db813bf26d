package org.seamwatch.topology.service;

import java.time.Duration;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.apache.kafka.clients.consumer.Consumer;
import org.apache.kafka.clients.consumer.KafkaConsumer;
import org.apache.kafka.common.TopicPartition;
import org.apache.kafka.common.serialization.ByteArrayDeserializer;
import org.seamwatch.fixtures.broker.TopicTool;
import org.seamwatch.processors.flow.Topics;
import org.seamwatch.topology.Names;

/**
 * Knows when a run has nothing left to do: its group has committed the end of every input partition, and behind what
 * it has committed in the topics between the stages there is no record. Transaction marks and open transactions are
 * told apart by reading: ends alone would not do.
 */
final class Drain {

    private static final Duration POLL = Duration.ofMillis(100);

    private final TopicTool tool;
    private final String bootstrap;
    private final String prefix;
    private final String application;

    Drain(TopicTool tool, String bootstrap, String prefix, String application) {
        this.tool = tool;
        this.bootstrap = bootstrap;
        this.prefix = prefix;
        this.application = application;
    }

    /** Whether all is read and applied. Inputs first: what they lead to is committed with them. */
    boolean isEmpty() {
        return inputsAreRead()
                && Stream.of(Names.REPORT_CHANGES, Names.RESPONSE_CHANGES)
                        .allMatch(changes -> isRead(application + "-" + Names.repartitionTopic(changes)));
    }

    /** Whether so many input records at least are read. */
    boolean hasRead(long records) {
        return tool.committed(application).entrySet().stream()
                        .filter(e -> e.getKey().topic().startsWith(prefix))
                        .mapToLong(Map.Entry::getValue)
                        .sum()
                >= records;
    }

    private boolean inputsAreRead() {
        Map<TopicPartition, Long> committed = tool.committed(application);
        return Stream.of(Topics.CASE_REPORTS, Topics.ALARM_RESPONSES)
                .allMatch(topic -> tool.endOffsets(prefix + topic).entrySet().stream()
                        .allMatch(end -> committed.getOrDefault(new TopicPartition(prefix + topic, end.getKey()), 0L)
                                >= end.getValue()));
    }

    private boolean isRead(String topic) {
        Map<TopicPartition, Long> committed = tool.committed(application);
        try (Consumer<byte[], byte[]> consumer = consumer()) {
            Map<Integer, Long> ends = tool.endOffsets(topic);
            for (Map.Entry<Integer, Long> end : ends.entrySet()) {
                TopicPartition partition = new TopicPartition(topic, end.getKey());
                if (!isRead(consumer, partition, committed.getOrDefault(partition, 0L), end.getValue())) {
                    return false;
                }
            }
            return true;
        }
    }

    private static boolean isRead(Consumer<?, ?> consumer, TopicPartition partition, long from, long end) {
        consumer.assign(List.of(partition));
        consumer.seek(partition, from);
        for (int looks = 0; consumer.position(partition) < end; looks++) {
            if (!consumer.poll(POLL).isEmpty() || looks > 5) {
                return false;
            }
        }
        return true;
    }

    private Consumer<byte[], byte[]> consumer() {
        return new KafkaConsumer<>(
                Map.of(
                        "bootstrap.servers",
                        bootstrap,
                        "isolation.level",
                        "read_committed",
                        "auto.offset.reset",
                        "earliest",
                        "enable.auto.commit",
                        false),
                new ByteArrayDeserializer(),
                new ByteArrayDeserializer());
    }
}
