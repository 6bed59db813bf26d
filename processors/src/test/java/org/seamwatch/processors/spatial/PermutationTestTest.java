package org.seamwatch.processors.spatial;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import org.apache.commons.rng.UniformRandomProvider;
import org.apache.commons.rng.simple.RandomSource;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class PermutationTestTest {

    private static final int[][] RING = {{1, 5}, {0, 2}, {1, 3}, {2, 4}, {3, 5}, {0, 4}};

    /** The same permutations, with the whole index computed for each over a full matrix. */
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3})
    void shouldAgreeWithDoubleLoopsOverTheSamePermutations(long seed) {
        RandomInput input = new RandomInput(seed);
        for (Weights weights : input.everyStyle(30, 0.2)) {
            assertThat(weights.isolatedCount()).isZero();
            double[] values = input.counts(30, 5);
            double[][] w = RandomInput.matrix(weights);
            double observed = index(values, w);
            UniformRandomProvider random = RandomSource.XO_SHI_RO_256_PP.create(seed);
            double[] shuffled = values.clone();
            int reaching = 0;
            for (int m = 0; m < 299; m++) {
                for (int i = shuffled.length - 1; i > 0; i--) {
                    int j = random.nextInt(i + 1);
                    double value = shuffled[i];
                    shuffled[i] = shuffled[j];
                    shuffled[j] = value;
                }
                reaching += index(shuffled, w) >= observed - Reference.NEAR_ZERO ? 1 : 0;
            }
            assertThat(PermutationTest.upper(values, weights, 299, seed)).isEqualTo((1.0 + reaching) / 300);
        }
    }

    @Test
    void shouldGiveTheSameForTheSameSeedAndAnotherForAnother() {
        RandomInput input = new RandomInput(4);
        Weights weights = Weights.binary(input.neighbours(30, 0.2));
        double[] values = input.normal(30);
        double p = PermutationTest.upper(values, weights, 999, 10);
        assertThat(PermutationTest.upper(values, weights, 999, 10)).isEqualTo(p);
        assertThat(PermutationTest.upper(values, weights, 999, 11)).isNotEqualTo(p);
    }

    @Test
    void shouldBeSmallestForValuesThatClusterAsMuchAsTheyCan() {
        double[] gradient = new double[400];
        Arrays.setAll(gradient, i -> i % 20 + i / 20);
        Weights weights = Weights.binary(Contiguity.edge(Shapes.grid(20, 20), 0));
        assertThat(PermutationTest.upper(gradient, weights, 999, 5)).isEqualTo(0.001);
        double[] checkerboard = new double[400];
        Arrays.setAll(checkerboard, i -> (i % 20 + i / 20) % 2);
        assertThat(PermutationTest.upper(checkerboard, weights, 999, 5)).isEqualTo(1);
    }

    @Test
    void shouldBeUniformWithoutStructure() {
        RandomInput input = new RandomInput(6);
        Weights weights = Weights.binary(Contiguity.edge(Shapes.grid(9, 9), 0));
        int below = 0;
        for (int run = 0; run < 1000; run++) {
            below += PermutationTest.upper(input.normal(81), weights, 99, run) <= 0.1 ? 1 : 0;
        }
        // Four standard errors of a share of 0.1 in 1,000 runs.
        assertThat(below / 1000.0).isCloseTo(0.1, within(4 * Math.sqrt(0.1 * 0.9 / 1000)));
    }

    /** One region stands out: on a ring every arrangement has the same index, but for the order of its sum. */
    @ParameterizedTest
    @ValueSource(doubles = {1, 0.1, 1e-7, 123456.789})
    void shouldCountTiesAsReaching(double height) {
        double[] values = {0.3, 0.3 + height, 0.3, 0.3, 0.3, 0.3};
        assertThat(PermutationTest.upper(values, Weights.binary(RING), 199, 7)).isEqualTo(1);
        assertThat(PermutationTest.upper(values, Weights.rowStandardised(RING), 199, 7))
                .isEqualTo(1);
    }

    @Test
    void shouldBeOneWhereNothingCanBeTold() {
        Weights ring = Weights.binary(RING);
        assertThat(PermutationTest.upper(new double[6], ring, 99, 8)).isEqualTo(1);
        assertThat(PermutationTest.upper(new double[] {2, 2, 2, 2, 2, 2}, ring, 99, 8))
                .isEqualTo(1);
        assertThat(PermutationTest.upper(new double[] {1, 2}, Weights.binary(new int[][] {{}, {}}), 99, 8))
                .isEqualTo(1);
        int[][] complete = {{1, 2, 3}, {0, 2, 3}, {0, 1, 3}, {0, 1, 2}};
        assertThat(PermutationTest.upper(new double[] {1, 5, 2, 9}, Weights.binary(complete), 99, 8))
                .isEqualTo(1);
    }

    @Test
    void shouldLeaveIsolatedRegionsOut() {
        int[][] withIsland = {{1, 5}, {0, 2}, {1, 3}, {2, 4}, {3, 5}, {0, 4}, {}};
        double[] values = {1, 2, 4, 7, 5, 3, 1e6};
        double p = PermutationTest.upper(values, Weights.binary(withIsland), 999, 9);
        assertThat(p).isEqualTo(PermutationTest.upper(Arrays.copyOf(values, 6), Weights.binary(RING), 999, 9));
    }

    @Test
    void shouldNotChangeItsArguments() {
        double[] values = {1, 2, 4, 7, 5, 3};
        PermutationTest.upper(values, Weights.binary(RING), 99, 10);
        assertThat(values).containsExactly(1, 2, 4, 7, 5, 3);
    }

    @Test
    void shouldSayWhatIsWrong() {
        Weights ring = Weights.binary(RING);
        assertThatThrownBy(() -> PermutationTest.upper(new double[6], ring, 0, 1))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("permutations must be at least 1, were 0");
        assertThatThrownBy(() -> PermutationTest.upper(new double[7], ring, 9, 1))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("values must be one for each of 6 regions, were 7");
    }

    private static double index(double[] x, double[][] w) {
        double mean = Arrays.stream(x).sum() / x.length;
        double cross = 0;
        double squares = 0;
        double s0 = 0;
        for (int i = 0; i < x.length; i++) {
            squares += (x[i] - mean) * (x[i] - mean);
            for (int j = 0; j < x.length; j++) {
                cross += w[i][j] * (x[i] - mean) * (x[j] - mean);
                s0 += w[i][j];
            }
        }
        return x.length * cross / (s0 * squares);
    }
}
