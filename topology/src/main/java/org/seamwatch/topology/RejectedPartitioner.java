package org.seamwatch.topology;

import java.nio.charset.StandardCharsets;
import java.util.Set;
import org.apache.kafka.common.header.Headers;

/** Rejected records keep to the partition they came from, so that theirs stay in order. */
final class RejectedPartitioner extends Routing {

    @Override
    Set<Integer> choose(byte[] key, Headers headers, int partitions) {
        byte[] from = headers.lastHeader(RejectedHeaders.PARTITION).value();
        return Set.of(Integer.parseInt(new String(from, StandardCharsets.UTF_8)) % partitions);
    }
}
