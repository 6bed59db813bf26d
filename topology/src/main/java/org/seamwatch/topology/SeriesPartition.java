package org.seamwatch.topology;

import java.nio.charset.StandardCharsets;
import org.apache.kafka.common.utils.Utils;

/**
 * Which partition keeps a series: murmur2 over the id in UTF-8, as a producer would choose for that key. Everything
 * that routes by series asks here.
 */
final class SeriesPartition {

    private SeriesPartition() {}

    static int of(String series, int partitions) {
        return of(series.getBytes(StandardCharsets.UTF_8), partitions);
    }

    static int of(byte[] series, int partitions) {
        return Utils.toPositive(Utils.murmur2(series)) % partitions;
    }
}
