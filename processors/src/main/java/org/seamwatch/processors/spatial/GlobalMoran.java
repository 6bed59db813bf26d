package org.seamwatch.processors.spatial;

import java.util.Optional;

/**
 * Global Moran's I with its moments (Cliff and Ord 1981, Spatial Processes, pp. 17-21). With {@code z_i} the deviations
 * from the mean over the n regions that have neighbours:
 *
 * <pre>
 * I      = (n / S0) sum_ij w_ij z_i z_j / sum_i z_i^2,   E(I) = -1 / (n - 1)
 * Var_N  = (n^2 S1 - n S2 + 3 S0^2) / ((n^2 - 1) S0^2) - E^2
 * Var_R  = (n ((n^2 - 3n + 3) S1 - n S2 + 3 S0^2) - b2 ((n^2 - n) S1 - 2n S2 + 6 S0^2))
 *          / ((n - 1)(n - 2)(n - 3) S0^2) - E^2
 * </pre>
 *
 * with {@code b2} the fourth moment over the square of the second. Rounding error is below 1e-12 relative to the larger
 * of I and its standard deviation for up to some thousands of regions.
 */
public final class GlobalMoran {

    /** The variance under randomisation divides by {@code n - 3}. */
    private static final int FEWEST_REGIONS = 4;

    /**
     * A variance this small against E^2 is the rounding error of zero (about 1e-12 for 200 regions). It is zero where
     * every arrangement of the values has the same index: everyone is everyone's neighbour, or one region stands out
     * where all have as many neighbours. One link short of everyone's neighbours it is about 4/n^2 of E^2.
     */
    private static final double NO_VARIANCE = 1e-9;

    private GlobalMoran() {}

    /**
     * Moran's I over the regions with neighbours.
     *
     * @param values one finite value for each region of the weights
     * @param weights the weights; isolated regions are removed, with their values, before anything is computed
     * @return empty where the index is undefined: fewer than four regions with neighbours, values without variation, or
     *     weights under which every arrangement of the values has the same index
     */
    public static Optional<Moran> of(double[] values, Weights weights) {
        checkSize(values, weights);
        Subset connected = weights.connected();
        return index(connected.pick(values), connected.weights(), connected.size());
    }

    /**
     * For reference values that keep isolated regions: mean, variance and b2 are over all values.
     *
     * @param counted the n of the formulas
     */
    static Optional<Moran> keepingIsolated(double[] values, Weights weights, int counted) {
        checkSize(values, weights);
        return index(values, weights, counted);
    }

    private static void checkSize(double[] values, Weights weights) {
        if (values.length != weights.size()) {
            throw new IllegalArgumentException(
                    "values must be one for each of " + weights.size() + " regions, were " + values.length);
        }
    }

    private static Optional<Moran> index(double[] values, Weights weights, int counted) {
        Centred centred = Centred.of(values);
        if (counted < FEWEST_REGIONS || centred.flat() || !(weights.s0() > 0)) {
            return Optional.empty();
        }
        double n = counted;
        double i = n / weights.s0() * weights.crossProduct(centred.deviations()) / centred.sumOfSquares();
        double expected = -1 / (n - 1);
        double randomised = varianceRandomisation(n, centred.kurtosis(), weights);
        if (!(randomised > NO_VARIANCE * expected * expected)) {
            return Optional.empty();
        }
        double z = (i - expected) / Math.sqrt(randomised);
        return Optional.of(new Moran(counted, i, expected, varianceNormality(n, weights), randomised, z));
    }

    private static double varianceNormality(double n, Weights w) {
        double s0Squared = w.s0() * w.s0();
        double secondMoment = (n * n * w.s1() - n * w.s2() + 3 * s0Squared) / ((n * n - 1) * s0Squared);
        return secondMoment - 1 / ((n - 1) * (n - 1));
    }

    private static double varianceRandomisation(double n, double b2, Weights w) {
        double s0Squared = w.s0() * w.s0();
        double first = n * ((n * n - 3 * n + 3) * w.s1() - n * w.s2() + 3 * s0Squared);
        double second = b2 * ((n * n - n) * w.s1() - 2 * n * w.s2() + 6 * s0Squared);
        double secondMoment = (first - second) / ((n - 1) * (n - 2) * (n - 3) * s0Squared);
        return secondMoment - 1 / ((n - 1) * (n - 1));
    }
}
