package org.seamwatch.schemas.record;

import com.fasterxml.jackson.annotation.JsonInclude;
import org.jspecify.annotations.Nullable;

/**
 * One record that could not be used, a line of {@code rejected.ndjson}. Key and value are text where they are UTF-8,
 * else Base64; one that is absent in both forms was null.
 *
 * @param topic name of the input topic without the prefix
 * @param partition its partition there, from 0
 * @param offset its offset there, from 0
 * @param reason why, a code of {@link RejectReason}
 * @param field the field at fault; empty where no single one is
 * @param detail the rule and the value in a sentence; may hold personal data
 * @param key the key as text
 * @param keyBase64 the key's bytes, where they are not UTF-8
 * @param value the value as text, as much of it as is kept
 * @param valueBase64 the value's bytes, where those kept are not UTF-8
 * @param length length of the whole value in bytes, where only its start is kept
 * @param sha256 SHA-256 of the whole value in hexadecimal digits, where only its start is kept
 */
@JsonInclude(JsonInclude.Include.NON_NULL)
public record RejectedLine(
        String topic,
        int partition,
        long offset,
        String reason,
        String field,
        String detail,
        @Nullable String key,
        @Nullable String keyBase64,
        @Nullable String value,
        @Nullable String valueBase64,
        @Nullable Long length,
        @Nullable String sha256) {

    /** The line of a record whose value is kept whole, or, with length and hash, its start. */
    public static RejectedLine of(
            String topic,
            int partition,
            long offset,
            ReadResult.Unusable<?> why,
            byte @Nullable [] key,
            byte @Nullable [] value,
            @Nullable Long length,
            @Nullable String sha256) {
        TextOrBytes k = TextOrBytes.of(key);
        TextOrBytes v = TextOrBytes.of(value);
        return new RejectedLine(
                topic,
                partition,
                offset,
                why.reason().code(),
                why.field(),
                why.detail(),
                k.text(),
                k.base64(),
                v.text(),
                v.base64(),
                length,
                sha256);
    }
}
