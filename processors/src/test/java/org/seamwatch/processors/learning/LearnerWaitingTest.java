package org.seamwatch.processors.learning;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class LearnerWaitingTest {

    private static final int TAUGHT = 40;

    @ParameterizedTest
    @ValueSource(ints = {0, 1, 2})
    void shouldTeachWhatWaitedAsIfItHadTaughtAtOnce(int order) {
        Learner learner = Learner.of(order);
        double[] values = ordinary(learner, TAUGHT + 18);
        LearningState held = held(learner, values);
        assertThat(held.waiting()).hasSize(18);
        assertThat(learner.release(held)).isEqualTo(Series.taught(learner, values));
    }

    @ParameterizedTest
    @ValueSource(ints = {0, 1, 2})
    void shouldKeepOutWhatWaitedTooLong(int order) {
        Learner learner = Learner.of(order);
        double[] values = ordinary(learner, TAUGHT + 19);
        LearningState held = held(learner, values);
        LearningState released = learner.release(held);
        LearningState before = Series.taught(learner, Arrays.copyOf(values, TAUGHT));
        assertThat(released.regression()).isEqualTo(before.regression());
        assertThat(released.days()).isEqualTo(TAUGHT);
        assertThat(released.waiting()).isEmpty();
        assertThat(released.lags()).isEqualTo(Series.taught(learner, values).lags());
        assertThat(released.lastDay()).isEqualTo(Series.FIRST.plusDays(TAUGHT + 18));
    }

    @Test
    void shouldMoveTheLagOnAndTheRegressionNotWhileWaiting() {
        Learner learner = Learner.of(1);
        LearningState before = Series.taught(learner, ordinary(learner, TAUGHT));
        LearningState held = learner.hold(before, Series.next(before), 10.5);
        assertThat(held.regression()).isEqualTo(before.regression());
        assertThat(held.lags().raw()).containsExactly(10.5);
        assertThat(learner.score(held, 11))
                .hasValue(before.regression().at(new double[] {1, 10.5}).score(11));
    }

    @Test
    void shouldRememberDayValueAndLagsOfWhatWaits() {
        Learner learner = Learner.of(1);
        LearningState before = Series.taught(learner, 1, 3, 2);
        LearningState held =
                learner.hold(learner.hold(before, LocalDate.of(2024, 2, 10), 7), LocalDate.of(2024, 2, 12), 8);
        Lags first = new Lags(new double[] {2}, new double[] {2});
        Lags second = new Lags(new double[] {7}, new double[] {7});
        assertThat(held.waiting())
                .isEqualTo(List.of(
                        new WaitingDay(LocalDate.of(2024, 2, 10), 7, first),
                        new WaitingDay(LocalDate.of(2024, 2, 12), 8, second)));
    }

    @Test
    void shouldWinsoriseTheLagOfAnExtremeValueThatWaits() {
        Learner learner = Learner.of(1);
        LearningState before = Series.taught(learner, ordinary(learner, TAUGHT));
        Prediction prediction = before.regression().at(before.lags().scoringRow());
        LearningState held = learner.hold(before, Series.next(before), 500);
        assertThat(held.lags()).isEqualTo(new Lags(new double[] {500}, new double[] {prediction.value(3)}));
        assertThat(learner.release(held).regression())
                .isEqualTo(learner.teach(before, Series.next(before), 500).regression());
    }

    @Test
    void shouldGoOnWaitingWhileOtherDaysTeach() {
        Learner learner = Learner.of(0);
        LearningState held = held(learner, ordinary(learner, TAUGHT + 3));
        LearningState taught = learner.teach(held, Series.next(held), 10);
        assertThat(taught.waiting()).isEqualTo(held.waiting());
        assertThat(taught.days()).isEqualTo(TAUGHT + 1);
    }

    @Test
    void shouldChangeNothingWhenNothingWaits() {
        Learner learner = Learner.of(1);
        LearningState state = Series.taught(learner, 1, 3, 2, 5);
        assertThat(learner.release(state)).isEqualTo(state);
    }

    /** Teaches the first values and holds the rest. */
    private static LearningState held(Learner learner, double[] values) {
        LearningState state = Series.taught(learner, Arrays.copyOf(values, TAUGHT));
        for (int i = TAUGHT; i < values.length; i++) {
            state = learner.hold(state, Series.next(state), values[i]);
        }
        return state;
    }

    /** Values of which none is winsorised. */
    private static double[] ordinary(Learner learner, int count) {
        double[] values = Series.correlated(count, 0.3, 8);
        assertThat(Series.scores(learner, values)).allMatch(score -> Math.abs(score.orElse(0)) < 3);
        return values;
    }
}
