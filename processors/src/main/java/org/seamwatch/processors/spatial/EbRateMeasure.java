package org.seamwatch.processors.spatial;

/**
 * {@code eb-rate}: empirical-Bayes standardised rates (Assunção and Reis 1999, Statistics in Medicine 18:2147-2162),
 * {@code z_i = (p_i - b) / sqrt(v_i)} with a and b from {@link EmpiricalBayes}. Without any cases every value is zero.
 *
 * <p>{@code v_i = max(a, 0) + b/n_i}. The published rule keeps a negative a and falls back to {@code b/n_i} only where
 * {@code a + b/n_i} is not positive: in sparse data v_i may then come close to zero and let a single value explode.
 */
public final class EbRateMeasure implements Measure {

    static final String NAME = "eb-rate";

    private final boolean publishedRule;

    /** With {@code v_i = max(a, 0) + b/n_i}. */
    public EbRateMeasure() {
        this(false);
    }

    private EbRateMeasure(boolean publishedRule) {
        this.publishedRule = publishedRule;
    }

    /** With the rule as published; for reference, not for surveillance. */
    public static EbRateMeasure withPublishedRule() {
        return new EbRateMeasure(true);
    }

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
        double[] cases = input.cases();
        double[] z = new double[cases.length];
        EmpiricalBayes prior = EmpiricalBayes.of(cases, population);
        if (!(prior.b() > 0)) {
            return z;
        }
        for (int i = 0; i < z.length; i++) {
            double chance = prior.b() / population[i];
            z[i] = (cases[i] / population[i] - prior.b()) / Math.sqrt(variance(prior.a(), chance));
        }
        return z;
    }

    private double variance(double a, double chance) {
        if (publishedRule) {
            return a + chance > 0 ? a + chance : chance;
        }
        return Math.max(a, 0) + chance;
    }
}
