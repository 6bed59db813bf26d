package org.seamwatch.topology.replay;

import java.util.Comparator;
import java.util.SortedMap;
import java.util.TreeMap;
import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.intake.Account;
import org.seamwatch.schemas.record.AccountingLine;

/** Turns the accounts that intake keeps into the lines of {@code accounting.json}. */
public final class Accounting {

    /** By topic and partition. */
    public static final Comparator<AccountingLine> ORDER =
            Comparator.comparing(AccountingLine::topic).thenComparingInt(AccountingLine::partition);

    private static final SortedMap<String, Long> NO_REASONS = new TreeMap<>();

    private Accounting() {}

    /** The key under which intake keeps the account of a partition. */
    public static String key(String topic, int partition) {
        return topic + "|" + partition;
    }

    /**
     * The line of a partition.
     *
     * @param row the row that intake keeps; null where it has read nothing
     */
    public static AccountingLine line(String topic, int partition, byte @Nullable [] row) {
        if (row == null) {
            return new AccountingLine(topic, partition, 0, 0, 0, 0, 0, 0, NO_REASONS);
        }
        Account account = Account.from(row);
        return new AccountingLine(
                topic,
                partition,
                account.read(),
                account.accepted(),
                account.duplicates(),
                account.superseded(),
                account.rejected(),
                account.controls(),
                account.reasons());
    }

    /** Whether everything read is counted once. */
    public static boolean balances(AccountingLine line) {
        return line.read() == line.accepted() + line.duplicate() + line.superseded() + line.rejected() + line.control();
    }
}
