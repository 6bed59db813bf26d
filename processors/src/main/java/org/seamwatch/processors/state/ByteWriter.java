package org.seamwatch.processors.state;

import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import org.jspecify.annotations.Nullable;

/** Writes compact rows: a version byte, then numbers in base 128 and strings in UTF-8 with their length. */
public final class ByteWriter {

    private static final int LONGEST_NUMBER = 10;

    private byte[] row = new byte[96];
    private int size;

    /** Begins a row of a codec's version, 0 to 127. */
    public ByteWriter(int version) {
        row[size++] = (byte) version;
    }

    private ByteWriter() {}

    /** Begins a part of a row, without a version. */
    public static ByteWriter part() {
        return new ByteWriter();
    }

    /** What another writer has written. */
    public ByteWriter raw(byte[] part) {
        room(part.length);
        System.arraycopy(part, 0, row, size, part.length);
        size += part.length;
        return this;
    }

    /** A number; small magnitudes of either sign take few bytes. */
    public ByteWriter number(long value) {
        room(LONGEST_NUMBER);
        long zigzag = (value << 1) ^ (value >> 63);
        while ((zigzag & ~0x7FL) != 0) {
            row[size++] = (byte) ((zigzag & 0x7F) | 0x80);
            zigzag >>>= 7;
        }
        row[size++] = (byte) zigzag;
        return this;
    }

    /** A floating-point number, bit for bit. */
    public ByteWriter real(double value) {
        room(Long.BYTES);
        long bits = Double.doubleToRawLongBits(value);
        for (int shift = 56; shift >= 0; shift -= 8) {
            row[size++] = (byte) (bits >>> shift);
        }
        return this;
    }

    /** A string. */
    public ByteWriter text(String value) {
        byte[] utf8 = value.getBytes(StandardCharsets.UTF_8);
        return number(utf8.length).raw(utf8);
    }

    /** A string or null. */
    public ByteWriter textOrNull(@Nullable String value) {
        if (value == null) {
            return number(-1);
        }
        return text(value);
    }

    public byte[] bytes() {
        return Arrays.copyOf(row, size);
    }

    private void room(int more) {
        if (row.length - size < more) {
            row = Arrays.copyOf(row, Math.max(2 * row.length, size + more));
        }
    }
}
