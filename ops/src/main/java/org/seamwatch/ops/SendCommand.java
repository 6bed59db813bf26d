package org.seamwatch.ops;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.Callable;
import org.seamwatch.processors.flow.Topics;
import org.seamwatch.schemas.InputException;
import org.seamwatch.schemas.plan.Plan;
import org.seamwatch.schemas.plan.PlanReader;
import org.seamwatch.schemas.record.CaseReport;
import org.seamwatch.schemas.record.CaseReportReader;
import org.seamwatch.schemas.record.ReadResult;
import org.seamwatch.topology.replay.FeedTime;
import org.seamwatch.topology.replay.LineFile;
import org.seamwatch.topology.service.TopicSetup;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/**
 * Sends bare reports to {@code case-reports}, keyed by report id. A line that is no report is named on standard error
 * and not sent; the rest is, and the exit code is 2.
 */
@Command(
        name = "send",
        description = "Sends reports, one a line, to the topic of case reports.",
        footer = {
            "",
            "A line that is no report is named and skipped, the others are sent, and the exit code is 2. With --history"
                    + " a report's time in the log is the greatest reportedAt so far, as in a replay; without it, the"
                    + " present.",
            "",
            "Makes the topics that are missing, as run does. To load history: send --history first, in time order, then"
                    + " run, whose clock records move the log's time to the present."
        })
final class SendCommand implements Callable<Integer> {

    private static final int NAMED_FAULTS = 20;
    private static final Duration ORDERLY = Duration.ofDays(1);
    private static final Duration FRESH = Duration.ofDays(1);
    private static final int FEW = 3;

    private final Console console;

    @Mixin
    private PlanOption plan = new PlanOption();

    @Parameters(
            arity = "1..*",
            paramLabel = "INPUT",
            description = "reports one a line, in the order to be sent; .gz as is")
    private List<Path> inputs = new ArrayList<>();

    @Option(names = "--history", description = "these are old reports: give them the time they were reported at")
    private boolean history;

    @Option(
            names = "--max-gap",
            paramLabel = "DAYS",
            defaultValue = "30",
            description = "with --history: a report more than so many days beyond all before it does not move time"
                    + " (default: ${DEFAULT-VALUE})")
    private int maxGap;

    private long sent;
    private long faults;
    private long lines;
    private long furthestBack;
    private long old;

    SendCommand(Console console) {
        this.console = console;
    }

    @Override
    public Integer call() {
        if (maxGap < 1) {
            throw new InputException("--max-gap must be at least 1 day, was " + maxGap);
        }
        inputs.forEach(LineFile::check);
        Plan read = PlanReader.read(plan.file());
        TopicSetup.prepare(read).forEach(console::warn);
        FeedTime time = new FeedTime(Duration.ofDays(maxGap));
        try (ReportTopic topic = ReportTopic.open(read);
                Progress progress = new Progress(console, "send", "reports", 0)) {
            for (Path input : inputs) {
                try (LineFile in = LineFile.open(input)) {
                    send(in, topic, time, progress);
                }
            }
            topic.flush();
        }
        return report(read);
    }

    private void send(LineFile in, ReportTopic topic, FeedTime time, Progress progress) {
        for (byte[] line = in.next(); line != null; line = in.next()) {
            lines++;
            ReadResult<CaseReport> result = CaseReportReader.read(line);
            if (result instanceof ReadResult.Parsed<CaseReport> parsed) {
                CaseReport report = parsed.value();
                byte[] key = report.reportId().getBytes(StandardCharsets.UTF_8);
                topic.send(key, line, timestamp(report, topic, time));
                sent++;
            } else {
                fault(in.place(), (ReadResult.Unusable<CaseReport>) result);
            }
            progress.at(lines, 0);
        }
    }

    private long timestamp(CaseReport report, ReportTopic topic, FeedTime time) {
        if (!history) {
            long now = System.currentTimeMillis();
            if (now - report.reportedAt().toEpochMilli() > FRESH.toMillis()) {
                old++;
            }
            return now;
        }
        if (!time.isBegun()) {
            warnOfTimePassed(topic.greatestTimestamp(), report.reportedAt());
        }
        long at = time.at(report.reportedAt());
        furthestBack = Math.max(furthestBack, at - report.reportedAt().toEpochMilli());
        return at;
    }

    private void warnOfTimePassed(long reached, Instant first) {
        if (reached > first.toEpochMilli()) {
            console.warn(Topics.CASE_REPORTS + " already reaches " + Instant.ofEpochMilli(reached)
                    + ": history before that counts as late there, and what is older than the ledger's horizon is"
                    + " rejected; send history before the first clock record");
        }
    }

    /** Field and reason only: the value may be personal. */
    private void fault(String place, ReadResult.Unusable<CaseReport> why) {
        faults++;
        if (faults <= NAMED_FAULTS) {
            String field = why.field().isEmpty() ? "" : why.field() + ": ";
            console.err().println(place + ": " + field + why.reason().code());
        } else if (faults == NAMED_FAULTS + 1) {
            console.err().println("more lines are no reports; they are counted below");
        }
    }

    private int report(Plan read) {
        if (history && furthestBack > ORDERLY.toMillis()) {
            console.warn("history must be in time order: a report lies "
                    + Duration.ofMillis(furthestBack).toDays()
                    + " days before one sent earlier, and counts from that one's time on");
        }
        if (old > FEW) {
            console.warn(String.format(
                    Locale.ROOT,
                    "%,d of %,d reports are older than a day and are stamped with the present time;"
                            + " did you mean --history?",
                    old,
                    sent));
        }
        console.say(String.format(
                Locale.ROOT,
                "%,d %s sent to %s%s; %,d %s not sent",
                sent,
                sent == 1 ? "report" : "reports",
                read.topics().prefix(),
                Topics.CASE_REPORTS,
                faults,
                faults == 1 ? "line is no report and was" : "lines are no reports and were"));
        return faults == 0 ? Failures.DONE : Failures.WRONG_INPUT;
    }
}
