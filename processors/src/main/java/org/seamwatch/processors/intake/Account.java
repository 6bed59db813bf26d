package org.seamwatch.processors.intake;

import java.util.SortedMap;
import java.util.TreeMap;
import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.state.ByteReader;
import org.seamwatch.processors.state.ByteWriter;

/**
 * The time and the counts of one input partition. Everything read is counted once:
 * {@code read = accepted + duplicate + superseded + rejected + control}.
 */
public final class Account {

    private static final int VERSION = 1;

    private long read;
    private long accepted;
    private long duplicate;
    private long superseded;
    private long rejected;
    private long control;
    private long firstTimestamp = -1;
    private long time = -1;
    private final SortedMap<String, Long> reasons = new TreeMap<>();
    private byte @Nullable [] reasonsPart;

    Account() {}

    /** Reads an account back from its row. */
    public static Account from(byte[] row) {
        ByteReader in = new ByteReader(row, VERSION);
        Account a = new Account();
        a.read = in.number();
        a.accepted = in.number();
        a.duplicate = in.number();
        a.superseded = in.number();
        a.rejected = in.number();
        a.control = in.number();
        a.firstTimestamp = in.number();
        a.time = in.number();
        for (int n = in.integer(); n > 0; n--) {
            a.reasons.put(in.text(), in.number());
        }
        return a;
    }

    byte[] row() {
        ByteWriter out = new ByteWriter(VERSION).number(read).number(accepted).number(duplicate);
        out.number(superseded).number(rejected).number(control);
        return out.number(firstTimestamp).number(time).raw(reasonsPart()).bytes();
    }

    /** The end of the row, which few records change. */
    private byte[] reasonsPart() {
        byte[] part = reasonsPart;
        if (part == null) {
            ByteWriter out = ByteWriter.part().number(reasons.size());
            reasons.forEach((reason, count) -> out.text(reason).number(count));
            part = out.bytes();
            reasonsPart = part;
        }
        return part;
    }

    /** Counts a record and moves time on. */
    void read(long timestamp) {
        read++;
        if (firstTimestamp < 0) {
            firstTimestamp = timestamp;
        }
        time = Math.max(time, timestamp);
    }

    void accept() {
        accepted++;
    }

    void duplicate() {
        duplicate++;
    }

    void supersede() {
        superseded++;
    }

    void control() {
        control++;
    }

    void reject(String reason) {
        rejected++;
        reasons.merge(reason, 1L, Long::sum);
        reasonsPart = null;
    }

    /** Records read. */
    public long read() {
        return read;
    }

    /** Records that changed what is known. */
    public long accepted() {
        return accepted;
    }

    /** Records that said again what is known. */
    public long duplicates() {
        return duplicate;
    }

    /** Records with a lower revision than what is known. */
    public long superseded() {
        return superseded;
    }

    /** Records that could not be used. */
    public long rejected() {
        return rejected;
    }

    /** Clock records. */
    public long controls() {
        return control;
    }

    /** Rejected records by reason. */
    public SortedMap<String, Long> reasons() {
        return new TreeMap<>(reasons);
    }

    /** Timestamp of the first record, or -1. */
    long firstTimestamp() {
        return firstTimestamp;
    }

    /** Greatest timestamp so far, or -1. */
    long time() {
        return time;
    }
}
