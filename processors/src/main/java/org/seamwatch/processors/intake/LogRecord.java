package org.seamwatch.processors.intake;

import org.jspecify.annotations.Nullable;

/**
 * A record of an input topic as it lies in the log.
 *
 * @param topic name of the topic, without prefix
 * @param partition its partition
 * @param offset its offset
 * @param timestamp the log's timestamp, milliseconds since 1970-01-01T00Z, from 0
 * @param key key bytes, or null
 * @param value value bytes, or null
 */
@SuppressWarnings("ArrayRecordComponent") // handed over, never compared
public record LogRecord(
        String topic, int partition, long offset, long timestamp, byte @Nullable [] key, byte @Nullable [] value) {

    // Written out, since a compact constructor loses the annotations of its parameters.
    public LogRecord(
            String topic, int partition, long offset, long timestamp, byte @Nullable [] key, byte @Nullable [] value) {
        this.topic = topic;
        this.partition = partition;
        this.offset = offset;
        this.timestamp = Math.max(0, timestamp);
        this.key = key;
        this.value = value;
    }
}
