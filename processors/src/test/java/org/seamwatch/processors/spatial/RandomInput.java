package org.seamwatch.processors.spatial;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;

/** Seeded random values, neighbours and weights for tests. */
final class RandomInput {

    private final Random random;

    RandomInput(long seed) {
        this.random = new Random(seed);
    }

    double[] normal(int n) {
        return random.doubles(n, 0, 1)
                .map(u -> Math.sqrt(-2 * Math.log(1 - u)) * Math.cos(2 * Math.PI * random.nextDouble()))
                .toArray();
    }

    /** Whole numbers from 0 to below the bound. */
    double[] counts(int n, int bound) {
        return random.ints(n, 0, bound).mapToDouble(k -> k).toArray();
    }

    double[] populations(int n) {
        return random.ints(n, 2_000, 400_000).mapToDouble(k -> k).toArray();
    }

    /** Symmetric lists in which each pair is linked with the given chance; some regions may stay isolated. */
    int[][] neighbours(int n, double chance) {
        NeighbourLists lists = new NeighbourLists(n);
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < i; j++) {
                if (random.nextDouble() < chance) {
                    lists.link(i, j);
                }
            }
        }
        return lists.toArrays();
    }

    /** Lists in which a link one way says nothing about the other way. */
    int[][] directed(int n, double chance) {
        int[][] lists = new int[n][];
        for (int i = 0; i < n; i++) {
            List<Integer> row = new ArrayList<>();
            for (int j = 0; j < n; j++) {
                if (j != i && random.nextDouble() < chance) {
                    row.add(j);
                }
            }
            lists[i] = row.stream().mapToInt(Integer::intValue).toArray();
        }
        return lists;
    }

    double[][] weights(int[][] neighbours) {
        double[][] weights = new double[neighbours.length][];
        for (int i = 0; i < weights.length; i++) {
            weights[i] = random.doubles(neighbours[i].length, 0.1, 3).toArray();
        }
        return weights;
    }

    /** Weights of every style over the same number of regions. */
    List<Weights> everyStyle(int n, double chance) {
        int[][] symmetric = neighbours(n, chance);
        int[][] directed = directed(n, chance);
        return List.of(
                Weights.binary(symmetric),
                Weights.rowStandardised(symmetric),
                Weights.rowStandardised(directed),
                Weights.of(directed, weights(directed)));
    }

    /** The weights as a full matrix. */
    static double[][] matrix(Weights weights) {
        double[][] w = new double[weights.size()][weights.size()];
        for (int i = 0; i < w.length; i++) {
            for (int k = weights.begin(i); k < weights.end(i); k++) {
                w[i][weights.column(k)] = weights.value(k);
            }
        }
        return w;
    }
}
