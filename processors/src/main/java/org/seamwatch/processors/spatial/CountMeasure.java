package org.seamwatch.processors.spatial;

/** {@code count}: the cases themselves. */
public final class CountMeasure implements Measure {

    static final String NAME = "count";

    @Override
    public String name() {
        return NAME;
    }

    @Override
    public boolean needsPopulation() {
        return false;
    }

    @Override
    public double[] values(MeasureInput input) {
        return input.cases().clone();
    }
}
