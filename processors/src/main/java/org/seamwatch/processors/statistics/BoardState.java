package org.seamwatch.processors.statistics;

import java.util.List;
import org.seamwatch.processors.learning.LearningState;

/**
 * What a statistic remembers after a day.
 *
 * @param learning what is learned of it
 * @param charts where each of its charts stands, in the plan's order
 */
public record BoardState(LearningState learning, List<ChartPlace> charts) {

    public BoardState {
        charts = List.copyOf(charts);
    }
}
