package org.seamwatch.processors.charts;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.apache.commons.rng.UniformRandomProvider;
import org.apache.commons.rng.sampling.distribution.ZigguratSampler;
import org.apache.commons.rng.simple.RandomSource;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.seamwatch.fixtures.reference.ReferenceEntry;
import org.seamwatch.fixtures.reference.ReferenceValues;
import org.seamwatch.processors.distributions.NormalScore;
import org.seamwatch.schemas.plan.Sides;
import org.seamwatch.schemas.record.Grade;

class RunLengthTest {

    /** Relative; tighter than the 0.1 % asked for, and than the tolerances of the entries. */
    private static final double REFERENCE = 1e-6;

    @Test
    void shouldGiveTheRunLengthsOfLucasAndSaccucci() {
        ReferenceEntry entry = ReferenceValues.entry("ewma", "ewma-arl-lucas-saccucci");
        double[] weights = entry.inputs("lambda");
        double[] widths = entry.inputs("L");
        double[] shifts = entry.inputs("shift");
        assertThat(weights).hasSize(5);
        for (int i = 0; i < weights.length; i++) {
            for (int j = 0; j < shifts.length; j++) {
                double expected = entry.expected().path("ARL").get(i).get(j).asDouble();
                assertTwoSided(weights[i], widths[i], shifts[j], expected);
            }
        }
    }

    @ParameterizedTest
    @CsvSource({
        "ewma-arl-ls-table3, ARL_lambda_.5, 0.5, 3.071",
        "ewma-arl-ls-table3, ARL_lambda_.03, 0.03, 2.437",
        "ewma-arl-crowder87, ARL_lambda_.5, 0.5, 2",
        "ewma-arl-crowder87, ARL_lambda_.05, 0.05, 2",
        "ewma-arl-steiner, ARL_fixed, 0.05, 3"
    })
    void shouldGiveTheOtherPublishedRunLengths(String id, String column, double weight, double width) {
        ReferenceEntry entry = ReferenceValues.entry("ewma", id);
        double[] shifts = entry.inputs("shift");
        double[] expected = entry.expecteds(column);
        assertThat(expected).hasSameSizeAs(shifts).hasSizeGreaterThan(10);
        for (int i = 0; i < shifts.length; i++) {
            assertTwoSided(weight, width, shifts[i], expected[i]);
        }
    }

    @Test
    void shouldGiveTheRunLengthOfTheSasManual() {
        ReferenceEntry entry = ReferenceValues.entry("ewma", "ewma-arl-sas");
        assertTwoSided(0.25, 3, 1, entry.expected("ARL"));
    }

    private static void assertTwoSided(double weight, double width, double shift, double expected) {
        double limit = width * EwmaChart.deviation(weight);
        assertThat(RunLength.ewma(weight, Sides.BOTH, limit, shift))
                .as("weight %s, width %s, shift %s", weight, width, shift)
                .isCloseTo(expected, within(REFERENCE * expected));
    }

    @Test
    void shouldGiveThePublishedFalseAlarmRates() {
        ReferenceEntry entry = ReferenceValues.entry("shewhart-individuals", "shewhart-false-alarm");
        double[] k = entry.inputs("k");
        double[] p = entry.expecteds("p");
        double[] lengths = entry.expecteds("ARL");
        assertThat(k).hasSize(5);
        for (int i = 0; i < k.length; i++) {
            double length = RunLength.individuals(Sides.BOTH, k[i], 0);
            assertThat(length).isCloseTo(lengths[i], within(1e-12 * lengths[i]));
            assertThat(1 / length).isCloseTo(p[i], within(entry.tolerance()));
            assertThat(RunLength.individuals(Sides.UPPER, k[i], 0)).isCloseTo(2 * length, within(1e-12 * length));
        }
    }

    @Test
    void shouldGiveThePublishedRunLengthsOfAShift() {
        ReferenceEntry entry = ReferenceValues.entry("shewhart-individuals", "shewhart-shift-arl");
        double[] shifts = entry.inputs("delta");
        double[] lengths = entry.expecteds("ARL");
        assertThat(shifts).hasSize(7);
        for (int i = 0; i < shifts.length; i++) {
            assertThat(RunLength.individuals(Sides.BOTH, 3, shifts[i]))
                    .isCloseTo(lengths[i], within(entry.tolerance()));
        }
    }

    /** With all weight on the newest score the average is the score itself. */
    @ParameterizedTest
    @ValueSource(doubles = {-1, 0, 0.5, 2})
    void shouldEqualTheIndividualsChartWithAllWeightOnTheNewest(double shift) {
        for (Sides sides : Sides.values()) {
            double closed = RunLength.individuals(sides, 2.5, shift);
            assertThat(RunLength.ewma(1, sides, 2.5, shift)).isCloseTo(closed, within(1e-10 * closed));
        }
    }

