package org.seamwatch.processors.spatial;

/** Values minus their mean, with what tells whether they vary at all. */
final class Centred {

    /**
     * How far from the mean, relative to the largest value, counts as no variation. The mean of equal values is off by a
     * few units in the last place, and values that should be equal may have gone through a square root and a division
     * each (1e-16 to 1e-14 relative); the smallest true variation, one case among counts of up to a million, stays far
     * above it.
     */
    private static final double FLAT = 1e-12;

    private final double[] deviations;
    private final double sumOfSquares;
    private final boolean flat;

    private Centred(double[] deviations, double sumOfSquares, boolean flat) {
        this.deviations = deviations;
        this.sumOfSquares = sumOfSquares;
        this.flat = flat;
    }

    static Centred of(double[] values) {
        int n = values.length;
        double sum = 0;
        double largest = 0;
        for (int i = 0; i < n; i++) {
            if (!Double.isFinite(values[i])) {
                throw new IllegalArgumentException("value of region " + i + " must be finite, was " + values[i]);
            }
            sum += values[i];
            largest = Math.max(largest, Math.abs(values[i]));
        }
        double mean = sum / n;
        double[] z = new double[n];
        double squares = 0;
        for (int i = 0; i < n; i++) {
            z[i] = values[i] - mean;
            squares += z[i] * z[i];
        }
        double noise = FLAT * largest;
        return new Centred(z, squares, squares <= n * noise * noise);
    }

    /** The deviations from the mean; the array itself, for reading only. */
    double[] deviations() {
        return deviations;
    }

    double sumOfSquares() {
        return sumOfSquares;
    }

    /** Whether there is no variation beyond rounding; so for no values too. */
    boolean flat() {
        return flat;
    }

    /** Fourth moment over the square of the second, {@code b2}. */
    double kurtosis() {
        double fourth = 0;
        for (double z : deviations) {
            fourth += z * z * z * z;
        }
        return deviations.length * fourth / (sumOfSquares * sumOfSquares);
    }
}
