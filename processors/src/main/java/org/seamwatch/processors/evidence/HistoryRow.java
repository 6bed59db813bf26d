package org.seamwatch.processors.evidence;

import java.util.SortedMap;
import java.util.TreeMap;
import org.seamwatch.processors.statistics.BoardState;
import org.seamwatch.schemas.record.SeriesDay;

/**
 * A closed day as evidence needs it.
 *
 * @param day what was said of it
 * @param boards learning and charts after it, by statistic
 */
public record HistoryRow(SeriesDay day, SortedMap<String, BoardState> boards) {

    public HistoryRow {
        boards = new TreeMap<>(boards);
    }
}
