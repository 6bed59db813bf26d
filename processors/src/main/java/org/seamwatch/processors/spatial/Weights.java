package org.seamwatch.processors.spatial;

import java.util.Arrays;
import org.jspecify.annotations.Nullable;

/**
 * Spatial weights {@code w_ij} between regions, as compressed sparse rows; immutable. A row lists the neighbours of one
 * region in ascending order; {@code w_ii} is always absent.
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
    private final int[] offsets;
    private final int[] columns;
    private final double[] values;
    private final boolean[] isolated;
    private final int isolatedCount;
    private final FoldedWeights folded;
    private final double s0;
    private final double s2;
    private @Nullable Subset connected;

    private Weights(Style style, int[] offsets, int[] columns, double[] values) {
        this.style = style;
        this.offsets = offsets;
        this.columns = columns;
        this.values = values;
        this.folded = FoldedWeights.of(offsets, columns, values);
        int n = offsets.length - 1;
        double[] marginals = new double[n];
        boolean[] alone = new boolean[n];
        Arrays.fill(alone, true);
        double total = 0;
        for (int i = 0; i < n; i++) {
            for (int k = offsets[i]; k < offsets[i + 1]; k++) {
                marginals[i] += values[k];
                marginals[columns[k]] += values[k];
                total += values[k];
                alone[i] = false;
                alone[columns[k]] = false;
            }
        }
        this.s0 = total;
        this.s2 = sumOfSquares(marginals);
        this.isolated = alone;
        this.isolatedCount = count(alone);
    }

    /** {@code w_ij = 1} for neighbours. */
    public static Weights binary(int[][] neighbours) {
        return build(Style.BINARY, neighbours, null);
    }

    /** {@code w_ij = 1 / number of neighbours of i}, so that each row with neighbours sums to one. */
    public static Weights rowStandardised(int[][] neighbours) {
        return build(Style.ROW, neighbours, null);
    }

    /**
     * Any finite weights, symmetric or not.
     *
     * @param neighbours the neighbours of each region
     * @param weights the weight of each of these links, in the same order
     */
    public static Weights of(int[][] neighbours, double[][] weights) {
        return build(Style.GENERAL, neighbours, weights);
    }

    private static Weights build(Style style, int[][] neighbours, double @Nullable [][] weights) {
        int n = neighbours.length;
        if (weights != null && weights.length != n) {
            throw new IllegalArgumentException(
                    "weights must have one row for each of " + n + " regions, had " + weights.length);
        }
        int[] offsets = new int[n + 1];
        for (int i = 0; i < n; i++) {
            offsets[i + 1] = offsets[i] + neighbours[i].length;
        }
        int[] columns = new int[offsets[n]];
        double[] values = new double[offsets[n]];
        for (int i = 0; i < n; i++) {
            double @Nullable [] row = weights == null ? null : weights[i];
            if (row != null && row.length != neighbours[i].length) {
                throw new IllegalArgumentException("weights of region " + i + " must be " + neighbours[i].length
                        + ", one for each neighbour, were " + row.length);
            }
            fillRow(neighbours[i], row, offsets[i], columns, values);
            checkRow(i, n, offsets, columns, values);
        }
        if (style == Style.ROW) {
            standardiseRows(offsets, values);
        }
        return new Weights(style, offsets, columns, values);
    }

    private static void fillRow(int[] row, double @Nullable [] weights, int offset, int[] columns, double[] values) {
        System.arraycopy(row, 0, columns, offset, row.length);
        Arrays.sort(columns, offset, offset + row.length);
        for (int k = 0; k < row.length; k++) {
            int at = Arrays.binarySearch(columns, offset, offset + row.length, row[k]);
            values[at] = weights == null ? 1 : weights[k];
        }
    }

    private static void checkRow(int i, int n, int[] offsets, int[] columns, double[] values) {
        for (int k = offsets[i]; k < offsets[i + 1]; k++) {
            int j = columns[k];
            if (j < 0 || j >= n) {
                throw new IllegalArgumentException(
                        "neighbours of region " + i + " must be in 0.." + (n - 1) + ", one was " + j);
            }
            if (j == i) {
                throw new IllegalArgumentException("region " + i + " must not be its own neighbour");
            }
            if (k > offsets[i] && columns[k - 1] == j) {
                throw new IllegalArgumentException(
                        "neighbours of region " + i + " must differ, " + j + " is twice there");
            }
            if (!Double.isFinite(values[k])) {
                throw new IllegalArgumentException(
                        "weight of regions " + i + " and " + j + " must be finite, was " + values[k]);
            }
        }
    }

    private static void standardiseRows(int[] offsets, double[] values) {
        for (int i = 0; i + 1 < offsets.length; i++) {
            Arrays.fill(values, offsets[i], offsets[i + 1], 1.0 / (offsets[i + 1] - offsets[i]));
        }
    }

    /** Number of regions. */
    public int size() {
        return offsets.length - 1;
    }

    /** Number of links, each direction counted. */
    public int links() {
        return columns.length;
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
        return offsets[i];
    }

    /** Index after the last link of row {@code i}. */
    public int end(int i) {
        return offsets[i + 1];
    }

    /** The neighbour that link {@code k} leads to. */
    public int column(int k) {
        return columns[k];
    }

    /** The weight of link {@code k}. */
    public double value(int k) {
        return values[k];
    }

    /** {@code sum_j w_ij z_j}; zero for a region without neighbours. */
    public double lag(double[] z, int i) {
        double sum = 0;
        for (int k = offsets[i]; k < offsets[i + 1]; k++) {
            sum += values[k] * z[columns[k]];
        }
        return sum;
    }

    /** {@code sum_ij w_ij z_i z_j}. */
    double crossProduct(double[] z) {
        return folded.crossProduct(z);
    }

    /** {@code S0 = sum_ij w_ij} (Cliff and Ord 1981). */
    public double s0() {
        return s0;
    }

    /** {@code S1 = 1/2 sum_ij (w_ij + w_ji)^2}. */
    public double s1() {
        return folded.s1();
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
            result = isolatedCount == 0 ? Subset.all(this) : keep(isolated);
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
        return count(dropped) == 0 ? connected() : keep(withNewlyIsolated(dropped));
    }

    /** Leaving an isolated region out takes nobody's neighbour away, so one pass finds them all. */
    private boolean[] withNewlyIsolated(boolean[] dropped) {
        boolean[] out = new boolean[size()];
        Arrays.fill(out, true);
        for (int i = 0; i < size(); i++) {
            for (int k = offsets[i]; k < offsets[i + 1] && !dropped[i]; k++) {
                if (!dropped[columns[k]]) {
                    out[i] = false;
                    out[columns[k]] = false;
                }
            }
        }
        return out;
    }

    private Subset keep(boolean[] out) {
        int[] kept = new int[size() - count(out)];
        int[] newIndex = new int[size()];
        int m = 0;
        for (int i = 0; i < size(); i++) {
            if (!out[i]) {
                newIndex[i] = m;
                kept[m++] = i;
            }
        }
        int[] newOffsets = new int[m + 1];
        int[] newColumns = new int[columns.length];
        double[] newValues = new double[columns.length];
        int links = 0;
        for (int row = 0; row < m; row++) {
            for (int k = begin(kept[row]); k < end(kept[row]); k++) {
                if (!out[columns[k]]) {
                    newColumns[links] = newIndex[columns[k]];
                    newValues[links++] = values[k];
                }
            }
            newOffsets[row + 1] = links;
        }
        newValues = Arrays.copyOf(newValues, links);
        if (style == Style.ROW) {
            standardiseRows(newOffsets, newValues);
        }
        return new Subset(kept, new Weights(style, newOffsets, Arrays.copyOf(newColumns, links), newValues));
    }

    private static double sumOfSquares(double[] x) {
        double sum = 0;
        for (double value : x) {
            sum += value * value;
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
