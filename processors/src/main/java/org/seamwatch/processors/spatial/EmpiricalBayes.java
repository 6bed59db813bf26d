package org.seamwatch.processors.spatial;

/**
 * The prior of rates by the method of moments (Assunção and Reis 1999, Statistics in Medicine 18:2147-2162): with
 * {@code p_i = y_i / n_i} and m regions, {@code b = sum y / sum n}, {@code s^2 = sum n_i (p_i - b)^2 / sum n}, {@code a =
 * s^2 - b / (sum n / m)}.
 *
 * @param b the overall rate
 * @param s2 the population-weighted variance of the rates
 * @param a the variance between regions beyond chance; negative where rates vary less than chance would make them
 */
record EmpiricalBayes(double b, double s2, double a) {

    /**
     * Estimates the prior.
     *
     * @param cases of each region, at least one region
     * @param population of each region, all above zero
     */
    static EmpiricalBayes of(double[] cases, double[] population) {
        double totalCases = 0;
        double totalPopulation = 0;
        for (int i = 0; i < cases.length; i++) {
            totalCases += cases[i];
            totalPopulation += population[i];
        }
        double b = totalCases / totalPopulation;
        double squares = 0;
        for (int i = 0; i < cases.length; i++) {
            double deviation = cases[i] / population[i] - b;
            squares += population[i] * deviation * deviation;
        }
        double s2 = squares / totalPopulation;
        return new EmpiricalBayes(b, s2, s2 - b * cases.length / totalPopulation);
    }
}
