package org.seamwatch.processors.series;

import java.util.SortedMap;
import java.util.TreeMap;
import org.seamwatch.processors.alarms.EpisodeState;
import org.seamwatch.processors.statistics.BoardState;
import org.seamwatch.schemas.record.SeriesDay;

/**
 * A closed day: what was said of it, and what the next day starts from.
 *
 * @param day the record as last emitted
 * @param boards learning and charts after the day, by statistic
 * @param episode the episode after the day
 */
public record DayState(SeriesDay day, SortedMap<String, BoardState> boards, EpisodeState episode) {

    public DayState {
        boards = new TreeMap<>(boards);
    }
}
