package org.seamwatch.processors.spatial;

import java.util.Arrays;
import org.jspecify.annotations.Nullable;

/**
 * A square matrix as compressed sparse rows. The arrays are package-visible for the loops that need them and written by
 * nobody once built; each row's columns ascend.
 */
final class SparseRows {

    final int[] offsets;
    final int[] columns;
    final double[] values;

    SparseRows(int[] offsets, int[] columns, double[] values) {
        this.offsets = offsets;
        this.columns = columns;
        this.values = values;
    }

    /**
     * Rows from neighbour lists in any order.
     *
     * @param weights the weight of each link in the same order, or null for ones
     */
    static SparseRows of(int[][] neighbours, double @Nullable [][] weights) {
        int n = neighbours.length;
        if (weights != null && weights.length != n) {
            throw new IllegalArgumentException(
                    "weights must have one row for each of " + n + " regions, had " + weights.length);
        }
        int[] offsets = new int[n + 1];
        for (int i = 0; i < n; i++) {
            offsets[i + 1] = offsets[i] + neighbours[i].length;
        }
        SparseRows rows = new SparseRows(offsets, new int[offsets[n]], new double[offsets[n]]);
        for (int i = 0; i < n; i++) {
            double @Nullable [] row = weights == null ? null : weights[i];
            if (row != null && row.length != neighbours[i].length) {
                throw new IllegalArgumentException("weights of region " + i + " must be " + neighbours[i].length
                        + ", one for each neighbour, were " + row.length);
            }
            rows.fill(i, neighbours[i], row);
            rows.check(i);
        }
        return rows;
    }

    int size() {
        return offsets.length - 1;
    }

    private void fill(int i, int[] row, double @Nullable [] weights) {
        int begin = offsets[i];
        int end = offsets[i + 1];
        System.arraycopy(row, 0, columns, begin, row.length);
        Arrays.sort(columns, begin, end);
        for (int k = 0; k < row.length; k++) {
            values[Arrays.binarySearch(columns, begin, end, row[k])] = weights == null ? 1 : weights[k];
        }
    }

    private void check(int i) {
        for (int k = offsets[i]; k < offsets[i + 1]; k++) {
            int j = columns[k];
            if (j < 0 || j >= size()) {
                throw new IllegalArgumentException(
                        "neighbours of region " + i + " must be in 0.." + (size() - 1) + ", one was " + j);
            }
            if (j == i) {
                throw new IllegalArgumentException("region " + i + " must not be its own neighbour");
            }
            if (k > offsets[i] && columns[k - 1] == j) {
                throw new IllegalArgumentException(
                        "neighbours of region " + i + " must differ, " + j + " was there twice");
            }
            if (!Double.isFinite(values[k])) {
                throw new IllegalArgumentException(
                        "weight of regions " + i + " and " + j + " must be finite, was " + values[k]);
            }
        }
    }

    /** Equal values in each row, summing to one. */
    SparseRows standardised() {
        double[] shares = new double[values.length];
        for (int i = 0; i < size(); i++) {
            Arrays.fill(shares, offsets[i], offsets[i + 1], 1.0 / (offsets[i + 1] - offsets[i]));
        }
        return new SparseRows(offsets, columns, shares);
    }

    /** Columns as rows; filled in row order, so the new rows ascend too. */
    SparseRows transposed() {
        int[] starts = new int[size() + 1];
        for (int column : columns) {
            starts[column + 1]++;
        }
        for (int i = 0; i < size(); i++) {
            starts[i + 1] += starts[i];
        }
        int[] next = starts.clone();
        int[] rows = new int[columns.length];
        double[] weights = new double[columns.length];
        for (int i = 0; i < size(); i++) {
            for (int k = offsets[i]; k < offsets[i + 1]; k++) {
                int at = next[columns[k]]++;
                rows[at] = i;
                weights[at] = values[k];
            }
        }
        return new SparseRows(starts, rows, weights);
    }

    /**
     * The rows and columns of some regions.
     *
     * @param kept their indices, ascending
     */
    SparseRows keeping(int[] kept) {
        int[] newIndex = new int[size()];
        Arrays.fill(newIndex, -1);
        for (int row = 0; row < kept.length; row++) {
            newIndex[kept[row]] = row;
        }
        int[] newOffsets = new int[kept.length + 1];
        int[] newColumns = new int[columns.length];
        double[] newValues = new double[columns.length];
        int links = 0;
        for (int row = 0; row < kept.length; row++) {
            for (int k = offsets[kept[row]]; k < offsets[kept[row] + 1]; k++) {
                if (newIndex[columns[k]] >= 0) {
                    newColumns[links] = newIndex[columns[k]];
                    newValues[links++] = values[k];
                }
            }
            newOffsets[row + 1] = links;
        }
        return new SparseRows(newOffsets, Arrays.copyOf(newColumns, links), Arrays.copyOf(newValues, links));
    }
}
