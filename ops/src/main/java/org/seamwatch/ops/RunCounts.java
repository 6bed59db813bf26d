package org.seamwatch.ops;

import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;
import org.seamwatch.processors.flow.Topics;
import org.seamwatch.schemas.record.AccountingLine;

/**
 * What became of the reports that this instance has read; clock records do not count.
 *
 * @param accepted reports that were used
 * @param duplicate reports that said again what was known
 * @param superseded reports with a lower revision than the known one
 * @param reasons how many were rejected, by reason
 */
record RunCounts(long accepted, long duplicate, long superseded, SortedMap<String, Long> reasons) {

    static final RunCounts NONE = new RunCounts(0, 0, 0, new TreeMap<>());

    private static final double TOO_MANY = 0.1;

    static RunCounts of(List<AccountingLine> lines) {
        long accepted = 0;
        long duplicate = 0;
        long superseded = 0;
        SortedMap<String, Long> reasons = new TreeMap<>();
        for (AccountingLine line : lines) {
            if (line.topic().equals(Topics.CASE_REPORTS)) {
                accepted += line.accepted();
                duplicate += line.duplicate();
                superseded += line.superseded();
                line.reasons().forEach((reason, count) -> reasons.merge(reason, count, Long::sum));
            }
        }
        return new RunCounts(accepted, duplicate, superseded, reasons);
    }

    long rejected() {
        return reasons.values().stream().mapToLong(Long::longValue).sum();
    }

    long read() {
        return accepted + duplicate + superseded + rejected();
    }

    /** What has come since; nothing is negative where partitions have moved to another instance. */
    RunCounts since(RunCounts before) {
        SortedMap<String, Long> more = new TreeMap<>();
        reasons.forEach((reason, count) -> {
            long added = count - before.reasons.getOrDefault(reason, 0L);
            if (added > 0) {
                more.put(reason, added);
            }
        });
        return new RunCounts(
                Math.max(0, accepted - before.accepted),
                Math.max(0, duplicate - before.duplicate),
                Math.max(0, superseded - before.superseded),
                more);
    }

    boolean isTooManyRejected() {
        return rejected() > TOO_MANY * read();
    }

    /** How many were rejected, and why most of them. */
    String rejections() {
        Map.Entry<String, Long> top =
                reasons.entrySet().stream().max(Map.Entry.comparingByValue()).orElseThrow();
        return String.format(
                Locale.ROOT,
                "%,d of %,d reports were rejected, most often as %s (%,d)",
                rejected(),
                read(),
                top.getKey(),
                top.getValue());
    }

    @Override
    public String toString() {
        return String.format(
                Locale.ROOT,
                "%,d reports read so far: %,d accepted, %,d duplicate, %,d superseded, %,d rejected",
                read(),
                accepted,
                duplicate,
                superseded,
                rejected());
    }
}
