package org.seamwatch.ops;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.OptionalLong;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.flow.InputSizes;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.schemas.InputException;
import org.seamwatch.schemas.record.AccountingLine;
import org.seamwatch.topology.replay.LineFile;
import org.seamwatch.topology.replay.LogReplay;
import org.seamwatch.topology.replay.LogSink;
import org.seamwatch.topology.replay.LogWriter;
import org.seamwatch.topology.replay.ReplayFiles;
import org.seamwatch.topology.replay.ResultFiles;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** Replays logs or bare reports through the steps of the live service, and writes what they give as files. */
@Command(
        name = "replay",
        description = "Runs logs or reports through the steps of the live service, without a broker.",
        footer = {
            "",
            "A line is a record of a log (log.ndjson), or a bare report; the first line of a file says which. The log"
                    + " time of a bare report is the greatest reportedAt so far. The same plan and log give the same"
                    + " files, byte for byte, as the live service gives."
        })
final class ReplayCommand implements Callable<Integer> {

    /** One rejected in so many is worth a warning. */
    private static final int MANY = 10;

    private final Console console;

    @Mixin
    private PlanOption plan = new PlanOption();

    @Option(
            names = "--reports",
            required = true,
            arity = "1..*",
            paramLabel = "FILE",
            description = "logs, or reports one a line, in the order to be read; .gz as is")
    private List<Path> reports = new ArrayList<>();

    @Option(
            names = "--out",
            required = true,
            paramLabel = "DIR",
            description = "folder for region-days.ndjson, series-days.ndjson, alarms.ndjson, rejected.ndjson and"
                    + " accounting.json")
    private Path out = Path.of("out");

    @Option(
            names = "--until",
            paramLabel = "T",
            converter = UntilConverter.class,
            description = "apply every hour up to and including the one that contains T: an instant, or a date, which"
                    + " means its end (UTC); by default the log's last timestamp")
    private @Nullable Long until;

    @Option(names = "--log", paramLabel = "FILE", description = "also write what was read as a log; .gz packs it")
    private @Nullable Path log;

    @Option(
            names = "--max-gap",
            paramLabel = "DAYS",
            defaultValue = "30",
            description = "reject a bare report whose reportedAt is more than so many days beyond all before it"
                    + " (default: ${DEFAULT-VALUE})")
    private int maxGap;

    ReplayCommand(Console console) {
        this.console = console;
    }

    @Override
    public Integer call() {
        if (maxGap < 1) {
            throw new InputException("--max-gap must be at least 1 day, was " + maxGap);
        }
        reports.forEach(LineFile::check);
        Plans plans = plan.read(console);
        ResultFiles.prepare(out);
        ResultFiles results = new ResultFiles();
        int partitions = plans.read().plan().topics().partitions();
        LogReplay replay = replay(plans.watch(), partitions, results);
        long lines = feed(replay, partitions);
        if (!replay.isBegun()) {
            throw new InputException(
                    lines == 0
                            ? "the reports must have at least one record, have none"
                            : "no record lies before --until");
        }
        replay.finish();
        List<AccountingLine> accounts = replay.accounts();
        results.write(out, accounts);
        report(results, accounts, replay.notFed());
        return Failures.DONE;
    }

    private LogReplay replay(Watch watch, int partitions, ResultFiles results) {
        return new LogReplay(
                watch,
                new InputSizes(partitions, partitions),
                until == null ? OptionalLong.empty() : OptionalLong.of(until),
                results);
    }

    private long feed(LogReplay replay, int partitions) {
        if (log == null) {
            return feedTo(replay, partitions);
        }
        try (LogWriter writer = new LogWriter(log, replay)) {
            return feedTo(writer, partitions);
        }
    }

    private long feedTo(LogSink sink, int partitions) {
        try (Progress progress = new Progress(console, "replay", "records", totalBytes())) {
            ReplayFiles files = new ReplayFiles(partitions, Duration.ofDays(maxGap), sink, progress::at);
            files.feed(reports);
            return files.lines();
        }
    }

    private long totalBytes() {
        long total = 0;
        for (Path file : reports) {
            try {
                total += Files.size(file);
            } catch (IOException e) {
                throw new UncheckedIOException(file + ": its size cannot be read", e);
            }
        }
        return total;
    }

    private void report(ResultFiles results, List<AccountingLine> accounts, long notFed) {
        results.alarms().forEach(alarm -> console.say(AlarmText.of(alarm)));
        SortedMap<String, Long> reasons = new TreeMap<>();
        long[] sums = new long[6];
        for (AccountingLine a : accounts) {
            long[] counts = {a.read(), a.accepted(), a.duplicate(), a.superseded(), a.rejected(), a.control()};
            for (int i = 0; i < sums.length; i++) {
                sums[i] += counts[i];
            }
            a.reasons().forEach((reason, n) -> reasons.merge(reason, n, Long::sum));
        }
        console.say(String.format(
                Locale.ROOT,
                "%,d records read: %,d accepted, %,d duplicate, %,d superseded, %,d rejected, %,d clock",
                sums[0],
                sums[1],
                sums[2],
                sums[3],
                sums[4],
                sums[5]));
        reasons.forEach((reason, n) -> console.say(String.format(Locale.ROOT, "  rejected as %s: %,d", reason, n)));
        if (sums[4] * MANY > sums[0] - sums[5]) {
            console.warn(String.format(
                    Locale.ROOT,
                    "%,d of %,d reports were rejected: are plan and reports of the same territory and conditions?",
                    sums[4],
                    sums[0] - sums[5]));
        }
        if (notFed > 0) {
            console.say(String.format(Locale.ROOT, "  %,d more lie beyond --until", notFed));
        }
        console.say(String.format(
                Locale.ROOT,
                "%,d region-days, %,d series-days, %,d changes of alarms written to %s",
                results.regionDayCount(),
                results.seriesDayCount(),
                results.alarms().size(),
                out));
    }
}
