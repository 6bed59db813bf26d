package org.seamwatch.ops;

import java.time.Duration;
import java.time.Instant;
import java.time.temporal.ChronoUnit;
import java.util.List;
import java.util.Locale;
import java.util.function.BooleanSupplier;
import org.apache.kafka.streams.KafkaStreams;
import org.apache.kafka.streams.errors.InvalidStateStoreException;
import org.jspecify.annotations.Nullable;
import org.seamwatch.schemas.record.AccountingLine;
import org.seamwatch.topology.service.StreamsService;

/**
 * Says in single lines what the service is doing: rebuilding its state, running, how many reports it has read and what
 * became of them, and whether the broker is away. It looks when it is told to; see {@link #LOOK}.
 */
final class RunReport {

    /** How often to look. */
    static final Duration LOOK = Duration.ofSeconds(1);

    private static final Duration BETWEEN_PROBES = Duration.ofSeconds(10);
    private static final Duration BETWEEN_RESTORE_LINES = Duration.ofSeconds(30);

    /** Fewer are read back before the line is read. */
    private static final long WORTH_A_LINE = 1_000;

    /** Pauses before the first counts; the last one stands for all that follow. */
    private static final List<Duration> PAUSES =
            List.of(Duration.ofSeconds(10), Duration.ofMinutes(1), Duration.ofMinutes(10));

    /** What is looked at. */
    interface Subject {

        KafkaStreams.State state();

        /** About how many records are still to be read back into local state. */
        long toRestore();

        /** How many have been read back since the start. */
        long restored();

        /** The accounts; throws {@link InvalidStateStoreException} while partitions move. */
        List<AccountingLine> accounting();

        static Subject of(StreamsService service) {
            return new Subject() {
                @Override
                public KafkaStreams.State state() {
                    return service.state();
                }

                @Override
                public long toRestore() {
                    return service.toRestore();
                }

                @Override
                public long restored() {
                    return service.restored();
                }

                @Override
                public List<AccountingLine> accounting() {
                    return service.accounting();
                }
            };
        }
    }

    private final RunLog log;
    private final Subject subject;
    private final BooleanSupplier broker;
    private long restoredBefore;
    private boolean running;
    private Instant nextRestoreLine = Instant.MIN;
    private Instant nextProbe = Instant.MIN;
    private @Nullable Instant awaySince;
    private @Nullable Instant nextCounts;
    private int lines;
    private RunCounts told = RunCounts.NONE;

    /**
     * A report that has said nothing yet.
     *
     * @param broker whether the broker answers
     */
    RunReport(RunLog log, Subject subject, BooleanSupplier broker) {
        this.log = log;
        this.subject = subject;
        this.broker = broker;
    }

    /** Looks once, and says what has changed. */
    void look() {
        Instant now = log.clock().instant();
        restoring(now);
        running();
        probe(now);
        if (running) {
            counts(now);
        }
    }

    private void restoring(Instant now) {
        long left = subject.toRestore();
        if (left >= WORTH_A_LINE && !now.isBefore(nextRestoreLine)) {
            log.say(String.format(Locale.ROOT, "rebuilding local state from Kafka: about %,d records to go", left));
            nextRestoreLine = now.plus(BETWEEN_RESTORE_LINES);
        }
    }

    private void running() {
        boolean before = running;
        running = subject.state() == KafkaStreams.State.RUNNING;
        if (running && !before) {
            long restored = subject.restored();
            log.say((restored > restoredBefore ? readBack(restored - restoredBefore) : "") + "running");
            restoredBefore = restored;
            nextRestoreLine = Instant.MIN;
        } else if (before && subject.state() == KafkaStreams.State.REBALANCING) {
            log.say("partitions are being shared out anew");
        }
    }

    private static String readBack(long records) {
        return String.format(Locale.ROOT, "%,d records of local state have been read back from Kafka; ", records);
    }

    private void probe(Instant now) {
        if (now.isBefore(nextProbe)) {
            return;
        }
        boolean answers = broker.getAsBoolean();
        nextProbe = now.plus(BETWEEN_PROBES);
        if (!answers && awaySince == null) {
            awaySince = now;
            log.say("the broker does not answer; nothing is read until it does");
        } else if (answers && awaySince != null) {
            log.say("the broker answers again; it was away since " + awaySince.truncatedTo(ChronoUnit.SECONDS));
            awaySince = null;
        }
    }

    private void counts(Instant now) {
        if (nextCounts == null) {
            nextCounts = now.plus(PAUSES.get(0));
        }
        if (now.isBefore(nextCounts)) {
            return;
        }
        RunCounts counts;
        try {
            counts = RunCounts.of(subject.accounting());
        } catch (InvalidStateStoreException e) {
            // Partitions are moving; the next look asks again.
            return;
        }
        log.say(counts.toString());
        RunCounts more = counts.since(told);
        if (more.isTooManyRejected()) {
            log.say("warning: " + (lines == 0 ? "so far " : "since the last count ") + more.rejections());
        }
        told = counts;
        lines++;
        nextCounts = now.plus(PAUSES.get(Math.min(lines, PAUSES.size() - 1)));
    }
}
