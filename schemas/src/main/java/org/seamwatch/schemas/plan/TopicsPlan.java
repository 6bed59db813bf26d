package org.seamwatch.schemas.plan;

import java.time.Duration;

/**
 * Names and sizes of the topics.
 *
 * @param prefix what every topic's name begins with
 * @param partitions partitions of each input topic; fixed for the life of the log
 * @param seriesPartitions partitions of everything keyed by series
 * @param replication replicas of each partition
 * @param rejectedRetention how long rejected reports are kept
 */
public record TopicsPlan(
        String prefix, int partitions, int seriesPartitions, int replication, Duration rejectedRetention) {

    public static TopicsPlan defaults() {
        return new TopicsPlan("seamwatch.", 6, 6, 3, Duration.ofDays(30));
    }
}
