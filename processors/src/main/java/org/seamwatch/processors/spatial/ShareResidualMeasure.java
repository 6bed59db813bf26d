package org.seamwatch.processors.spatial;

/**
 * {@code share-residual}: how far a region is from its usual share of the total, {@code r_i = 2 (sqrt(y_i + 3/8) -
 * sqrt(E_i + 3/8))} with {@code E_i} from {@link Shares}. The root with 3/8 gives a Poisson count a variance near one
 * (Anscombe 1948, Biometrika 35:246-254); taking usual shares out removes structure that is always there.
 */
public final class ShareResidualMeasure implements Measure {

    static final String NAME = "share-residual";

    private static final double ANSCOMBE = 3.0 / 8;

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
        double[] cases = input.cases();
        double[] expected = Shares.expected(Shares.sum(cases), input.history(), input.population());
        double[] residuals = new double[cases.length];
        for (int i = 0; i < residuals.length; i++) {
            residuals[i] = 2 * (Math.sqrt(cases[i] + ANSCOMBE) - Math.sqrt(expected[i] + ANSCOMBE));
        }
        return residuals;
    }
}
