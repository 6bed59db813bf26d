package org.seamwatch.processors.state;

import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import org.jspecify.annotations.Nullable;

/** Writes compact rows: a version byte, then numbers in base 128 and strings in UTF-8 with their length. */
public final class ByteWriter {

    private final ByteArrayOutputStream out;

    /** Begins a row of a codec's version, 0 to 127. */
    public ByteWriter(int version) {
        out = new ByteArrayOutputStream(96);
        out.write(version);
    }

    /** A number; small magnitudes of either sign take few bytes. */
    public ByteWriter number(long value) {
        long zigzag = (value << 1) ^ (value >> 63);
        while ((zigzag & ~0x7FL) != 0) {
            out.write((int) ((zigzag & 0x7F) | 0x80));
            zigzag >>>= 7;
        }
        out.write((int) zigzag);
        return this;
    }

    /** A floating-point number, bit for bit. */
    public ByteWriter real(double value) {
        long bits = Double.doubleToRawLongBits(value);
        for (int shift = 56; shift >= 0; shift -= 8) {
            out.write((int) (bits >>> shift));
        }
        return this;
    }

    /** A string. */
    public ByteWriter text(String value) {
        byte[] utf8 = value.getBytes(StandardCharsets.UTF_8);
        number(utf8.length);
        out.write(utf8, 0, utf8.length);
        return this;
    }

    /** A string or null. */
    public ByteWriter textOrNull(@Nullable String value) {
        if (value == null) {
            return number(-1);
        }
        return text(value);
    }

    public byte[] bytes() {
        return out.toByteArray();
    }
}
