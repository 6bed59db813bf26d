package org.seamwatch.processors.learning;

import java.util.Arrays;
import java.util.OptionalInt;

/**
 * A least-squares regression that takes one row at a time, started exactly: the upper triangular R of X = QR, the
 * rotated response Q'y and the residual sum of squares, moved on by Givens rotations (Golub and Van Loan 1996, Matrix
 * Computations, 5.1 and 12.5; Gentleman 1974, Applied Statistics 23:448-454). No prior, no forgetting, no matrix is
 * inverted, and rotations keep the length of every column, so rounding does not build up.
 *
 * @param rows rows taken
 * @param triangle R by rows, without the zeros below the diagonal: r00 r01 .. r0k r11 r12 ..
 * @param response the rotated response, one number for each column
 * @param residualSquares sum of squared residuals
 */
@SuppressWarnings("ArrayRecordComponent") // copied in and out, equal by value
public record Regression(int rows, double[] triangle, double[] response, double residualSquares) {

    /** A column or a residual under this part of its length is rounding, not data. */
    private static final double ROUNDING = 1e-12;

    public Regression {
        int columns = response.length;
        if (columns < 1 || triangle.length != columns * (columns + 1) / 2) {
            throw new IllegalArgumentException("triangle of " + columns + " columns must have "
                    + columns * (columns + 1) / 2 + " numbers, had " + triangle.length);
        }
        if (rows < 0) {
            throw new IllegalArgumentException("rows must be at least 0, were " + rows);
        }
        if (!(residualSquares >= 0)) {
            throw new IllegalArgumentException("residual squares must be at least 0, were " + residualSquares);
        }
        triangle = triangle.clone();
        response = response.clone();
    }

    /** A regression that has taken no row yet. */
    public static Regression empty(int columns) {
        return new Regression(0, new double[columns * (columns + 1) / 2], new double[columns], 0);
    }

    @Override
    public double[] triangle() {
        return triangle.clone();
    }

    @Override
    public double[] response() {
        return response.clone();
    }

    public int columns() {
        return response.length;
    }

    /** This regression after one more row. */
    Regression with(double[] row, double y) {
        int columns = columns();
        double[] r = triangle.clone();
        double[] z = response.clone();
        double[] x = row.clone();
        double rest = y;
        int diagonal = 0;
        for (int i = 0; i < columns; i++) {
            double length = StrictMath.hypot(r[diagonal], x[i]);
            if (length > 0) {
                double c = r[diagonal] / length;
                double s = x[i] / length;
                for (int j = i; j < columns; j++) {
                    int at = diagonal + j - i;
                    double old = r[at];
                    r[at] = c * old + s * x[j];
                    x[j] = c * x[j] - s * old;
                }
                double old = z[i];
                z[i] = c * old + s * rest;
                rest = c * rest - s * old;
            }
            diagonal += columns - i;
        }
        return new Regression(rows + 1, r, z, residualSquares + rest * rest);
    }

    /**
     * Residual degrees of freedom, or empty where a residual cannot be judged: no more rows than columns, columns that
     * depend on each other, or residuals that are zero up to rounding.
     */
    OptionalInt degreesOfFreedom() {
        int df = rows - columns();
        return df >= 1 && independent() && varies() ? OptionalInt.of(df) : OptionalInt.empty();
    }

    /** Prediction for a row; only where there are degrees of freedom. */
    Prediction at(double[] row) {
        int columns = columns();
        double[] v = row.clone();
        double centre = 0;
        double leverage = 0;
        int diagonal = 0;
        // Forward substitution: R'v = row. Then row'b = v'z and row'(R'R)^-1 row = v'v.
        for (int i = 0; i < columns; i++) {
            v[i] /= triangle[diagonal];
            for (int j = i + 1; j < columns; j++) {
                v[j] -= triangle[diagonal + j - i] * v[i];
            }
            centre += v[i] * response[i];
            leverage += v[i] * v[i];
            diagonal += columns - i;
        }
        int df = rows - columns;
        return new Prediction(centre, StrictMath.sqrt(residualSquares / df * (1 + leverage)), df);
    }

    private boolean independent() {
        int columns = columns();
        for (int j = 0; j < columns; j++) {
            double squares = 0;
            int at = j;
            for (int i = 0; i < j; i++) {
                squares += triangle[at] * triangle[at];
                at += columns - i - 1;
            }
            double own = triangle[at];
            if (!(own * own > ROUNDING * ROUNDING * (squares + own * own))) {
                return false;
            }
        }
        return true;
    }

    private boolean varies() {
        double squares = residualSquares;
        for (double z : response) {
            squares += z * z;
        }
        return residualSquares > ROUNDING * ROUNDING * squares;
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof Regression that
                && rows == that.rows
                && Arrays.equals(triangle, that.triangle)
                && Arrays.equals(response, that.response)
                && Double.compare(residualSquares, that.residualSquares) == 0;
    }

    @Override
    public int hashCode() {
        return 31 * (31 * (31 * rows + Arrays.hashCode(triangle)) + Arrays.hashCode(response))
                + Double.hashCode(residualSquares);
    }

    @Override
    public String toString() {
        return "Regression[rows=" + rows + ", triangle=" + Arrays.toString(triangle) + ", response="
                + Arrays.toString(response) + ", residualSquares=" + residualSquares + "]";
    }
}
