package org.seamwatch.topology.service;

import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.atomic.LongAdder;
import org.apache.kafka.common.TopicPartition;
import org.apache.kafka.streams.processor.StateRestoreListener;

/** How many records are still to be read back into local state; by offsets, which count a few that are no records. */
final class RestoreCount implements StateRestoreListener {

    private final Map<TopicPartition, Long> left = new ConcurrentHashMap<>();
    private final LongAdder restored = new LongAdder();

    @Override
    public void onRestoreStart(TopicPartition partition, String store, long from, long to) {
        left.put(partition, Math.max(0, to - from));
    }

    @Override
    public void onBatchRestored(TopicPartition partition, String store, long reached, long count) {
        restored.add(count);
        left.computeIfPresent(partition, (key, before) -> Math.max(0, before - count));
    }

    @Override
    public void onRestoreEnd(TopicPartition partition, String store, long total) {
        left.remove(partition);
    }

    @Override
    public void onRestoreSuspended(TopicPartition partition, String store, long total) {
        left.remove(partition);
    }

    /** How many have been read back since the start. */
    long restored() {
        return restored.sum();
    }

    long left() {
        return left.values().stream().mapToLong(Long::longValue).sum();
    }
}
