package org.seamwatch.processors.charts;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class GaussLegendreTest {

    private static final double ROUNDING = 1e-14;

    /** Abramowitz and Stegun (1964), table 25.4, n = 5; values from memory. */
    @Test
    void shouldGiveThePublishedNodesAndWeights() {
        GaussLegendre rule = GaussLegendre.on(-1, 1, 5);
        double[] nodes = {-0.906179845938664, -0.538469310105683, 0, 0.538469310105683, 0.906179845938664};
        double[] weights = {
            0.236926885056189, 0.478628670499366, 0.568888888888889, 0.478628670499366, 0.236926885056189
        };
        assertThat(rule.nodes()).containsExactly(nodes, within(ROUNDING));
        assertThat(rule.weights()).containsExactly(weights, within(ROUNDING));
    }

    @ParameterizedTest
    @ValueSource(ints = {1, 2, 7, 60, 501})
    void shouldBeExactForPolynomialsOfTwiceItsSize(int count) {
        GaussLegendre rule = GaussLegendre.on(0, 1, count);
        int degree = 2 * count - 1;
        double sum = 0;
        for (int i = 0; i < count; i++) {
            sum += rule.weights()[i] * Math.pow(rule.nodes()[i], degree);
        }
        assertThat(sum * (degree + 1)).isCloseTo(1, within(1e-9));
    }
}
