package org.seamwatch.topology;

import java.nio.charset.StandardCharsets;
import java.util.Set;
import org.apache.kafka.common.header.Headers;

/** Results of a series lie in its partition: the key is the series, alone or followed by {@code |}. */
final class ResultPartitioner extends Routing {

    @Override
    Set<Integer> choose(byte[] key, Headers headers, int partitions) {
        String text = new String(key, StandardCharsets.UTF_8);
        int cut = text.indexOf('|');
        return Set.of(SeriesPartition.of(cut < 0 ? text : text.substring(0, cut), partitions));
    }
}
