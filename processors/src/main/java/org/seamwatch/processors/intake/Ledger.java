package org.seamwatch.processors.intake;

import java.util.List;
import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.state.Shelf;

/** What each report last said, by report id, so that duplicates and corrections change counts exactly once. */
final class Ledger {

    private final Shelf rows;
    private final Horizon horizon;

    Ledger(Shelf rows, Horizon horizon) {
        this.rows = rows;
        this.horizon = horizon;
    }

    /** What the report last said, as far as that lies within the horizon at this time; null where nothing does. */
    @Nullable
    LedgerEntry get(String reportId, long time) {
        byte @Nullable [] row = rows.get(reportId);
        if (row == null) {
            return null;
        }
        LedgerEntry entry = LedgerEntry.from(reportId, row);
        List<Contribution> within = horizon.within(entry.contributions(), time);
        return within.isEmpty() ? null : entry.with(within);
    }

    void put(LedgerEntry entry) {
        rows.put(entry.report().reportId(), entry.row());
    }

    /** Removes what lies beyond the horizon. */
    void sweep(long time) {
        rows.visit((reportId, row) -> {
            if (horizon.within(LedgerEntry.contributions(row), time).isEmpty()) {
                rows.remove(reportId);
            }
        });
    }
}
