package org.seamwatch.schemas.plan;

/** One chart of a statistic, as the plan asks for it. */
public sealed interface ChartPlan {

    /** Name of the chart. */
    String name();

    /** How many previous usable values learning regresses on, from 0. */
    int order();

    /** Sides with limits. */
    Sides sides();

    /** Shewhart's chart of single scores. */
    record Individuals(int order, Sides sides) implements ChartPlan {
        @Override
        public String name() {
            return "individuals";
        }
    }

    /**
     * Exponentially weighted moving average of the scores.
     *
     * @param weight weight of the newest score, in (0, 1]
     */
    record Ewma(double weight, int order, Sides sides) implements ChartPlan {
        @Override
        public String name() {
            return "ewma";
        }
    }
}
