package org.seamwatch.topology;

import java.util.Comparator;
import org.seamwatch.processors.intake.Account;
import org.seamwatch.schemas.record.AccountingLine;

/** Turns the accounts that intake keeps into the lines of {@code accounting.json}. */
public final class Accounting {

    /** By topic and partition. */
    public static final Comparator<AccountingLine> ORDER =
            Comparator.comparing(AccountingLine::topic).thenComparingInt(AccountingLine::partition);

    private Accounting() {}

    /** The line of a partition. */
    public static AccountingLine line(String topic, int partition, Account account) {
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
