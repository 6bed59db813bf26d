package org.seamwatch.processors.spatial;

import java.util.Arrays;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;

/**
 * Spatial weights {@code w_ij} between regions, as compressed sparse rows; immutable. A row lists the neighbours of one
 * region in ascending order; {@code w_ii} is always absent. Their constants S0, S1, S2 are those of Cliff and Ord (1981).
 *
 * <p>Row {@code i} is walked without allocation: {@code for (int k = w.begin(i); k < w.end(i); k++)} with
 * {@link #column} and {@link #value}.
 */
public final class Weights {

    private enum Style {
        BINARY,
        ROW,
        GENERAL
    }

    private final Style style;
    private final SparseRows rows;
    private final FoldedWeights folded;
    private final boolean[] isolated;
    private final int isolatedCount;
    private final double s0;
    private final double s1;
    private final double s2;
    private @Nullable Subset connected;

    private Weights(Style style, SparseRows given) {
        this.style = style;
        this.rows = style == Style.ROW ? given.standardised() : given;
        this.folded = FoldedWeights.of(rows);
        this.isolated = isolatedAmong(new boolean[rows.size()]);
        this.isolatedCount = count(isolated);
        this.s0 = Shares.sum(rows.values);
        this.s1 = folded.s1();
        this.s2 = sumOfSquaredMarginals();
    }

    /** {@code w_ij = 1} for neighbours. */
    public static Weights binary(int[][] neighbours) {
        return new Weights(Style.BINARY, SparseRows.of(neighbours, null));
    }

    /** {@code w_ij = 1 / number of neighbours of i}, so that each row with neighbours sums to one. */
    public static Weights rowStandardised(int[][] neighbours) {
        return new Weights(Style.ROW, SparseRows.of(neighbours, null));
    }

    /**
     * Any finite weights, symmetric or not.
     *
     * @param neighbours the neighbours of each region
     * @param weights the weight of each of these links, in the same order
     */
    public static Weights of(int[][] neighbours, double[][] weights) {
        return new Weights(Style.GENERAL, SparseRows.of(neighbours, weights));
    }

    /** Number of regions. */
    public int size() {
        return rows.size();
    }

    /** Number of links, each direction counted. */
    public int links() {
        return rows.columns.length;
    }

    /** Whether region {@code i} has no neighbours and is nobody's neighbour. */
    public boolean isolated(int i) {
        return isolated[i];
    }

    /** Number of isolated regions. */
    public int isolatedCount() {
        return isolatedCount;
    }

    /** Index of the first link of row {@code i}. */
    public int begin(int i) {
        return rows.offsets[i];
    }

    /** Index after the last link of row {@code i}. */
    public int end(int i) {
        return rows.offsets[i + 1];
    }

    /** The neighbour that link {@code k} leads to. */
    public int column(int k) {
        return rows.columns[k];
    }

    /** The weight of link {@code k}. */
    public double value(int k) {
        return rows.values[k];
    }

    /** {@code sum_j w_ij z_j}; zero for a region without neighbours. */
    public double lag(double[] z, int i) {
        double sum = 0;
        for (int k = begin(i); k < end(i); k++) {
            sum += value(k) * z[column(k)];
        }
        return sum;
    }

    /** {@code sum_ij w_ij z_i z_j}. */
    double crossProduct(double[] z) {
        return folded.crossProduct(z);
    }

    /** {@code S0 = sum_ij w_ij}. */
    public double s0() {
        return s0;
    }

    /** {@code S1 = 1/2 sum_ij (w_ij + w_ji)^2}. */
    public double s1() {
        return s1;
    }

    /** {@code S2 = sum_i (sum_j w_ij + sum_j w_ji)^2}. */
    public double s2() {
        return s2;
    }

    /** The regions that are not isolated; computed once. */
    public Subset connected() {
        Subset result = connected;
        if (result == null) {
            // Two threads may both get here: they store equal, immutable subsets.
            result = isolatedCount == 0 ? Subset.all(this) : leaving(isolated);
            connected = result;
        }
        return result;
    }

    /**
     * The regions that are left when some are dropped, without those that have no neighbours then. Row-standardised
     * weights are standardised again over the neighbours that are left; other weights stay as they are.
     *
     * @param dropped for each region, whether it is left out
     */
    public Subset without(boolean[] dropped) {
        if (dropped.length != size()) {
            throw new IllegalArgumentException(
                    "dropped must have one value for each of " + size() + " regions, had " + dropped.length);
        }
        return count(dropped) == 0 ? connected() : leaving(isolatedAmong(dropped));
    }

    private Subset leaving(boolean[] out) {
        int[] kept = IntStream.range(0, size()).filter(i -> !out[i]).toArray();
        return new Subset(kept, new Weights(style, rows.keeping(kept)));
    }

    /**
     * Those dropped, and those that have no link to or from any that are not: leaving these out takes nobody's neighbour
     * away, so one pass finds them all.
     */
    private boolean[] isolatedAmong(boolean[] dropped) {
        boolean[] out = new boolean[size()];
        Arrays.fill(out, true);
        for (int i = 0; i < size(); i++) {
            for (int k = begin(i); k < end(i) && !dropped[i]; k++) {
                if (!dropped[column(k)]) {
                    out[i] = false;
                    out[column(k)] = false;
                }
            }
        }
        return out;
    }

    private double sumOfSquaredMarginals() {
        double[] marginals = new double[size()];
        for (int i = 0; i < size(); i++) {
            for (int k = begin(i); k < end(i); k++) {
                marginals[i] += value(k);
                marginals[column(k)] += value(k);
            }
        }
        double sum = 0;
        for (double marginal : marginals) {
            sum += marginal * marginal;
        }
        return sum;
    }

    private static int count(boolean[] flags) {
        int count = 0;
        for (boolean flag : flags) {
            count += flag ? 1 : 0;
        }
        return count;
    }
}
