package org.seamwatch.schemas.plan;

import java.util.List;

/** A statistic that a series can have. */
public enum StatisticName {
    MORAN("moran");

    private final String word;

    StatisticName(String word) {
        this.word = word;
    }

    /** The word in plan and records. */
    public String word() {
        return word;
    }

    /** Its charts where the plan gives none. */
    public List<ChartPlan> defaultCharts() {
        return switch (this) {
            case MORAN -> List.of(new ChartPlan.Ewma(0.2, 1, Sides.UPPER));
        };
    }
}
