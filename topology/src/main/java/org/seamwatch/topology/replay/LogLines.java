package org.seamwatch.topology.replay;

import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.intake.LogRecord;
import org.seamwatch.schemas.InputException;
import org.seamwatch.schemas.json.Json;
import org.seamwatch.schemas.record.LogLine;

/** Reads the lines of {@code log.ndjson}. */
final class LogLines {

    private LogLines() {}

    /** Whether a line is one of a log rather than a bare report: it has topic, partition, offset and timestamp. */
    static boolean isLog(byte[] line) {
        return parse(line) != null;
    }

    private static @Nullable LogLine parse(byte[] line) {
        try {
            LogLine read = Json.read(line, LogLine.class);
            return read.topic() == null ? null : read;
        } catch (IllegalArgumentException e) {
            return null;
        }
    }

    /**
     * The record of a line.
     *
     * @param place file and line, for messages
     */
    @SuppressWarnings("NullAway") // key and value may be null; the checker loses that of arrays in another module
    static LogRecord record(byte[] line, String place) {
        LogLine read = parse(line);
        if (read == null) {
            throw new InputException(place
                    + ": must be a line of a log with topic, partition, offset and timestamp, as the first line is");
        }
        try {
            return new LogRecord(
                    read.topic(),
                    read.partition(),
                    read.offset(),
                    read.timestamp(),
                    read.keyBytes(),
                    read.valueBytes());
        } catch (IllegalArgumentException e) {
            throw new InputException(place + ": keyBase64 and valueBase64 must be Base64: " + e.getMessage());
        }
    }
}
