package org.seamwatch.processors.learning;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;
import org.apache.commons.math3.linear.MatrixUtils;
import org.apache.commons.math3.linear.RealMatrix;
import org.apache.commons.math3.stat.regression.OLSMultipleLinearRegression;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.seamwatch.fixtures.reference.ReferenceEntry;
import org.seamwatch.fixtures.reference.ReferenceValues;
import org.seamwatch.processors.distributions.StudentScore;

class LearnerScoreTest {

    /** Absolute, of scores: what two exact methods may differ by in rounding. */
    private static final double ROUNDING = 1e-9;

    /** The published scores are those of values that all teach as they are. */
    @ParameterizedTest
    @ValueSource(
            strings = {"selfstart-nist-flow", "selfstart-nist-20", "selfstart-montgomery", "selfstart-nist-cusum-data"})
    void shouldGiveTheScoresOfQuesenberryWithOrderZero(String id) {
        ReferenceEntry entry = ReferenceValues.entry("self-starting", id);
        double[] expected = entry.expecteds("Q");
        List<OptionalDouble> scores = Series.scores(unbounded(0), entry.inputs("values"));
        assertThat(expected).hasSizeGreaterThan(5);
        assertThat(scores.subList(0, 2)).containsOnly(OptionalDouble.empty());
        for (int i = 2; i < expected.length; i++) {
            assertThat(scores.get(i).getAsDouble()).isCloseTo(expected[i], within(entry.tolerance()));
        }
    }

