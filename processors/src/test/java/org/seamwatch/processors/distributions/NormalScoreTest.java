package org.seamwatch.processors.distributions;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.seamwatch.fixtures.reference.ReferenceEntry;
import org.seamwatch.fixtures.reference.ReferenceValues;

class NormalScoreTest {

    /** Relative; the reference values have 15 digits. */
    private static final double TAIL = 1e-13;

    @Test
    void shouldGiveThePublishedProbabilities() {
        ReferenceEntry entry = ReferenceValues.entry("distributions", "normal-cdf");
        double[] x = entry.inputs("x");
        double[] cdf = entry.expecteds("cdf");
        double[] upper = entry.expecteds("upper_tail");
        assertThat(x).hasSizeGreaterThan(5);
        for (int i = 0; i < x.length; i++) {
            assertThat(NormalScore.cdf(x[i])).isCloseTo(cdf[i], within(entry.tolerance()));
            assertThat(NormalScore.upperTail(x[i])).isCloseTo(upper[i], within(TAIL * upper[i]));
            assertThat(NormalScore.upperTail(-x[i])).isCloseTo(cdf[i], within(entry.tolerance()));
            assertThat(StrictMath.exp(NormalScore.logUpperTail(x[i]))).isCloseTo(upper[i], within(TAIL * upper[i]));
            assertThat(StrictMath.exp(NormalScore.logUpperTail(-x[i]))).isCloseTo(cdf[i], within(entry.tolerance()));
        }
    }

    @Test
    void shouldGiveThePublishedQuantiles() {
        ReferenceEntry entry = ReferenceValues.entry("distributions", "normal-quantile");
        assertQuantiles(entry.inputs("p"), entry.expecteds("z"), entry.tolerance());
        assertQuantiles(entry.inputs("extreme_p"), entry.expecteds("extreme_z"), entry.tolerance());
    }

    private static void assertQuantiles(double[] p, double[] z, double tolerance) {
        assertThat(p).hasSizeGreaterThan(5).hasSameSizeAs(z);
        for (int i = 0; i < p.length; i++) {
            assertThat(NormalScore.quantile(p[i])).isCloseTo(z[i], within(tolerance));
            assertThat(NormalScore.upperQuantile(p[i])).isCloseTo(-z[i], within(tolerance));
            assertThat(NormalScore.fromLogUpperTail(StrictMath.log(p[i]))).isCloseTo(-z[i], within(tolerance));
        }
    }

    /** Reference: mpmath 1.3.0 with 60 digits, log(erfc(x / sqrt 2) / 2) solved for x. */
    @ParameterizedTest
    @CsvSource({
        "-2236.8397221692227, 66.80896231017113",
        "-10366.005985145361, 143.94525046234641",
        "-92108.927903476021, 429.18981129622002",
        "-687326.02332489529, 1172.4487515758153"
    })
    void shouldGiveQuantilesOfProbabilitiesThatUnderflow(double logTail, double x) {
        assertThat(NormalScore.fromLogUpperTail(logTail)).isCloseTo(x, within(1e-13 * x));
        assertThat(NormalScore.logUpperTail(x)).isCloseTo(logTail, within(-1e-13 * logTail));
    }

    @Test
    void shouldJoinTheTwoFormsOfTheFarQuantileWithoutAStep() {
        double above = NormalScore.fromLogUpperTail(StrictMath.nextUp(-700.0));
        double below = NormalScore.fromLogUpperTail(StrictMath.nextDown(-700.0));
        assertThat(below).isCloseTo(above, within(1e-13 * above));
    }

    @Test
    void shouldGiveInfiniteQuantilesForCertainty() {
        assertThat(NormalScore.quantile(0)).isEqualTo(Double.NEGATIVE_INFINITY);
        assertThat(NormalScore.upperQuantile(0)).isEqualTo(Double.POSITIVE_INFINITY);
        assertThat(NormalScore.fromLogUpperTail(Double.NEGATIVE_INFINITY)).isEqualTo(Double.POSITIVE_INFINITY);
        assertThat(NormalScore.fromLogUpperTail(0)).isEqualTo(Double.NEGATIVE_INFINITY);
    }

    @ParameterizedTest
    @ValueSource(doubles = {-0.1, 1.5, Double.NaN})
    void shouldRefuseWhatIsNoProbability(double p) {
        assertThatThrownBy(() -> NormalScore.quantile(p))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("probability must be in [0, 1], was " + p);
        assertThatThrownBy(() -> NormalScore.upperQuantile(p))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("probability must be in [0, 1], was " + p);
    }

    @Test
    void shouldRefuseALogarithmOfMoreThanCertainty() {
        assertThatThrownBy(() -> NormalScore.fromLogUpperTail(0.5))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("logarithm of a tail probability must be at most 0, was 0.5");
        assertThatThrownBy(() -> NormalScore.fromLogUpperTail(Double.NaN))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("logarithm of a tail probability must be at most 0, was NaN");
    }
}
