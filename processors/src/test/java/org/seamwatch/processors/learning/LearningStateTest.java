package org.seamwatch.processors.learning;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import org.junit.jupiter.api.Test;

class LearningStateTest {

    /** What a store keeps is plain numbers: a state built again from them is the same. */
    @Test
    void shouldBeTheSameWhenBuiltAgainFromItsNumbers() {
        Learner learner = Learner.of(2);
        LearningState state =
                learner.hold(Series.taught(learner, Series.correlated(30, 0.4, 2)), Series.FIRST.plusDays(40), 12);
        Regression regression = state.regression();
        LearningState copy = new LearningState(
                state.days(),
                new Regression(
                        regression.rows(), regression.triangle(), regression.response(), regression.residualSquares()),
                new Lags(state.lags().raw(), state.lags().winsorised()),
                state.lastDay(),
                List.copyOf(state.waiting()));
        assertThat(copy).isEqualTo(state).hasSameHashCodeAs(state).hasToString(state.toString());
        assertThat(learner.score(copy, 11)).isEqualTo(learner.score(state, 11));
    }

    @Test
    void shouldDifferWhereANumberDiffers() {
        Regression one = new Regression(3, new double[] {1}, new double[] {2}, 3);
        assertThat(one)
                .isNotEqualTo(new Regression(4, new double[] {1}, new double[] {2}, 3))
                .isNotEqualTo(new Regression(3, new double[] {9}, new double[] {2}, 3))
                .isNotEqualTo(new Regression(3, new double[] {1}, new double[] {9}, 3))
                .isNotEqualTo(new Regression(3, new double[] {1}, new double[] {2}, 9));
        assertThat(new Lags(new double[] {1}, new double[] {2}))
                .isNotEqualTo(new Lags(new double[] {1}, new double[] {1}))
                .isNotEqualTo(new Lags(new double[] {2}, new double[] {2}));
    }

    @Test
    void shouldKeepItsNumbersToItself() {
        double[] raw = {1};
        Lags lags = new Lags(raw, new double[] {1});
        raw[0] = 5;
        lags.raw()[0] = 6;
        lags.winsorised()[0] = 7;
        assertThat(lags).isEqualTo(new Lags(new double[] {1}, new double[] {1}));

        double[] triangle = {1};
        double[] response = {2};
        Regression regression = new Regression(3, triangle, response, 3);
        triangle[0] = 5;
        response[0] = 5;
        regression.triangle()[0] = 6;
        regression.response()[0] = 6;
        assertThat(regression).isEqualTo(new Regression(3, new double[] {1}, new double[] {2}, 3));
    }

    @Test
    void shouldNotChangeAStateThatTeaches() {
        Learner learner = Learner.of(1);
        LearningState state = Series.taught(learner, 1, 3, 2, 5);
        LearningState same = Series.taught(learner, 1, 3, 2, 5);
        learner.teach(state, Series.next(state), 4);
        learner.hold(state, Series.next(state), 4);
        assertThat(state).isEqualTo(same);
    }

    @Test
    void shouldRefuseNumbersThatDoNotFit() {
        assertThatThrownBy(() -> new Regression(0, new double[2], new double[2], 0))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("triangle of 2 columns must have 3 numbers, had 2");
        assertThatThrownBy(() -> new Regression(-1, new double[1], new double[1], 0))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("rows must be at least 0, were -1");
        assertThatThrownBy(() -> new Regression(0, new double[1], new double[1], Double.NaN))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("residual squares must be at least 0, were NaN");
        assertThatThrownBy(() -> new Lags(new double[1], new double[2]))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("raw and winsorised lags must be equally many, were 1 and 2");
        assertThatThrownBy(() -> new LearningState(-1, Regression.empty(1), Lags.NONE, null, List.of()))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("days must be at least 0, were -1");
    }
}
