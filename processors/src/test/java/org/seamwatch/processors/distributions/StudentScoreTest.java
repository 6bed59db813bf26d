package org.seamwatch.processors.distributions;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.apache.commons.statistics.distribution.TDistribution;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.seamwatch.fixtures.reference.ReferenceEntry;
import org.seamwatch.fixtures.reference.ReferenceValues;

class StudentScoreTest {

    /** Part of the score (at least of 1) that rounding may cost. */
    private static final double ROUNDING = 1e-12;

    @Test
    void shouldGiveTheReferenceScores() {
        ReferenceEntry entry = ReferenceValues.entry("distributions", "t-cdf");
        double[] df = entry.inputs("df");
        double[] t = entry.inputs("t");
        double[] q = entry.expecteds("Q_of_t");
        assertThat(q).hasSizeGreaterThan(40);
        for (int i = 0; i < q.length; i++) {
            assertThat(StudentScore.of(t[i], df[i])).isCloseTo(q[i], within(ROUNDING * Math.max(1, Math.abs(q[i]))));
        }
    }

    @Test
    void shouldGiveTheReferenceProbabilities() {
        ReferenceEntry entry = ReferenceValues.entry("distributions", "t-cdf");
        double[] df = entry.inputs("df");
        double[] t = entry.inputs("t");
        double[] cdf = entry.expecteds("cdf");
        double[] upper = entry.expecteds("upper_tail");
        for (int i = 0; i < t.length; i++) {
            double score = StudentScore.of(t[i], df[i]);
            assertThat(NormalScore.cdf(score)).isCloseTo(cdf[i], within(entry.tolerance()));
            // A score of 12 carries its relative rounding 144 times into its tail.
            assertThat(NormalScore.upperTail(score)).isCloseTo(upper[i], within(2e-11 * upper[i]));
        }
    }

    @Test
    void shouldGiveTheReferenceQuantiles() {
        ReferenceEntry entry = ReferenceValues.entry("distributions", "t-quantile-975");
        double[] df = entry.inputs("df");
        double[] t = entry.expecteds("t");
        double score = NormalScore.quantile(entry.input().path("p").asDouble());
        for (int i = 0; i < t.length; i++) {
            assertThat(StudentScore.inverse(score, df[i])).isCloseTo(t[i], within(entry.tolerance()));
            assertThat(StudentScore.inverse(-score, df[i])).isCloseTo(-t[i], within(entry.tolerance()));
        }
    }

    /** Reference: mpmath 1.3.0 with 60 digits, incomplete beta by its hypergeometric series, then erfc solved. */
    @ParameterizedTest
    @CsvSource({
        "1, 1e6, 4.9797636333931928",
        "2, 1e6, 7.1305068481715309",
        "5, 1e6, 11.267537878388242",
        "40, 1e6, 30.895367650897317",
        "200, 1e6, 66.80896231017113",
        "1000, 1e6, 143.94525046234641",
        "10000, 1e6, 429.18981129622002",
        "1000, 1e300, 1172.4487515758153",
        "1000, 5, 4.9679266074723345",
        "1000, 40, 30.90423212372901",
        "10000, 3, 2.9992503522888289",
        "3, 1.7, 1.3174416086741635",
        "3, 1.75, 1.3456189839937236"
    })
    void shouldKeepItsDigitsFarOut(double df, double t, double q) {
        assertThat(StudentScore.of(t, df)).isCloseTo(q, within(ROUNDING * q));
        assertThat(StudentScore.of(-t, df)).isCloseTo(-q, within(ROUNDING * q));
    }

    /** Reference: mpmath as above. */
    @Test
    void shouldKeepItsDigitsNearTheCentre() {
        assertThat(StudentScore.of(0.01, 1000)).isCloseTo(0.00999750006297387, within(1e-15));
        assertThat(StudentScore.of(1e-9, 7)).isCloseTo(9.65030456147372e-10, within(1e-22));
        assertThat(StudentScore.of(0, 7)).isZero();
    }

    @ParameterizedTest
    @ValueSource(doubles = {1, 1.5, 2, 3, 10, 100, 3000, 1e5, 1e8})
    void shouldRiseWithTAndStayFinite(double df) {
        double last = StudentScore.of(0, df);
        for (double t = 1e-3; t < Double.MAX_VALUE / 2; t *= 1.02 + t / 1e5) {
            double score = StudentScore.of(t, df);
            assertThat(score).as("score at %s", t).isGreaterThan(last).isFinite();
            last = score;
        }
        assertThat(StudentScore.of(Double.POSITIVE_INFINITY, df))
                .isEqualTo(StudentScore.of(Double.MAX_VALUE, df))
                .isGreaterThan(last)
                .isFinite();
        assertThat(StudentScore.of(Double.NEGATIVE_INFINITY, df)).isEqualTo(-StudentScore.of(Double.MAX_VALUE, df));
    }

    @ParameterizedTest
    @ValueSource(ints = {1, 2, 5, 30, 400})
    void shouldAgreeWithTheLibraryWhereItHasDigits(int df) {
        TDistribution library = TDistribution.of(df);
        for (double t = -8; t <= 8; t += 0.13) {
            double p = library.survivalProbability(Math.abs(t));
            double direct = Math.copySign(NormalScore.upperQuantile(p), t);
            assertThat(StudentScore.of(t, df)).isCloseTo(direct, within(1e-11));
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {1, 2, 3.5, 20, 1000})
    void shouldInvert(double df) {
        for (double score : new double[] {0, 1e-6, 0.5, 1, 2.9, 3, 6}) {
            double t = StudentScore.inverse(score, df);
            assertThat(StudentScore.of(t, df)).isCloseTo(score, within(1e-11));
            assertThat(StudentScore.inverse(-score, df)).isEqualTo(-t);
        }
    }

    @Test
    void shouldRefuseWhatHasNoScore() {
        assertThatThrownBy(() -> StudentScore.of(Double.NaN, 3))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("t must be a number, was NaN");
        assertThatThrownBy(() -> StudentScore.of(1, 0.5))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("degrees of freedom must be in [1, 1.0E9], were 0.5");
        assertThatThrownBy(() -> StudentScore.inverse(1, Double.NaN))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("degrees of freedom must be in [1, 1.0E9], were NaN");
        assertThatThrownBy(() -> StudentScore.inverse(31, 5))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("score must be in [-30, 30], was 31.0");
    }
}
