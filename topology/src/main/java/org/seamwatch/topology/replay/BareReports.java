package org.seamwatch.topology.replay;

import java.nio.charset.StandardCharsets;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import org.seamwatch.processors.flow.Topics;
import org.seamwatch.processors.intake.LogRecord;
import org.seamwatch.schemas.InputException;
import org.seamwatch.schemas.record.CaseReport;
import org.seamwatch.schemas.record.CaseReportReader;
import org.seamwatch.schemas.record.ReadResult;

/**
 * Makes a log of bare reports: partition by key as a producer would, time by {@link FeedTime}. A line that is no
 * readable report stands at the time reached, for intake to reject; those before the first readable one wait for it.
 */
final class BareReports {

    /** So many lines without a report, and it is another file that was meant. */
    static final int LONGEST_PREAMBLE = 1000;

    private final FeedTime time;
    private final long[] offsets;
    private final LogSink sink;
    private final List<byte[]> waiting = new ArrayList<>();
    private String firstFault = "";

    BareReports(int partitions, Duration maxGap, LogSink sink) {
        this.time = new FeedTime(maxGap);
        this.offsets = new long[partitions];
        this.sink = sink;
    }

    /**
     * Takes the next line.
     *
     * @param place file and line, for messages
     */
    void line(byte[] line, String place) {
        ReadResult<CaseReport> result = CaseReportReader.read(line);
        if (result instanceof ReadResult.Parsed<CaseReport> parsed) {
            CaseReport report = parsed.value();
            time.at(report.reportedAt());
            sink.reached(time.now());
            waiting.forEach(early -> send(ReportKey.ofUnreadable(early), early));
            waiting.clear();
            send(report.reportId().getBytes(StandardCharsets.UTF_8), line);
        } else if (time.isBegun()) {
            send(ReportKey.ofUnreadable(line), line);
        } else {
            hold(line, place, (ReadResult.Unusable<CaseReport>) result);
        }
    }

    private void hold(byte[] line, String place, ReadResult.Unusable<CaseReport> why) {
        if (waiting.isEmpty()) {
            firstFault = place + ": " + (why.field().isEmpty() ? "" : why.field() + ": ")
                    + why.reason().code();
        }
        waiting.add(line);
        if (waiting.size() > LONGEST_PREAMBLE) {
            throw noReport();
        }
    }

    /** At the end of all files. */
    void end() {
        if (!waiting.isEmpty()) {
            throw noReport();
        }
    }

    private InputException noReport() {
        return new InputException(firstFault + "; none of the first " + waiting.size() + " lines is a report");
    }

    private void send(byte[] key, byte[] line) {
        int partition = ReportKey.partition(key, offsets.length);
        sink.record(new LogRecord(Topics.CASE_REPORTS, partition, offsets[partition]++, time.now(), key, line));
    }
}
