package org.seamwatch.topology;

import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.apache.kafka.common.header.Headers;

/** Sends what concerns a series to its partition, and watermarks, whose key is empty, to all of them. */
final class ChangesPartitioner extends Routing {

    @Override
    Set<Integer> choose(byte[] key, Headers headers, int partitions) {
        if (key.length == 0) {
            return IntStream.range(0, partitions).boxed().collect(Collectors.toUnmodifiableSet());
        }
        return Set.of(SeriesPartition.of(key, partitions));
    }
}
