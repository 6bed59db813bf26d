package org.seamwatch.schemas.record;

import com.fasterxml.jackson.annotation.JsonInclude;
import org.jspecify.annotations.Nullable;

/**
 * One record of an input topic, a line of {@code log.ndjson}. Key and value are text where they are UTF-8, else Base64;
 * one that is absent in both forms was null.
 *
 * @param topic name of the topic without the prefix
 * @param partition partition, from 0
 * @param offset offset in the partition, from 0
 * @param timestamp time of the record in milliseconds since 1970-01-01T00:00:00Z
 * @param key the key as text
 * @param keyBase64 the key's bytes, where they are not UTF-8
 * @param value the value as text
 * @param valueBase64 the value's bytes, where they are not UTF-8
 */
@JsonInclude(JsonInclude.Include.NON_NULL)
public record LogLine(
        String topic,
        int partition,
        long offset,
        long timestamp,
        @Nullable String key,
        @Nullable String keyBase64,
        @Nullable String value,
        @Nullable String valueBase64) {

    /** The line of a record as it came. */
    public static LogLine of(
            String topic, int partition, long offset, long timestamp, byte @Nullable [] key, byte @Nullable [] value) {
        TextOrBytes k = TextOrBytes.of(key);
        TextOrBytes v = TextOrBytes.of(value);
        return new LogLine(topic, partition, offset, timestamp, k.text(), k.base64(), v.text(), v.base64());
    }

    /** The key's bytes as they came. */
    public byte @Nullable [] keyBytes() {
        return new TextOrBytes(key, keyBase64).bytes();
    }

    /** The value's bytes as they came. */
    public byte @Nullable [] valueBytes() {
        return new TextOrBytes(value, valueBase64).bytes();
    }
}
