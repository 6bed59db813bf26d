package org.seamwatch.schemas.record;

import java.util.List;

/**
 * The last days of one statistic.
 *
 * @param statistic name of the statistic
 * @param days oldest first
 */
public record EvidenceHistory(String statistic, List<HistoryDay> days) {

    public EvidenceHistory {
        days = List.copyOf(days);
    }
}
