package org.seamwatch.processors.intake;

import java.util.Arrays;
import org.jspecify.annotations.Nullable;
import org.seamwatch.schemas.Sha256;

/**
 * A record that could not be used.
 *
 * @param topic input topic, without prefix
 * @param partition its partition
 * @param offset its offset
 * @param timestamp end of its hour, milliseconds since 1970-01-01T00Z
 * @param why the reason, the field and a sentence
 * @param key its key, cut
 * @param value its value, cut
 */
public record Rejection(String topic, int partition, long offset, long timestamp, Refusal why, Cut key, Cut value) {

    /** Bytes kept of a rejected record's key, and of its value. */
    public static final int KEPT = 256 * 1024;

    static Rejection of(LogRecord record, long timestamp, Refusal why) {
        return new Rejection(
                record.topic(),
                record.partition(),
                record.offset(),
                timestamp,
                why,
                Cut.of(record.key()),
                Cut.of(record.value()));
    }

    /**
     * Bytes, or the first {@link #KEPT} of them with the length and hash of all.
     *
     * @param bytes what is kept, or null where there was nothing
     * @param length the whole length; null where nothing was cut
     * @param sha256 SHA-256 of the whole, hexadecimal; null where nothing was cut
     */
    @SuppressWarnings("ArrayRecordComponent") // handed over, never compared
    public record Cut(
            byte @Nullable [] bytes,
            @Nullable Integer length,
            @Nullable String sha256) {

        static Cut of(byte @Nullable [] whole) {
            if (whole == null || whole.length <= KEPT) {
                return new Cut(whole, null, null);
            }
            return new Cut(Arrays.copyOf(whole, KEPT), whole.length, Sha256.hex(whole));
        }
    }
}
