package org.seamwatch.processors.state;

import java.nio.charset.StandardCharsets;
import org.jspecify.annotations.Nullable;

/** Reads what {@link ByteWriter} wrote. */
public final class ByteReader {

    private final byte[] row;
    private int at;

    /** Opens a row and checks its version. */
    public ByteReader(byte[] row, int version) {
        if (row.length == 0 || row[0] != version) {
            throw new IllegalArgumentException(
                    "row version must be " + version + ", was " + (row.length == 0 ? "absent" : row[0]));
        }
        this.row = row;
        this.at = 1;
    }

    public long number() {
        long zigzag = 0;
        int shift = 0;
        byte b;
        do {
            b = row[at++];
            zigzag |= (long) (b & 0x7F) << shift;
            shift += 7;
        } while (b < 0);
        return (zigzag >>> 1) ^ -(zigzag & 1);
    }

    public int integer() {
        return Math.toIntExact(number());
    }

    public double real() {
        long bits = 0;
        for (int i = 0; i < 8; i++) {
            bits = bits << 8 | (row[at++] & 0xFF);
        }
        return Double.longBitsToDouble(bits);
    }

    public String text() {
        String value = textOrNull();
        if (value == null) {
            throw new IllegalArgumentException("a string is missing in a row");
        }
        return value;
    }

    /** Passes over a string or null; whether there was a string. */
    public boolean skipText() {
        int length = integer();
        at += Math.max(0, length);
        return length >= 0;
    }

    public @Nullable String textOrNull() {
        int length = integer();
        if (length < 0) {
            return null;
        }
        String value = new String(row, at, length, StandardCharsets.UTF_8);
        at += length;
        return value;
    }
}
