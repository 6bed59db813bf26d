package org.seamwatch.processors.charts;

import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.LUDecomposition;
import org.seamwatch.processors.distributions.NormalScore;
import org.seamwatch.schemas.plan.Sides;

/**
 * Mean run lengths, in usable days from a start at the centre to the first signal, for independent normal scores with
 * variance 1 and a constant shift.
 *
 * <p>EWMA: the integral equation of Crowder (1987, Technometrics 29:401-407), L(z) = 1 + (1/w) integral of L(u) phi((u -
 * (1-w) z)/w - shift) du over the values inside the limits, solved at Gauss-Legendre nodes (Nystrom). Reflected at zero,
 * it has the term L(0) Phi((0 - (1-w) z)/w - shift) more, the days on which the average is put back to zero. Relative
 * error below 1e-6 against the published values.
 */
public final class RunLength {

    private static final int FEWEST_NODES = 40;

    /** A run length beyond it has no digits left in double precision. */
    private static final double WIDEST = 8;

    private static final double NODES_PER_DEVIATION = 3;

    private RunLength() {}

    /**
     * Mean run length of an individuals chart, the inverse of its tail probability.
     *
     * @param limit action limit in standard deviations, above 0
     * @param shift shift of the scores in standard deviations
     */
    public static double individuals(Sides sides, double limit, double shift) {
        Checks.limit(limit);
        Checks.shift(shift);
        double upper = NormalScore.upperTail(limit - shift);
        return 1 / (sides == Sides.UPPER ? upper : upper + NormalScore.upperTail(limit + shift));
    }

    /**
     * Mean run length of an EWMA chart with fixed limits, reflected at zero where it has an upper side only.
     *
     * @param weight weight of the newest score, in [0.01, 1]
     * @param limit action limit in the unit of the average, above 0, at most 8 of its standard deviations
     * @param shift shift of the scores in standard deviations
     */
    public static double ewma(double weight, Sides sides, double limit, double shift) {
        Checks.limit(limit);
        Checks.shift(shift);
        double widest = WIDEST * EwmaChart.deviation(weight);
        if (limit > widest) {
            throw new IllegalArgumentException("limit must be at most " + WIDEST
                    + " standard deviations of the average, " + widest + ", was " + limit);
        }
        return sides == Sides.UPPER ? reflected(weight, limit, shift) : twoSided(weight, limit, shift);
    }

    private static double twoSided(double weight, double limit, double shift) {
        GaussLegendre rule = GaussLegendre.on(-limit, limit, nodes(2 * limit / weight));
        double[] from = rule.nodes();
        int n = from.length;
        double[][] system = new double[n][];
        for (int i = 0; i < n; i++) {
            system[i] = kernel(rule, from[i], weight, shift);
            negateFromIdentity(system[i], i);
        }
        double[] lengths = solve(system);
        return 1 + product(kernel(rule, 0, weight, shift), lengths);
    }

    /** The unknowns are L(0), then L at the nodes. */
    private static double reflected(double weight, double limit, double shift) {
        GaussLegendre rule = GaussLegendre.on(0, limit, nodes(limit / weight));
        int n = rule.nodes().length;
        double[][] system = new double[n + 1][n + 1];
        for (int i = 0; i <= n; i++) {
            double from = i == 0 ? 0 : rule.nodes()[i - 1];
            system[i][0] = NormalScore.cdf(-(1 - weight) * from / weight - shift);
            System.arraycopy(kernel(rule, from, weight, shift), 0, system[i], 1, n);
            negateFromIdentity(system[i], i);
        }
        return solve(system)[0];
    }

    private static int nodes(double deviations) {
        return FEWEST_NODES + (int) StrictMath.ceil(NODES_PER_DEVIATION * deviations);
    }

    /** Probability that the average moves from one value into the interval of each node. */
    private static double[] kernel(GaussLegendre rule, double from, double weight, double shift) {
        double[] result = new double[rule.nodes().length];
        for (int j = 0; j < result.length; j++) {
            double score = (rule.nodes()[j] - (1 - weight) * from) / weight;
            result[j] = rule.weights()[j] * NormalScore.density(score - shift) / weight;
        }
        return result;
    }

    private static void negateFromIdentity(double[] row, int diagonal) {
        for (int j = 0; j < row.length; j++) {
            row[j] = (j == diagonal ? 1 : 0) - row[j];
        }
    }

    private static double[] solve(double[][] system) {
        return new LUDecomposition(new Array2DRowRealMatrix(system, false))
                .getSolver()
                .solve(new ArrayRealVector(system.length, 1.0))
                .toArray();
    }

    private static double product(double[] a, double[] b) {
        double sum = 0;
        for (int j = 0; j < a.length; j++) {
            sum += a[j] * b[j];
        }
        return sum;
    }
}