    /** Q3 and Q4 of this entry are undefined: no score while nothing has varied, and what differs then teaches. */
    @Test
    void shouldGiveNoScoreAfterAFlatStart() {
        double[] values = ReferenceValues.entry("self-starting", "q-edge").inputs("values");
        assertThat(values).containsExactly(5, 5, 5, 6);
        assertThat(Series.scores(Learner.of(0), values)).containsOnly(OptionalDouble.empty());
        assertThat(Learner.of(0).score(Series.taught(Learner.of(0), values), 5.25))
                .hasValue(0);
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, 0.1, -1e-9, 123456.789, 1e12})
    void shouldTakeRoundingForFlat(double level) {
        double[] values = new double[60];
        Arrays.fill(values, level);
        for (int order = 0; order <= 2; order++) {
            assertThat(Series.scores(Learner.of(order), values)).containsOnly(OptionalDouble.empty());
        }
    }

    @Test
    void shouldGiveNoScoreBeforeTheFirstDegreeOfFreedom() {
        double[] values = {1, 3, 2, 5, 4, 9, 6, 8};
        for (int order = 0; order <= 2; order++) {
            List<OptionalDouble> scores = Series.scores(Learner.of(order), values);
            // The first values only fill the lags; then as many rows as columns, and one for the spread.
            int unscored = order + (order + 1) + 1;
            assertThat(scores.subList(0, unscored)).containsOnly(OptionalDouble.empty());
            assertThat(scores.subList(unscored, values.length)).doesNotContain(OptionalDouble.empty());
        }
    }

    @Test
    void shouldGiveNoScoreWhileTheLagsHaveNotVaried() {
        List<OptionalDouble> scores = Series.scores(Learner.of(1), 5, 5, 5, 5, 6, 4, 7, 5);
        assertThat(scores.subList(0, 6)).containsOnly(OptionalDouble.empty());
        assertThat(scores.subList(6, 8)).doesNotContain(OptionalDouble.empty());
    }

    @ParameterizedTest
    @CsvSource({"0, 0", "1, 0.85", "2, 0.5", "1, 1"})
    void shouldAgreeWithBatchLeastSquares(int order, double correlation) {
        double[] values = Series.correlated(120, correlation, 71 + order);
        List<OptionalDouble> scores = Series.scores(unbounded(order), values);
        for (int i = 2 * order + 2; i < values.length; i++) {
            assertThat(scores.get(i).getAsDouble()).isCloseTo(batchScore(values, i, order), within(ROUNDING));
        }
    }

    @Test
    void shouldAgreeWithBatchLeastSquaresAfterAFlatStartAndAJump() {
        double[] values = {5, 5, 5, 5, 6, 4, 7, 5, 900, 901, 899.5, 7, 6};
        List<OptionalDouble> scores = Series.scores(unbounded(1), values);
        for (int i = 6; i < values.length; i++) {
            assertThat(scores.get(i).getAsDouble()).isCloseTo(batchScore(values, i, 1), within(ROUNDING));
        }
    }

    @Test
    void shouldNotLoseDigitsOverManyDays() {
        double[] values = Series.correlated(20_000, 0.5, 5);
        LearningState state = Series.taught(unbounded(1), Arrays.copyOf(values, values.length - 1));
        assertThat(unbounded(1).score(state, values[values.length - 1]).getAsDouble())
                .isCloseTo(batchScore(values, values.length - 1, 1), within(ROUNDING));
    }

    /** Predictive residual of value i by ordinary least squares on all rows before it. */
    private static double batchScore(double[] values, int i, int order) {
        int rows = i - order;
        double[] y = new double[rows];
        double[][] x = new double[rows][];
        for (int row = 0; row < rows; row++) {
            y[row] = values[order + row];
            x[row] = designRow(values, order + row, order);
        }
        double[] at = designRow(values, i, order);
        OLSMultipleLinearRegression ols = new OLSMultipleLinearRegression();
        ols.setNoIntercept(true);
        ols.newSampleData(y, x);
        double[] beta = ols.estimateRegressionParameters();
        RealMatrix inverse = MatrixUtils.inverse(
                MatrixUtils.createRealMatrix(x).transpose().multiply(MatrixUtils.createRealMatrix(x)));
        double leverage =
                MatrixUtils.createRealVector(at).dotProduct(inverse.operate(MatrixUtils.createRealVector(at)));
        double error = values[i];
        for (int j = 0; j < at.length; j++) {
            error -= at[j] * beta[j];
        }
        int df = rows - order - 1;
        double spread = Math.sqrt(ols.calculateResidualSumOfSquares() / df * (1 + leverage));
        return StudentScore.of(error / spread, df);
    }

    private static double[] designRow(double[] values, int i, int order) {
        double[] row = new double[order + 1];
        row[0] = 1;
        for (int lag = 1; lag <= order; lag++) {
            row[lag] = values[i - lag];
        }
        return row;
    }

    @ParameterizedTest
    @CsvSource({"0, 1000, 1", "0, -3, 0.001", "1, 1000, 1", "1, 0, 1e6", "2, -50, 1e-5", "1, 0, -2"})
    void shouldNotDependOnLocationAndScale(int order, double location, double scale) {
        double[] values = Series.correlated(80, 0.6, 19);
        values[40] += 12;
        double[] moved = Arrays.stream(values).map(v -> location + scale * v).toArray();
        List<OptionalDouble> scores = Series.scores(Learner.of(order), values);
        List<OptionalDouble> after = Series.scores(Learner.of(order), moved);
        assertThat(scores.get(40).getAsDouble()).isGreaterThan(5);
        for (int i = 0; i < values.length; i++) {
            assertThat(after.get(i).isPresent()).isEqualTo(scores.get(i).isPresent());
            double expected = Math.signum(scale) * scores.get(i).orElse(0);
            assertThat(after.get(i).orElse(0)).isCloseTo(expected, within(1e-7));
        }
    }

    /** Exact with order 0: the scores of normal data are independent standard normal from the third on. */
    @Test
    void shouldGiveStandardNormalScoresForNormalData() {
        int series = 4000;
        int length = 12;
        double sum = 0;
        double squares = 0;
        double products = 0;
        int beyond = 0;
        int count = 0;
        for (int run = 0; run < series; run++) {
            List<OptionalDouble> scores = Series.scores(unbounded(0), Series.correlated(length, 0, 1000 + run));
            for (int i = 2; i < length; i++) {
                double q = scores.get(i).getAsDouble();
                sum += q;
                squares += q * q;
                products += i > 2 ? q * scores.get(i - 1).getAsDouble() : 0;
                beyond += q > 1.6448536269514722 ? 1 : 0;
                count++;
            }
        }
        // Each within three standard errors.
        assertThat(sum / count).isCloseTo(0, within(3 / Math.sqrt(count)));
        assertThat(squares / count).isCloseTo(1, within(3 * Math.sqrt(2.0 / count)));
        assertThat(products / count).isCloseTo(0, within(3 / Math.sqrt(count)));
        assertThat((double) beyond / count).isCloseTo(0.05, within(3 * Math.sqrt(0.05 * 0.95 / count)));
    }

    private static Learner unbounded(int order) {
        return new Learner(order, Double.POSITIVE_INFINITY, 18);
    }
}
