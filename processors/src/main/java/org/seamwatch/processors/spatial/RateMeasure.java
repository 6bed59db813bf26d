package org.seamwatch.processors.spatial;

/** {@code rate}: cases over population, {@code y_i / n_i}. */
public final class RateMeasure implements Measure {

    static final String NAME = "rate";

    @Override
    public String name() {
        return NAME;
    }

    @Override
    public boolean needsPopulation() {
        return true;
    }

    @Override
    public double[] values(MeasureInput input) {
        double[] population = input.populationFor(this);
        double[] rates = input.cases().clone();
        for (int i = 0; i < rates.length; i++) {
            rates[i] /= population[i];
        }
        return rates;
    }
}
