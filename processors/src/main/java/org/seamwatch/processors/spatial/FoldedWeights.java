package org.seamwatch.processors.spatial;

import java.util.Arrays;

/**
 * Weights folded onto pairs: {@code c_ij = w_ij + w_ji} for {@code i < j}, as compressed sparse rows. Since
 * {@code sum_ij w_ij z_i z_j = sum_(i<j) c_ij z_i z_j}, any weights, symmetric or not, cost half the links.
 */
final class FoldedWeights {

    private final int[] offsets;
    private final int[] columns;
    private final double[] values;
    private final double common;

    private FoldedWeights(int[] offsets, int[] columns, double[] values) {
        this.offsets = offsets;
        this.columns = columns;
        this.values = values;
        this.common = commonValue(values);
    }

    /** Folds the rows given; each row's columns must be sorted. */
    static FoldedWeights of(int[] offsets, int[] columns, double[] values) {
        int n = offsets.length - 1;
        Transposed transposed = Transposed.of(offsets, columns, values);
        int[] folded = new int[n + 1];
        int[] pairColumns = new int[columns.length];
        double[] pairValues = new double[columns.length];
        int size = 0;
        for (int i = 0; i < n; i++) {
            int a = offsets[i];
            int b = transposed.offsets[i];
            while (a < offsets[i + 1] || b < transposed.offsets[i + 1]) {
                int columnA = a < offsets[i + 1] ? columns[a] : Integer.MAX_VALUE;
                int columnB = b < transposed.offsets[i + 1] ? transposed.columns[b] : Integer.MAX_VALUE;
                int column = Math.min(columnA, columnB);
                double value = (columnA == column ? values[a++] : 0) + (columnB == column ? transposed.values[b++] : 0);
                if (column > i) {
                    pairColumns[size] = column;
                    pairValues[size++] = value;
                }
            }
            folded[i + 1] = size;
        }
        return new FoldedWeights(folded, Arrays.copyOf(pairColumns, size), Arrays.copyOf(pairValues, size));
    }

    /** {@code sum_ij w_ij z_i z_j}. */
    double crossProduct(double[] z) {
        return Double.isNaN(common) ? weighted(z) : common * unweighted(z);
    }

    /** {@code 1/2 sum_ij (w_ij + w_ji)^2}, which is the sum of squares over pairs. */
    double s1() {
        double sum = 0;
        for (double value : values) {
            sum += value * value;
        }
        return sum;
    }

    private double weighted(double[] z) {
        double sum = 0;
        int k = 0;
        for (int i = 0; i < z.length; i++) {
            double lag = 0;
            for (int end = offsets[i + 1]; k < end; k++) {
                lag += values[k] * z[columns[k]];
            }
            sum += z[i] * lag;
        }
        return sum;
    }

    private double unweighted(double[] z) {
        double sum = 0;
        int k = 0;
        for (int i = 0; i < z.length; i++) {
            double lag = 0;
            for (int end = offsets[i + 1]; k < end; k++) {
                lag += z[columns[k]];
            }
            sum += z[i] * lag;
        }
        return sum;
    }

    /** The value all pairs share, or NaN. */
    private static double commonValue(double[] values) {
        for (double value : values) {
            if (value != values[0]) {
                return Double.NaN;
            }
        }
        return values.length == 0 ? 0 : values[0];
    }

    /** Columns as rows; filled in row order, so each of its rows is sorted. */
    private static final class Transposed {

        private final int[] offsets;
        private final int[] columns;
        private final double[] values;

        private Transposed(int[] offsets, int[] columns, double[] values) {
            this.offsets = offsets;
            this.columns = columns;
            this.values = values;
        }

        static Transposed of(int[] offsets, int[] columns, double[] values) {
            int n = offsets.length - 1;
            int[] starts = new int[n + 1];
            for (int column : columns) {
                starts[column + 1]++;
            }
            for (int i = 0; i < n; i++) {
                starts[i + 1] += starts[i];
            }
            int[] next = starts.clone();
            int[] rows = new int[columns.length];
            double[] weights = new double[columns.length];
            for (int i = 0; i < n; i++) {
                for (int k = offsets[i]; k < offsets[i + 1]; k++) {
                    int at = next[columns[k]]++;
                    rows[at] = i;
                    weights[at] = values[k];
                }
            }
            return new Transposed(starts, rows, weights);
        }
    }
}
