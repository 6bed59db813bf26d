package org.seamwatch.processors.charts;

import org.jspecify.annotations.Nullable;

/**
 * Limits of a chart, in the chart's own unit.
 *
 * @param lower lower limit, null where there is none
 * @param upper upper limit, null where there is none
 */
public record Limits(@Nullable Double lower, @Nullable Double upper) {

    public Limits {
        if (lower != null && upper != null && !(lower <= upper)) {
            throw new IllegalArgumentException("lower limit must be at most the upper " + upper + ", was " + lower);
        }
    }

    /** Limits at this distance from a centre of zero. */
    static Limits of(Sides sides, double distance) {
        return new Limits(sides == Sides.BOTH ? -distance : null, distance);
    }

    /** Whether a value lies outside; on a limit is inside. */
    public boolean beyond(double value) {
        return (upper != null && value > upper) || (lower != null && value < lower);
    }
}
