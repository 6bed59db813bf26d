package org.seamwatch.schemas.plan;

import java.util.List;

/** A statistic that a series can have. */
public enum StatisticName {
    MORAN("moran", List.of(new ChartPlan.Ewma(0.2, 1, Sides.UPPER)));

    private final String word;
    private final List<ChartPlan> defaultCharts;

    StatisticName(String word, List<ChartPlan> defaultCharts) {
        this.word = word;
        this.defaultCharts = defaultCharts;
    }

    /** The word in plan and records. */
    public String word() {
        return word;
    }

    /** Its charts where the plan gives none. */
    public List<ChartPlan> defaultCharts() {
        return defaultCharts;
    }
}
