package org.seamwatch.processors.intake;

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

    /** What the report last said, unless that lies beyond the horizon at this time. */
    @Nullable
    LedgerEntry get(String reportId, long time) {
        byte @Nullable [] row = rows.get(reportId);
        if (row == null) {
            return null;
        }
        LedgerEntry entry = LedgerEntry.from(reportId, row);
        return horizon.isBeyond(entry.contributions(), time) ? null : entry;
    }

    void put(LedgerEntry entry) {
        rows.put(entry.report().reportId(), entry.row());
    }

    /** Removes what lies beyond the horizon. */
    void sweep(long time) {
        rows.visit((reportId, row) -> {
            if (horizon.isBeyond(LedgerEntry.from(reportId, row).contributions(), time)) {
                rows.remove(reportId);
            }
        });
    }
}
