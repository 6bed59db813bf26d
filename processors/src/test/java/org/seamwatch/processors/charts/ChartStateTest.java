package org.seamwatch.processors.charts;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;
import org.seamwatch.schemas.record.Limits;

class ChartStateTest {

    @Test
    void shouldBeEqualByValue() {
        ChartState one = new ChartState(new double[] {1.5, 2}, 3);
        assertThat(one)
                .isEqualTo(new ChartState(new double[] {1.5, 2}, 3))
                .hasSameHashCodeAs(new ChartState(new double[] {1.5, 2}, 3))
                .isNotEqualTo(new ChartState(new double[] {1.5, 2}, 4))
                .isNotEqualTo(new ChartState(new double[] {1.5}, 3))
                .hasToString("ChartState[memory=[1.5, 2.0], runDays=3]");
    }

    @Test
    void shouldKeepItsNumbersToItself() {
        double[] memory = {1};
        ChartState state = new ChartState(memory, 1);
        memory[0] = 2;
        state.memory()[0] = 3;
        assertThat(state.memory()).containsExactly(1);
    }

    @Test
    void shouldRefuseWhatIsOutOfRange() {
        assertThatThrownBy(() -> new ChartState(new double[] {0}, -1))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("runDays must be at least 0, were -1");
        assertThatThrownBy(() -> new Limits(2.0, 1.0))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("lower limit must be at most the upper 1.0, was 2.0");
    }

    @Test
    void shouldCountALimitItselfAsInside() {
        Limits limits = new Limits(-1.0, 2.0);
        assertThat(limits.isBeyond(2)).isFalse();
        assertThat(limits.isBeyond(Math.nextUp(2.0))).isTrue();
        assertThat(limits.isBeyond(-1)).isFalse();
        assertThat(limits.isBeyond(Math.nextDown(-1.0))).isTrue();
        assertThat(new Limits(null, 2.0).isBeyond(-100)).isFalse();
    }
}
