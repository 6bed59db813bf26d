package org.seamwatch.topology;

import java.util.Optional;
import java.util.Set;
import org.apache.kafka.common.header.Headers;
import org.apache.kafka.common.header.internals.RecordHeaders;
import org.apache.kafka.streams.processor.StreamPartitioner;

/** Chooses partitions from a record's key and headers alone. */
abstract class Routing implements StreamPartitioner<byte[], byte[]> {

    abstract Set<Integer> choose(byte[] key, Headers headers, int partitions);

    @Override
    public final Optional<Set<Integer>> partitions(
            String topic, byte[] key, byte[] value, Headers headers, int partitions) {
        return Optional.of(choose(key, headers, partitions));
    }

    /** The form without headers, which the engine no longer calls and the interface still asks for. */
    @Override
    @SuppressWarnings("removal")
    public final Optional<Set<Integer>> partitions(String topic, byte[] key, byte[] value, int partitions) {
        return partitions(topic, key, value, new RecordHeaders(), partitions);
    }
}
