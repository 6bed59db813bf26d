package org.seamwatch.processors.charts;

import org.seamwatch.schemas.record.Grade;
import org.seamwatch.schemas.record.Limits;

/**
 * A control chart of normal scores, one a usable day. A chart is its rule and its limits; what it remembers is a
 * {@link ChartState} in the caller's hands.
 */
public interface Chart {

    /** Warning limits stand at this part of the action limits (common practice). */
    double WARNING_PART = 2.0 / 3;

    /** Name in plan and records, such as {@code ewma}. */
    String name();

    /** The state before the first score: at the centre. */
    ChartState start();

    /**
     * The state after one more score.
     *
     * @throws IllegalArgumentException when the score is not finite
     */
    ChartState next(ChartState state, double score);

    /** The charted value, to be held against the limits. */
    double value(ChartState state);

    /** Beyond these an alarm is raised. */
    Limits action();

    /** Beyond these a warning is shown; it never pages. */
    Limits warning();

    /** Which limit a state is beyond. */
    default Grade grade(ChartState state) {
        double value = value(state);
        if (action().isBeyond(value)) {
            return Grade.ACTION;
        }
        return warning().isBeyond(value) ? Grade.WARNING : Grade.NONE;
    }
}
