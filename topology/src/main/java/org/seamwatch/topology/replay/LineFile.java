package org.seamwatch.topology.replay;

import java.io.BufferedInputStream;
import java.io.ByteArrayOutputStream;
import java.io.Closeable;
import java.io.EOFException;
import java.io.FilterInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.zip.GZIPInputStream;
import java.util.zip.ZipException;
import org.jspecify.annotations.Nullable;
import org.seamwatch.schemas.InputException;

/**
 * The lines of a file as bytes, one at a time, so that what is not text survives. Blank lines are passed over, a
 * carriage return at the end of a line is dropped. A file whose name ends in {@code .gz} is read through gzip.
 */
public final class LineFile implements Closeable {

    /** Longer lines are refused, whatever they hold. */
    public static final int LONGEST_LINE = 64 * 1024 * 1024;

    private static final int BUFFER = 64 * 1024;

    private final Path file;
    private final Counted raw;
    private final InputStream in;
    private final ByteArrayOutputStream line = new ByteArrayOutputStream();
    private long number;

    private LineFile(Path file, Counted raw, InputStream in) {
        this.file = file;
        this.raw = raw;
        this.in = in;
    }

    /**
     * Opens a file.
     *
     * @throws InputException when there is no such file, or it cannot be read
     */
    public static LineFile open(Path file) {
        check(file);
        try {
            Counted raw = new Counted(Files.newInputStream(file));
            try {
                InputStream in = new BufferedInputStream(unpacked(file, raw), BUFFER);
                skipByteOrderMark(in);
                return new LineFile(file, raw, in);
            } catch (IOException e) {
                raw.close();
                throw e;
            }
        } catch (IOException e) {
            throw unreadable(file, e);
        }
    }

    /** Fails where a file cannot be read, before anything is done with others. */
    public static void check(Path file) {
        if (!Files.exists(file)) {
            throw new InputException(file + ": no such file");
        }
        if (Files.isDirectory(file) || !Files.isReadable(file)) {
            throw new InputException(
                    file + ": " + (Files.isDirectory(file) ? "is a folder, must be a file" : "cannot be read"));
        }
    }

    /** Some editors begin UTF-8 with a mark, which is no part of the first line. */
    private static void skipByteOrderMark(InputStream in) throws IOException {
        in.mark(3);
        if (in.read() != 0xEF || in.read() != 0xBB || in.read() != 0xBF) {
            in.reset();
        }
    }

    private static InputStream unpacked(Path file, InputStream raw) throws IOException {
        return file.toString().endsWith(".gz") ? new GZIPInputStream(raw, BUFFER) : raw;
    }

    private static InputException unreadable(Path file, IOException e) {
        if (e instanceof EOFException) {
            return new InputException(file + ": the compressed data end too early");
        }
        if (e instanceof ZipException) {
            return new InputException(file + ": not gzip data, as its name says");
        }
        return new InputException(file + ": cannot be read: " + e.getMessage());
    }

    /** The next line that is not blank, or null at the end. */
    public byte @Nullable [] next() {
        try {
            return read();
        } catch (IOException e) {
            throw unreadable(file, e);
        }
    }

    private byte @Nullable [] read() throws IOException {
        line.reset();
        int b = in.read();
        while (b >= 0) {
            if (b == '\n') {
                number++;
                if (!isBlank()) {
                    return trimmed();
                }
                line.reset();
            } else {
                line.write(b);
                if (line.size() > LONGEST_LINE) {
                    throw new InputException(
                            file + ":" + (number + 1) + ": a line must have at most " + LONGEST_LINE + " bytes");
                }
            }
            b = in.read();
        }
        if (isBlank()) {
            return null;
        }
        number++;
        return trimmed();
    }

    private boolean isBlank() {
        if (line.size() > 2) {
            return false;
        }
        for (byte b : line.toByteArray()) {
            if (b != ' ' && b != '\t' && b != '\r') {
                return false;
            }
        }
        return true;
    }

    private byte[] trimmed() {
        byte[] bytes = line.toByteArray();
        if (bytes[bytes.length - 1] != '\r') {
            return bytes;
        }
        return Arrays.copyOf(bytes, bytes.length - 1);
    }

    /** Number of the last line, from 1. */
    public long number() {
        return number;
    }

    /** The file and the number of the last line, for messages. */
    public String place() {
        return file + ":" + number;
    }

    /** Bytes of the file read so far, packed ones where it is packed. */
    public long bytesRead() {
        return raw.count;
    }

    @Override
    public void close() {
        try {
            in.close();
        } catch (IOException e) {
            throw unreadable(file, e);
        }
    }

    private static final class Counted extends FilterInputStream {

        private long count;

        Counted(InputStream in) {
            super(in);
        }

        @Override
        public int read() throws IOException {
            int b = super.read();
            count += b < 0 ? 0 : 1;
            return b;
        }

        @Override
        public int read(byte[] bytes, int from, int length) throws IOException {
            int n = super.read(bytes, from, length);
            count += Math.max(0, n);
            return n;
        }
    }
}
