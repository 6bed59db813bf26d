package org.seamwatch.topology.replay;

import java.io.BufferedOutputStream;
import java.io.Closeable;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.zip.GZIPOutputStream;
import org.seamwatch.processors.intake.LogRecord;
import org.seamwatch.schemas.json.Json;
import org.seamwatch.schemas.record.LogLine;

/** Writes records as lines of {@code log.ndjson}, packed where the name ends in {@code .gz}, and hands them on. */
public final class LogWriter implements LogSink, Closeable {

    private final Path file;
    private final LogSink next;
    private final OutputStream out;

    /** A writer that hands records on to another sink. */
    public LogWriter(Path file, LogSink next) {
        this.file = file;
        this.next = next;
        try {
            OutputStream raw = new BufferedOutputStream(Files.newOutputStream(file));
            this.out = file.toString().endsWith(".gz") ? new GZIPOutputStream(raw) : raw;
        } catch (IOException e) {
            throw new ResultFileException(file + ": cannot be written: " + e.getMessage(), e);
        }
    }

    @Override
    public void record(LogRecord r) {
        try {
            out.write(Json.bytes(LogLine.of(r.topic(), r.partition(), r.offset(), r.timestamp(), r.key(), r.value())));
            out.write('\n');
        } catch (IOException e) {
            throw new ResultFileException(file + ": cannot be written: " + e.getMessage(), e);
        }
        next.record(r);
    }

    @Override
    public void reached(long timestamp) {
        next.reached(timestamp);
    }

    @Override
    public void close() {
        try {
            out.close();
        } catch (IOException e) {
            throw new ResultFileException(file + ": cannot be written: " + e.getMessage(), e);
        }
    }
}
