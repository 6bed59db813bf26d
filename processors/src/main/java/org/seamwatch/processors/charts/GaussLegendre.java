package org.seamwatch.processors.charts;

/**
 * Gauss-Legendre quadrature on [low, high] (Abramowitz and Stegun 1964, 25.4.30): exact for polynomials of degree 2n - 1.
 *
 * @param nodes where to evaluate, ascending
 * @param weights what each value counts
 */
@SuppressWarnings("ArrayRecordComponent") // stays inside the package, never compared
record GaussLegendre(double[] nodes, double[] weights) {

    private static final int NEWTON_STEPS = 12;

    static GaussLegendre on(double low, double high, int count) {
        double[] nodes = new double[count];
        double[] weights = new double[count];
        double middle = (low + high) / 2;
        double half = (high - low) / 2;
        for (int i = 0; i < (count + 1) / 2; i++) {
            double x = StrictMath.cos(StrictMath.PI * (i + 0.75) / (count + 0.5));
            double slope = 1;
            for (int step = 0; step < NEWTON_STEPS; step++) {
                double before = 0;
                double value = 1;
                for (int k = 1; k <= count; k++) {
                    double next = ((2 * k - 1) * x * value - (k - 1) * before) / k;
                    before = value;
                    value = next;
                }
                slope = count * (x * value - before) / (x * x - 1);
                double move = value / slope;
                x -= move;
                if (StrictMath.abs(move) < 1e-15) {
                    break;
                }
            }
            double weight = 2 / ((1 - x * x) * slope * slope) * half;
            nodes[i] = middle - half * x;
            nodes[count - 1 - i] = middle + half * x;
            weights[i] = weight;
            weights[count - 1 - i] = weight;
        }
        return new GaussLegendre(nodes, weights);
    }
}
