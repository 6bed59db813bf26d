package org.seamwatch.processors.spatial;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.seamwatch.processors.spatial.Reference.relative;

import java.util.Arrays;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class WeightsTest {

    /** A path of four regions and an isolated one. */
    private static final int[][] PATH = {{1}, {0, 2}, {1, 3}, {2}, {}};

    @Test
    void shouldGiveNeighboursOne() {
        assertThat(RandomInput.matrix(Weights.binary(PATH))).isDeepEqualTo(new double[][] {
            {0, 1, 0, 0, 0}, {1, 0, 1, 0, 0}, {0, 1, 0, 1, 0}, {0, 0, 1, 0, 0}, {0, 0, 0, 0, 0}
        });
    }

    @Test
    void shouldMakeRowsSumToOne() {
        assertThat(RandomInput.matrix(Weights.rowStandardised(PATH))).isDeepEqualTo(new double[][] {
            {0, 1, 0, 0, 0}, {0.5, 0, 0.5, 0, 0}, {0, 0.5, 0, 0.5, 0}, {0, 0, 1, 0, 0}, {0, 0, 0, 0, 0}
        });
    }

    @Test
    void shouldSortRowsTogetherWithTheirWeights() {
        Weights weights = Weights.of(new int[][] {{2, 1}, {}, {0}}, new double[][] {{5, 7}, {}, {3}});
        assertThat(RandomInput.matrix(weights)).isDeepEqualTo(new double[][] {{0, 7, 5}, {0, 0, 0}, {3, 0, 0}});
        assertThat(weights.column(0)).isEqualTo(1);
        assertThat(weights.lag(new double[] {1, 10, 100}, 0)).isEqualTo(570);
    }

    @Test
    void shouldCountLinksAndIsolatedRegions() {
        Weights weights = Weights.binary(PATH);
        assertThat(weights.size()).isEqualTo(5);
        assertThat(weights.links()).isEqualTo(6);
        assertThat(weights.isolatedCount()).isEqualTo(1);
        assertThat(weights.isolated(4)).isTrue();
        assertThat(weights.isolated(0)).isFalse();
    }

    @Test
    void shouldNotCallARegionIsolatedThatIsSomeonesNeighbour() {
        Weights oneWay = Weights.of(new int[][] {{1}, {}, {}}, new double[][] {{2}, {}, {}});
        assertThat(oneWay.isolated(1)).isFalse();
        assertThat(oneWay.isolatedCount()).isEqualTo(1);
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3})
    void shouldAgreeWithDoubleLoops(long seed) {
        RandomInput input = new RandomInput(seed);
        for (Weights weights : input.everyStyle(40, 0.08)) {
            double[][] w = RandomInput.matrix(weights);
            double[] z = input.normal(40);
            double s0 = 0;
            double s1 = 0;
            double s2 = 0;
            double cross = 0;
            for (int i = 0; i < w.length; i++) {
                double marginal = 0;
                double lag = 0;
                for (int j = 0; j < w.length; j++) {
                    s0 += w[i][j];
                    s1 += (w[i][j] + w[j][i]) * (w[i][j] + w[j][i]) / 2;
                    marginal += w[i][j] + w[j][i];
                    lag += w[i][j] * z[j];
                    cross += w[i][j] * z[i] * z[j];
                }
                s2 += marginal * marginal;
                assertThat(weights.lag(z, i)).isCloseTo(lag, relative(lag));
            }
            assertThat(weights.s0()).isCloseTo(s0, relative(s0));
            assertThat(weights.s1()).isCloseTo(s1, relative(s1));
            assertThat(weights.s2()).isCloseTo(s2, relative(s2));
            assertThat(weights.crossProduct(z)).isCloseTo(cross, relative(s0));
        }
    }

    @Test
    void shouldReturnItselfWhenNothingIsDroppedAndNobodyIsolated() {
        Weights weights = Weights.binary(new int[][] {{1}, {0}});
        Subset subset = weights.without(new boolean[2]);
        assertThat(subset.weights()).isSameAs(weights);
        assertThat(subset.indices()).containsExactly(0, 1);
        assertThat(subset.pick(new double[] {3, 4})).containsExactly(3, 4);
    }

    @Test
    void shouldComputeTheConnectedRegionsOnce() {
        Weights weights = Weights.binary(PATH);
        assertThat(weights.without(new boolean[5])).isSameAs(weights.connected());
        assertThat(weights.connected().indices()).containsExactly(0, 1, 2, 3);
        assertThat(weights.connected().weights().isolatedCount()).isZero();
    }

    @Test
    void shouldDropThoseWhoLoseTheirLastNeighbour() {
        Subset subset = Weights.rowStandardised(PATH).without(new boolean[] {false, true, false, false, false});
        assertThat(subset.size()).isEqualTo(2);
        assertThat(subset.indices()).containsExactly(2, 3);
        assertThat(subset.index(1)).isEqualTo(3);
        assertThat(subset.pick(new double[] {0, 10, 20, 30, 40})).containsExactly(20, 30);
        assertThat(RandomInput.matrix(subset.weights())).isDeepEqualTo(new double[][] {{0, 1}, {1, 0}});
    }

    @Test
    void shouldKeepGeneralWeightsAsTheyAre() {
        double[][] values = {{2}, {3, 4}, {5, 6}, {7}, {}};
        Subset subset = Weights.of(PATH, values).without(new boolean[] {true, false, false, false, false});
        assertThat(RandomInput.matrix(subset.weights()))
                .isDeepEqualTo(new double[][] {{0, 4, 0}, {5, 0, 6}, {0, 7, 0}});
    }

    @ParameterizedTest
    @ValueSource(longs = {4, 5, 6})
    void shouldLeaveNobodyIsolatedAndAgreeWithListsCutByHand(long seed) {
        RandomInput input = new RandomInput(seed);
        int[][] lists = input.neighbours(60, 0.03);
        boolean[] dropped = new boolean[60];
        for (int i = 0; i < dropped.length; i++) {
            dropped[i] = input.counts(1, 4)[0] == 0;
        }
        Subset subset = Weights.rowStandardised(lists).without(dropped);
        double[][] w = RandomInput.matrix(subset.weights());
        boolean[] kept = new boolean[60];
        for (int a = 0; a < subset.size(); a++) {
            int i = subset.index(a);
            kept[i] = true;
            long left = Arrays.stream(lists[i]).filter(j -> !dropped[j]).count();
            assertThat(left).isPositive();
            for (int b = 0; b < subset.size(); b++) {
                boolean linked = Arrays.binarySearch(lists[i], subset.index(b)) >= 0;
                assertThat(w[a][b]).isEqualTo(linked ? 1.0 / left : 0);
            }
        }
        for (int i = 0; i < 60; i++) {
            boolean shouldStay = !dropped[i] && Arrays.stream(lists[i]).anyMatch(j -> !dropped[j]);
            assertThat(kept[i]).isEqualTo(shouldStay);
        }
        assertThat(subset.weights().isolatedCount()).isZero();
    }

    @Test
    void shouldDropEveryoneWhenNoLinkIsLeft() {
        Subset subset = Weights.binary(PATH).without(new boolean[] {false, true, false, true, false});
        assertThat(subset.size()).isZero();
        assertThat(subset.pick(new double[5])).isEmpty();
    }

    @Test
    void shouldNotChangeWithTheArraysItWasBuiltFrom() {
        int[][] lists = {{1}, {0}};
        double[][] values = {{2}, {3}};
        Weights weights = Weights.of(lists, values);
        lists[0][0] = 0;
        values[0][0] = 99;
        assertThat(RandomInput.matrix(weights)).isDeepEqualTo(new double[][] {{0, 2}, {3, 0}});
    }

    @Test
    void shouldSayWhatIsWrong() {
        assertThatThrownBy(() -> Weights.binary(new int[][] {{1}, {2}}))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("neighbours of region 1 must be in 0..1, one was 2");
        assertThatThrownBy(() -> Weights.binary(new int[][] {{1}, {1}}))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("region 1 must not be its own neighbour");
        assertThatThrownBy(() -> Weights.binary(new int[][] {{1, 1}, {0}}))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("neighbours of region 0 must differ, 1 was there twice");
        assertThatThrownBy(() -> Weights.of(new int[][] {{1}, {0}}, new double[][] {{1}, {Double.NaN}}))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("weight of regions 1 and 0 must be finite, was NaN");
        assertThatThrownBy(() -> Weights.of(new int[][] {{1}, {0}}, new double[][] {{1}, {1, 2}}))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("weights of region 1 must be 1, one for each neighbour, were 2");
        assertThatThrownBy(() -> Weights.of(new int[][] {{1}, {0}}, new double[][] {{1}}))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("weights must have one row for each of 2 regions, had 1");
        assertThatThrownBy(() -> Weights.binary(PATH).without(new boolean[4]))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("dropped must have one value for each of 5 regions, had 4");
    }
}
