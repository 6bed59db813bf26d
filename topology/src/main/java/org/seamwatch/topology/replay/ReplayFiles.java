package org.seamwatch.topology.replay;

import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.seamwatch.schemas.InputException;

/**
 * Feeds files to a replay, in their order and line by line: logs ({@code log.ndjson} of an earlier run), or bare
 * reports, one a line. Which of the two a file is, its first line says; a run has one kind.
 */
public final class ReplayFiles {

    /** A report further ahead of all before it is taken for one of a wrong clock. */
    public static final Duration DEFAULT_MAX_GAP = Duration.ofDays(30);

    /** Is told how far the reading is. */
    public interface Watcher {

        /**
         * After each line.
         *
         * @param lines lines read so far
         * @param bytes bytes of the files read so far
         */
        void read(long lines, long bytes);
    }

    private final LogSink sink;
    private final BareReports bare;
    private final Watcher watcher;
    private @Nullable Boolean logs;
    private long lines;
    private long bytes;

    /**
     * A feeder.
     *
     * @param partitions partitions of {@code case-reports}, over which bare reports are spread
     * @param maxGap how far a bare report may be ahead of all before it
     * @param sink takes the records
     * @param watcher is told after each line
     */
    public ReplayFiles(int partitions, Duration maxGap, LogSink sink, Watcher watcher) {
        this.sink = sink;
        this.bare = new BareReports(partitions, maxGap, sink);
        this.watcher = watcher;
    }

    /**
     * Feeds all files.
     *
     * @throws InputException when a file cannot be read, or a line of a log is none
     */
    public void feed(List<Path> files) {
        files.forEach(LineFile::check);
        for (Path file : files) {
            try (LineFile in = LineFile.open(file)) {
                feed(file, in);
                bytes += in.bytesRead();
            }
        }
        bare.end();
    }

    private void feed(Path file, LineFile in) {
        byte[] line = in.next();
        if (line == null) {
            return;
        }
        boolean log = LogLines.isLog(line);
        if (logs != null && logs != log) {
            throw new InputException(file + ": holds " + (log ? "a log" : "bare reports") + ", the files before it "
                    + (log ? "bare reports" : "a log") + "; a replay must have one kind");
        }
        logs = log;
        for (; line != null; line = in.next()) {
            if (log) {
                record(line, in.place());
            } else {
                bare.line(line, in.place());
            }
            watcher.read(++lines, bytes + in.bytesRead());
        }
    }

    private void record(byte[] line, String place) {
        try {
            sink.record(LogLines.record(line, place));
        } catch (IllegalArgumentException e) {
            throw new InputException(place + ": " + e.getMessage());
        }
    }

    /** Lines read that were not blank. */
    public long lines() {
        return lines;
    }
}
