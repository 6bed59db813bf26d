package org.seamwatch.schemas.record;

import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import org.jspecify.annotations.Nullable;

/**
 * The record that passes time on an input partition: key {@code clock}, value {@code {"clock": true}}. Its time is its
 * timestamp. It is recognised before anything else, so the check is cheap for every other record.
 */
public final class ClockRecord {

    private static final byte[] KEY_BYTES = "clock".getBytes(StandardCharsets.US_ASCII);
    private static final byte[] VALUE_BYTES = "{\"clock\": true}".getBytes(StandardCharsets.US_ASCII);
    private static final String[] TOKENS = {"{", "\"clock\"", ":", "true", "}"};

    private ClockRecord() {}

    /** A copy of the key. */
    public static byte[] key() {
        return KEY_BYTES.clone();
    }

    /** A copy of the value. */
    public static byte[] value() {
        return VALUE_BYTES.clone();
    }

    /** Whether a record is a clock record; white space in the value is free. */
    public static boolean is(byte @Nullable [] key, byte @Nullable [] value) {
        return key != null && value != null && Arrays.equals(key, KEY_BYTES) && isClock(value);
    }

    private static boolean isClock(byte[] value) {
        int at = 0;
        for (String token : TOKENS) {
            at = afterSpace(value, at);
            for (int i = 0; i < token.length(); i++, at++) {
                if (at >= value.length || value[at] != token.charAt(i)) {
                    return false;
                }
            }
        }
        return afterSpace(value, at) == value.length;
    }

    private static int afterSpace(byte[] value, int from) {
        int at = from;
        while (at < value.length && (value[at] == ' ' || value[at] == '\t' || value[at] == '\n' || value[at] == '\r')) {
            at++;
        }
        return at;
    }
}
