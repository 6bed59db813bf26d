package org.seamwatch.processors.spatial;

import org.apache.commons.rng.UniformRandomProvider;
import org.apache.commons.rng.simple.RandomSource;

/**
 * Seeded permutation test of global Moran's I, upper side: {@code p = (1 + R) / (1 + M)}, R the permutations of M whose
 * index reaches the observed one (Davison and Hinkley 1997, Bootstrap Methods, eq. 4.11; Anselin 1995, p. 97). Values
 * and weights fix n, S0 and the sum of squares, so only the cross product is computed again.
 */
public final class PermutationTest {

    /**
     * Indices this close are ties: the rounding error of a cross product depends on the order of its terms, and a
     * permutation that only swaps equal values must count as reaching the observed index.
     */
    private static final double TIE = 1e-12;

    private PermutationTest() {}

    /**
     * The pseudo p-value; the same arguments always give the same.
     *
     * @param values one finite value for each region of the weights; those of isolated regions are left out
     * @param weights the weights
     * @param permutations how many, at least 1
     * @param seed of the generator (xoshiro256++)
     * @return in (0, 1], never NaN; 1 where all values are equal or nobody has neighbours
     */
    public static double upper(double[] values, Weights weights, int permutations, long seed) {
        if (permutations < 1) {
            throw new IllegalArgumentException("permutations must be at least 1, were " + permutations);
        }
        if (values.length != weights.size()) {
            throw new IllegalArgumentException(
                    "values must be one for each of " + weights.size() + " regions, were " + values.length);
        }
        Subset connected = weights.connected();
        Centred centred = Centred.of(connected.pick(values));
        if (centred.flat()) {
            return 1;
        }
        return pseudoP(reaching(centred, connected.weights(), permutations, seed), permutations);
    }

    static double pseudoP(int reaching, int permutations) {
        return (1.0 + reaching) / (1.0 + permutations);
    }

    private static int reaching(Centred centred, Weights weights, int permutations, long seed) {
        double[] z = centred.deviations().clone();
        double slack = TIE * Math.abs(weights.s0()) * centred.sumOfSquares() / z.length;
        double reached = weights.crossProduct(z) - slack;
        UniformRandomProvider random = RandomSource.XO_SHI_RO_256_PP.create(seed);
        int count = 0;
        for (int m = 0; m < permutations; m++) {
            shuffle(z, random);
            if (weights.crossProduct(z) >= reached) {
                count++;
            }
        }
        return count;
    }

    /** Fisher and Yates; shuffling what is already shuffled is as good as starting from the observed order. */
    private static void shuffle(double[] z, UniformRandomProvider random) {
        for (int i = z.length - 1; i > 0; i--) {
            int j = random.nextInt(i + 1);
            double swap = z[i];
            z[i] = z[j];
            z[j] = swap;
        }
    }
}
