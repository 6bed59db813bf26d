package org.seamwatch.processors.spatial;

/** What Moran's I is computed on: one value for each region, made of its cases. */
public interface Measure {

    /** The name a plan gives it. */
    String name();

    /** Whether it cannot be computed without populations. */
    boolean needsPopulation();

    /**
     * The value of each region, in order; finite. All equal where there is nothing to tell regions apart.
     *
     * @throws IllegalArgumentException where the measure needs populations and there are none
     */
    double[] values(MeasureInput input);
}
