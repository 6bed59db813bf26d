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

    /** The value that all pairs share, as they do with binary weights of symmetric neighbours; NaN if they do not. */
    private final double common;

    private FoldedWeights(int[] offsets, int[] columns, double[] values) {
        this.offsets = offsets;
        this.columns = columns;
        this.values = values;
        this.common = commonValue(values);
    }

    static FoldedWeights of(SparseRows w) {
        SparseRows t = w.transposed();
        int[] offsets = new int[w.size() + 1];
        int[] columns = new int[w.columns.length];
        double[] values = new double[w.columns.length];
        int size = 0;
        for (int i = 0; i < w.size(); i++) {
            int a = w.offsets[i];
            int b = t.offsets[i];
            while (a < w.offsets[i + 1] || b < t.offsets[i + 1]) {
                int columnA = a < w.offsets[i + 1] ? w.columns[a] : Integer.MAX_VALUE;
                int columnB = b < t.offsets[i + 1] ? t.columns[b] : Integer.MAX_VALUE;
                int column = Math.min(columnA, columnB);
                double value = (columnA == column ? w.values[a++] : 0) + (columnB == column ? t.values[b++] : 0);
                if (column > i) {
                    columns[size] = column;
                    values[size++] = value;
                }
            }
            offsets[i + 1] = size;
        }
        return new FoldedWeights(offsets, Arrays.copyOf(columns, size), Arrays.copyOf(values, size));
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

    private static double commonValue(double[] values) {
        for (double value : values) {
            if (value != values[0]) {
                return Double.NaN;
            }
        }
        return values.length == 0 ? 0 : values[0];
    }
}
