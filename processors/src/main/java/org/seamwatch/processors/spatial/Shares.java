package org.seamwatch.processors.spatial;

import java.util.Arrays;
import org.jspecify.annotations.Nullable;

/**
 * Expected cases by usual shares: a region is expected to have the part of today's total that it had of the past,
 * {@code E_i = total * (S_i + m pop_i / sum pop) / (S + m)}. The m cases added in proportion to population (equally where
 * populations are not known) keep the expectation of a region without history above zero; they weigh little once history
 * holds many cases.
 */
public final class Shares {

    private Shares() {}

    /**
     * Expected cases of each region; they sum to the total.
     *
     * @param total cases of all regions together in the window
     * @param history {@code S_i}, past cases of each region
     * @param population of each region, all above zero, or null where not known
     */
    public static double[] expected(double total, double[] history, double @Nullable [] population) {
        int m = history.length;
        double[] weights = population == null ? equal(m) : population;
        double populations = sum(weights);
        double denominator = sum(history) + m;
        double[] expected = new double[m];
        for (int i = 0; i < m; i++) {
            expected[i] = total * (history[i] + m * weights[i] / populations) / denominator;
        }
        return expected;
    }

    private static double[] equal(int m) {
        double[] ones = new double[m];
        Arrays.fill(ones, 1);
        return ones;
    }

    static double sum(double[] x) {
        double sum = 0;
        for (double value : x) {
            sum += value;
        }
        return sum;
    }
}
