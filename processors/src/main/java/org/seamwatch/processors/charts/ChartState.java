package org.seamwatch.processors.charts;

import java.util.Arrays;

/**
 * What a chart remembers after a usable day: plain immutable data, equal by value.
 *
 * @param memory the chart's own numbers; only the chart that made them reads them
 * @param runDays usable days since the chart last stood at its centre, the newest included: the change that it shows is
 *     estimated to have begun on the first of them (Page 1954); 0 at the centre
 */
@SuppressWarnings("ArrayRecordComponent") // copied in and out, equal by value
public record ChartState(double[] memory, int runDays) {

    public ChartState {
        if (runDays < 0) {
            throw new IllegalArgumentException("runDays must be at least 0, were " + runDays);
        }
        memory = memory.clone();
    }

    @Override
    public double[] memory() {
        return memory.clone();
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof ChartState that && runDays == that.runDays && Arrays.equals(memory, that.memory);
    }

    @Override
    public int hashCode() {
        return 31 * Arrays.hashCode(memory) + runDays;
    }

    @Override
    public String toString() {
        return "ChartState[memory=" + Arrays.toString(memory) + ", runDays=" + runDays + "]";
    }
}