    /** No published value was found for the reflected chart: a Markov chain stands in for one. */
    @ParameterizedTest
    @CsvSource({"0.2, 0.7, 0", "0.2, 0.9, 0.5", "0.05, 0.3, 0", "0.05, 0.3, 1", "0.5, 1.4, 0.25", "0.9, 2.2, -0.3"})
    void shouldAgreeWithAMarkovChainForTheReflectedChart(double weight, double limit, double shift) {
        double length = RunLength.ewma(weight, Sides.UPPER, limit, shift);
        double coarse = markov(weight, limit, shift, 150);
        double fine = markov(weight, limit, shift, 300);
        // The error falls with the square of the number of cells (Brook and Evans 1972, Biometrika 59:539-549).
        double extrapolated = (4 * fine - coarse) / 3;
        assertThat(length).isCloseTo(extrapolated, within(2e-4 * extrapolated));
    }

    /** Cells of (0, limit], entered at their middle, and the atom at zero; solved by repeated substitution. */
    private static double markov(double weight, double limit, double shift, int cells) {
        double width = limit / cells;
        double[][] move = new double[cells + 1][cells + 1];
        for (int i = 0; i <= cells; i++) {
            double from = i == 0 ? 0 : (i - 0.5) * width;
            double below = cdfOfStep(0, from, weight, shift);
            move[i][0] = below;
            for (int j = 1; j <= cells; j++) {
                double next = cdfOfStep(j * width, from, weight, shift);
                move[i][j] = next - below;
                below = next;
            }
        }
        return eliminated(move)[0];
    }

    private static double cdfOfStep(double to, double from, double weight, double shift) {
        return NormalScore.cdf((to - (1 - weight) * from) / weight - shift);
    }

    /** Solves (I - P) L = 1 by plain Gaussian elimination; I - P is diagonally dominant. */
    private static double[] eliminated(double[][] move) {
        int n = move.length;
        double[][] a = new double[n][n];
        double[] b = new double[n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                a[i][j] = (i == j ? 1 : 0) - move[i][j];
            }
            b[i] = 1;
        }
        for (int k = 0; k < n; k++) {
            for (int i = k + 1; i < n; i++) {
                double factor = a[i][k] / a[k][k];
                for (int j = k; j < n; j++) {
                    a[i][j] -= factor * a[k][j];
                }
                b[i] -= factor * b[k];
            }
        }
        for (int i = n - 1; i >= 0; i--) {
            for (int j = i + 1; j < n; j++) {
                b[i] -= a[i][j] * b[j];
            }
            b[i] /= a[i][i];
        }
        return b;
    }

    /** The chart itself, run on seeded scores, against its integral equation: within three standard errors. */
    @ParameterizedTest
    @CsvSource({"0.2, UPPER, 0.7, 0", "0.2, UPPER, 0.7, 0.5", "0.1, UPPER, 0.5, 0", "0.2, BOTH, 0.8, 0.3"})
    void shouldAgreeWithTheChartRunOnSimulatedScores(double weight, Sides sides, double limit, double shift) {
        UniformRandomProvider random = RandomSource.XO_RO_SHI_RO_128_PP.create(20_240_203L);
        ZigguratSampler.NormalizedGaussian normal = ZigguratSampler.NormalizedGaussian.of(random);
        EwmaChart chart = new EwmaChart(weight, sides, limit);
        int runs = 20_000;
        double sum = 0;
        double squares = 0;
        for (int run = 0; run < runs; run++) {
            ChartState state = chart.start();
            int days = 0;
            do {
                state = chart.next(state, normal.sample() + shift);
                days++;
            } while (chart.grade(state) != Grade.ACTION);
            sum += days;
            squares += (double) days * days;
        }
        double mean = sum / runs;
        double error = Math.sqrt((squares / runs - mean * mean) / runs);
        assertThat(RunLength.ewma(weight, sides, limit, shift)).isCloseTo(mean, within(3 * error));
    }

    @Test
    void shouldRefuseWhatIsOutOfRange() {
        assertThatThrownBy(() -> RunLength.ewma(1.5, Sides.BOTH, 1, 0))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("weight must be in [0.01, 1], was 1.5");
        assertThatThrownBy(() -> RunLength.ewma(0.2, Sides.BOTH, Double.NaN, 0))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("limit must be finite and above 0, was NaN");
        assertThatThrownBy(() -> RunLength.ewma(1, Sides.BOTH, 8.5, 0))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("limit must be at most 8.0 standard deviations of the average, 8.0, was 8.5");
        assertThatThrownBy(() -> RunLength.individuals(Sides.BOTH, 0, 0))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("limit must be finite and above 0, was 0.0");
        assertThatThrownBy(() -> RunLength.individuals(Sides.BOTH, 3, 31))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("shift must be in [-30, 30], was 31.0");
    }
}
