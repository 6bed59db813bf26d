package org.seamwatch.processors.intake;

import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.flow.Hours;
import org.seamwatch.processors.flow.InputSizes;
import org.seamwatch.processors.flow.SeriesMessage.Watermark;
import org.seamwatch.processors.state.Shelf;
import org.seamwatch.schemas.record.ClockRecord;

/**
 * What every input partition does, whatever it carries: its time is the greatest timestamp it has seen, it promises the
 * hours it has passed, and it accounts for everything.
 */
final class InputPartition {

    /** What has to be said of an hour before its watermark. */
    @FunctionalInterface
    interface HourEnd {
        void passed(long hour);
    }

    private final String topic;
    private final int partition;
    private final InputSizes sizes;
    private final Shelf accounts;
    private final IntakeOutput out;
    private final String key;
    private final Account account;

    InputPartition(String topic, int partition, InputSizes sizes, Shelf accounts, IntakeOutput out) {
        this.topic = topic;
        this.partition = partition;
        this.sizes = sizes;
        this.accounts = accounts;
        this.out = out;
        this.key = topic + "|" + partition;
        byte @Nullable [] row = accounts.get(key);
        this.account = row == null ? new Account() : Account.from(row);
    }

    /** Makes something of a record, or says why it cannot. */
    @FunctionalInterface
    interface Taker {
        @Nullable
        Refusal take(LogRecord record);
    }

    /** Counts a record, and has it taken unless it is a clock record. */
    void accept(LogRecord record, HourEnd end, Taker taker) {
        enter(record, end);
        if (ClockRecord.is(record.key(), record.value())) {
            account.control();
        } else {
            Refusal why = taker.take(record);
            if (why != null) {
                reject(record, why);
            }
        }
        accounts.put(key, account.row());
    }

    /** Moves time on to a record; where that enters a new hour, ends the hour before and sends the watermark. */
    private void enter(LogRecord record, HourEnd end) {
        long before = account.time();
        account.read(record.timestamp());
        long hour = hour();
        if (before < 0 || Hours.of(before) < hour) {
            if (before >= 0) {
                end.passed(Hours.of(before));
            }
            out.toAll(new Watermark(topic, partition, hour - 1, account.firstTimestamp(), sizes));
        }
    }

    /**
     * Passes every hour up to one without a record, where a log is known to hold no more records of them.
     *
     * @param last the last hour to be passed
     * @param logStart first timestamp of the log, for a partition that has had no record yet
     */
    void pass(long last, long logStart, HourEnd end) {
        boolean quiet = account.time() < 0;
        if (!quiet && hour() > last) {
            return;
        }
        if (!quiet) {
            end.passed(hour());
        }
        out.toAll(new Watermark(topic, partition, last, quiet ? logStart : account.firstTimestamp(), sizes));
    }

    /** The hour of the partition's time. */
    long hour() {
        return Hours.of(account.time());
    }

    /** The partition's time, milliseconds since 1970-01-01T00Z. */
    long time() {
        return account.time();
    }

    Account account() {
        return account;
    }

    private void reject(LogRecord record, Refusal why) {
        account.reject(why.reason().code());
        out.reject(Rejection.of(record, Hours.endMillis(hour()), why));
    }
}
