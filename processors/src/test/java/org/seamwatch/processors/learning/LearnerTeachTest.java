package org.seamwatch.processors.learning;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.time.LocalDate;
import java.util.Arrays;
import org.apache.commons.math3.stat.StatUtils;
import org.apache.commons.statistics.distribution.NormalDistribution;
import org.apache.commons.statistics.distribution.TDistribution;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class LearnerTeachTest {

    private static final Learner ORDER_1 = Learner.of(1);

    @Test
    void shouldTeachAnExtremeValueAsTheBoundOfItsPrediction() {
        double[] values = Series.correlated(30, 0, 3);
        LearningState before = Series.taught(new Learner(0, Double.POSITIVE_INFINITY, 18), values);
        LearningState after = Learner.of(0).teach(before, Series.next(before), 1e6);

        // Straight from the definition: mean + t_29(Phi(3)) s sqrt(1 + 1/30).
        double t = TDistribution.of(29)
                .inverseSurvivalProbability(NormalDistribution.of(0, 1).survivalProbability(3));
        double bound = StatUtils.mean(values) + t * Math.sqrt(StatUtils.variance(values) * (1 + 1.0 / 30));
        double[] taught = Arrays.copyOf(values, 31);
        taught[30] = bound;
        Prediction prediction = after.regression().at(new double[] {1});
        assertThat(prediction.centre()).isCloseTo(StatUtils.mean(taught), within(1e-9));
        assertThat(prediction.spread()).isCloseTo(Math.sqrt(StatUtils.variance(taught) * (1 + 1.0 / 31)), within(1e-9));
    }

    @Test
    void shouldTeachAnExtremeLowValueAsTheLowerBound() {
        LearningState before = Series.taught(Learner.of(0), Series.correlated(30, 0, 3));
        Prediction prediction = before.regression().at(new double[] {1});
        LearningState after = Learner.of(0).teach(before, Series.next(before), -1e6);
        assertThat(after.regression()).isEqualTo(before.regression().with(new double[] {1}, prediction.value(-3)));
        assertThat(prediction.score(prediction.value(-3))).isCloseTo(-3, within(1e-10));
    }

    @Test
    void shouldTeachWithinTheBoundsUnchanged() {
        LearningState before = Series.taught(Learner.of(0), Series.correlated(30, 0, 3));
        double y = before.regression().at(new double[] {1}).value(2.99);
        LearningState after = Learner.of(0).teach(before, Series.next(before), y);
        assertThat(after.regression()).isEqualTo(before.regression().with(new double[] {1}, y));
    }

    @Test
    void shouldScoreWithTheRawLagAndTeachWithTheWinsorisedOne() {
        LearningState before = Series.taught(ORDER_1, Series.correlated(60, 0.7, 11));
        Prediction prediction = before.regression().at(before.lags().scoringRow());
        LearningState after = ORDER_1.teach(before, Series.next(before), 500);

        assertThat(after.lags().raw()).containsExactly(500);
        assertThat(after.lags().winsorised()).containsExactly(prediction.value(3));
        Prediction raw = after.regression().at(new double[] {1, 500});
        assertThat(ORDER_1.score(after, 350)).hasValue(raw.score(350));
    }

    /** The day after an extreme one looks ordinary from it; from the winsorised lag it must look just as ordinary. */
    @Test
    void shouldTeachTheSameResidualFromAWinsorisedLag() {
        LearningState extreme =
                ORDER_1.teach(Series.taught(ORDER_1, Series.correlated(60, 0.7, 11)), Series.FIRST.plusDays(60), 500);
        double[] row = extreme.lags().learningRow();
        Prediction raw = extreme.regression().at(new double[] {1, 500});
        Prediction winsorised = extreme.regression().at(row);
        double y = raw.value(0.8);
        LearningState after = ORDER_1.teach(extreme, Series.next(extreme), y);

        double taught = winsorised.value(0.8);
        Regression expected = extreme.regression().with(row, taught);
        Prediction now = after.regression().at(new double[] {1, 10});
        Prediction then = expected.at(new double[] {1, 10});
        assertThat(now.centre()).isCloseTo(then.centre(), within(1e-9));
        assertThat(now.spread()).isCloseTo(then.spread(), within(1e-9));
        assertThat(after.lags().winsorised()).containsExactly(y);
    }

    @Test
    void shouldNotLetAnExtremeSpellTakeOverTheRegression() {
        LearningState state = Series.taught(ORDER_1, Series.correlated(200, 0.5, 23));
        double spread = state.regression().at(new double[] {1, 10}).spread();
        for (double y : new double[] {80, 45, 27, 19, 15, 10}) {
            state = ORDER_1.teach(state, Series.next(state), y);
        }
        Prediction after = state.regression().at(new double[] {1, 10});
        assertThat(after.centre()).isCloseTo(10, within(0.5));
        assertThat(after.spread()).isLessThan(1.1 * spread);
    }

    @Test
    void shouldCountTheDaysTaught() {
        LearningState state = Series.taught(ORDER_1, 3, 1, 4, 1, 5);
        assertThat(state.days()).isEqualTo(5);
        assertThat(ORDER_1.hold(state, Series.next(state), 9).days()).isEqualTo(5);
    }

    /** The lag is the previous usable value, however many days ago. */
    @Test
    void shouldTakeThePreviousUsableValueAsTheLagOverAGap() {
        LearningState state = Series.taught(ORDER_1, 3, 1, 4, 1, 5);
        LearningState next = ORDER_1.teach(state, Series.FIRST.plusDays(5), 9);
        LearningState later = ORDER_1.teach(state, Series.FIRST.plusDays(50), 9);
        assertThat(later.regression()).isEqualTo(next.regression());
        assertThat(later.lags()).isEqualTo(next.lags());
    }

    @Test
    void shouldDependOnTheOrderOfTheValues() {
        assertThat(Series.taught(ORDER_1, 3, 1, 4, 1, 5).regression())
                .isNotEqualTo(Series.taught(ORDER_1, 3, 4, 1, 1, 5).regression());
    }

    @ParameterizedTest
    @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY, -1e151})
    void shouldRefuseAValueThatIsNoStatistic(double y) {
        LearningState state = ORDER_1.start();
        String message = "value must be in [-1.0E150, 1.0E150], was " + y;
        assertThatThrownBy(() -> ORDER_1.score(state, y))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage(message);
        assertThatThrownBy(() -> ORDER_1.teach(state, Series.FIRST, y))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage(message);
        assertThatThrownBy(() -> ORDER_1.hold(state, Series.FIRST, y))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage(message);
    }

    @Test
    void shouldRefuseADayThatIsNotLater() {
        LearningState state = Series.taught(ORDER_1, 3, 1);
        LocalDate day = LocalDate.of(2024, 2, 2);
        assertThatThrownBy(() -> ORDER_1.teach(state, day, 1))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("day must be after 2024-02-02, was 2024-02-02");
        assertThatThrownBy(() -> ORDER_1.hold(state, day.minusDays(3), 1))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("day must be after 2024-02-02, was 2024-01-30");
    }

    @Test
    void shouldRefuseSettingsOutOfRange() {
        assertThatThrownBy(() -> Learner.of(-1))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("order must be at least 0, was -1");
        assertThatThrownBy(() -> new Learner(0, 0, 18))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("winsor must be in (0, 30] or infinite, was 0.0");
        assertThatThrownBy(() -> new Learner(0, 3, -1))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("maxWaiting must be at least 0, was -1");
    }

    @Test
    void shouldRefuseAStateOfAnotherOrder() {
        LearningState state = Series.taught(Learner.of(0), 3, 1);
        assertThatThrownBy(() -> ORDER_1.score(state, 1))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("state must be of order 1, was of order 0");
        assertThatThrownBy(() -> ORDER_1.teach(state, Series.FIRST.plusDays(9), 1))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("state must be of order 1, was of order 0");
    }
}
