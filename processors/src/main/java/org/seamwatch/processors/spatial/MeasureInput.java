package org.seamwatch.processors.spatial;

import org.jspecify.annotations.Nullable;

/**
 * What a measure is computed from, over the regions that have neighbours. The arrays are held, not copied, and never
 * written to.
 *
 * @param cases cases of each region in the window
 * @param population population of each region, or null where it is not known
 * @param history {@code S_i}, cases of each region on the days d-69 to d-14
 */
@SuppressWarnings("ArrayRecordComponent") // a bundle of arguments, never compared
public record MeasureInput(double[] cases, double @Nullable [] population, double[] history) {

    // Written out: the class file of a compact constructor does not tell callers that population may be null.
    public MeasureInput(double[] cases, double @Nullable [] population, double[] history) {
        checkCounts("cases", cases);
        checkLength("history", history, cases.length);
        checkCounts("history", history);
        if (population != null) {
            checkLength("population", population, cases.length);
            checkPopulation(population);
        }
        this.cases = cases;
        this.population = population;
        this.history = history;
    }

    /** Number of regions. */
    public int regions() {
        return cases.length;
    }

    /** The populations, for a measure that cannot do without. */
    double[] populationFor(Measure measure) {
        if (population == null) {
            throw new IllegalArgumentException("measure " + measure.name() + " needs populations");
        }
        return population;
    }

    private static void checkLength(String name, double[] array, int regions) {
        if (array.length != regions) {
            throw new IllegalArgumentException(
                    name + " must be one for each of " + regions + " regions, were " + array.length);
        }
    }

    private static void checkCounts(String name, double[] counts) {
        for (int i = 0; i < counts.length; i++) {
            if (!(counts[i] >= 0) || !Double.isFinite(counts[i])) {
                throw new IllegalArgumentException(
                        name + " of region " + i + " must be finite and at least 0, was " + counts[i]);
            }
        }
    }

    private static void checkPopulation(double[] population) {
        for (int i = 0; i < population.length; i++) {
            if (!(population[i] > 0) || !Double.isFinite(population[i])) {
                throw new IllegalArgumentException(
                        "population of region " + i + " must be finite and above 0, was " + population[i]);
            }
        }
    }
}
