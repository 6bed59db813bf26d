package org.seamwatch.processors.spatial;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;
import static org.seamwatch.processors.spatial.Reference.relative;

import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class GlobalMoranTest {

    /** A ring of six regions. */
    private static final int[][] RING = {{1, 5}, {0, 2}, {1, 3}, {2, 4}, {3, 5}, {0, 4}};

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3})
    void shouldAgreeWithDoubleLoops(long seed) {
        RandomInput input = new RandomInput(seed);
        for (Weights weights : input.everyStyle(50, 0.15)) {
            assertThat(weights.isolatedCount()).isZero();
            double[] values = input.normal(50);
            Moran moran = GlobalMoran.of(values, weights).orElseThrow();
            Moran slow = slow(values, RandomInput.matrix(weights));
            assertSame(moran, slow);
            assertThat(moran.regions()).isEqualTo(50);
        }
    }

    @ParameterizedTest
    @ValueSource(longs = {4, 5})
    void shouldRemoveIsolatedRegionsBeforeAnythingIsComputed(long seed) {
        RandomInput input = new RandomInput(seed);
        int[][] lists = input.neighbours(40, 0.05);
        lists[7] = new int[0];
        for (int i = 0; i < 40; i++) {
            lists[i] = Arrays.stream(lists[i]).filter(j -> j != 7).toArray();
        }
        double[] values = input.normal(40);
        Weights weights = Weights.binary(lists);
        Moran before = GlobalMoran.of(values, weights).orElseThrow();
        values[7] = 1e6;
        assertThat(GlobalMoran.of(values, weights)).contains(before);
        Subset connected = weights.connected();
        assertSame(before, slow(connected.pick(values), RandomInput.matrix(connected.weights())));
        assertThat(before.regions()).isEqualTo(40 - weights.isolatedCount());
    }

    @Test
    void shouldNotDependOnScaleAndShift() {
        RandomInput input = new RandomInput(6);
        for (Weights weights : input.everyStyle(50, 0.15)) {
            double[] values = input.normal(50);
            Moran moran = GlobalMoran.of(values, weights).orElseThrow();
            double[] moved = Arrays.stream(values).map(v -> -1000 - 37.5 * v).toArray();
            assertSame(GlobalMoran.of(moved, weights).orElseThrow(), moran);
        }
    }

    @Test
    void shouldNotDependOnTheScaleOfWeights() {
        RandomInput input = new RandomInput(7);
        int[][] lists = input.directed(50, 0.15);
        double[][] w = input.weights(lists);
        double[] values = input.normal(50);
        Moran moran = GlobalMoran.of(values, Weights.of(lists, w)).orElseThrow();
        double[][] larger = Arrays.stream(w)
                .map(row -> Arrays.stream(row).map(x -> 250 * x).toArray())
                .toArray(double[][]::new);
        assertSame(GlobalMoran.of(values, Weights.of(lists, larger)).orElseThrow(), moran);
    }

    @Test
    void shouldNotDependOnTheOrderOfRegions() {
        RandomInput input = new RandomInput(8);
        int n = 50;
        int[][] lists = input.neighbours(n, 0.15);
        double[] values = input.normal(n);
        List<Integer> order = Arrays.asList(IntStream.range(0, n).boxed().toArray(Integer[]::new));
        Collections.shuffle(order, new Random(8));
        int[][] newLists = new int[n][];
        double[] newValues = new double[n];
        for (int i = 0; i < n; i++) {
            newLists[order.get(i)] = Arrays.stream(lists[i]).map(order::get).toArray();
            newValues[order.get(i)] = values[i];
        }
        Moran moran = GlobalMoran.of(values, Weights.rowStandardised(lists)).orElseThrow();
        assertSame(GlobalMoran.of(newValues, Weights.rowStandardised(newLists)).orElseThrow(), moran);
    }

    @Test
    void shouldBePositiveForAGradientAndNegativeForAlternation() {
        Weights ring = Weights.binary(RING);
        assertThat(GlobalMoran.of(new double[] {0, 1, 2, 2, 1, 0}, ring)
                        .orElseThrow()
                        .z())
                .isGreaterThan(1);
        Moran alternating =
                GlobalMoran.of(new double[] {0, 1, 0, 1, 0, 1}, ring).orElseThrow();
        assertThat(alternating.i()).isCloseTo(-1, within(Reference.NEAR_ZERO));
        assertThat(alternating.z()).isLessThan(-1);
    }

    @Test
    void shouldBeUndefinedForValuesThatDoNotVary() {
        Weights ring = Weights.binary(RING);
        assertThat(GlobalMoran.of(new double[6], ring)).isEmpty();
        double tenth = 0.1;
        double[] equalButForRounding = {tenth * 3, 0.3, 0.3, 0.3, tenth * 3, 0.3};
        assertThat(equalButForRounding[0]).isNotEqualTo(equalButForRounding[1]);
        assertThat(GlobalMoran.of(equalButForRounding, ring)).isEmpty();
    }

    @Test
    void shouldSeeTheSmallestVariationOfLargeCounts() {
        double[] values = {1e6, 1e6, 1e6 + 1, 1e6 + 1, 1e6, 1e6};
        double[] small = {0, 0, 1, 1, 0, 0};
        Weights ring = Weights.binary(RING);
        assertSame(
                GlobalMoran.of(values, ring).orElseThrow(),
                GlobalMoran.of(small, ring).orElseThrow());
    }

    @Test
    void shouldBeUndefinedBelowFourRegionsWithNeighbours() {
        Weights three = Weights.binary(new int[][] {{1}, {0, 2}, {1}, {}, {}});
        assertThat(GlobalMoran.of(new double[] {1, 2, 3, 4, 5}, three)).isEmpty();
        assertThat(GlobalMoran.of(new double[0], Weights.binary(new int[0][]))).isEmpty();
        assertThat(GlobalMoran.of(new double[2], Weights.binary(new int[][] {{}, {}})))
                .isEmpty();
        Weights four = Weights.binary(new int[][] {{1}, {0, 2}, {1, 3}, {2}});
        assertThat(GlobalMoran.of(new double[] {1, 2, 3, 5}, four)).isPresent();
    }

    /** All arrangements give -1/(n-1) then, so that nothing can be told from the index. */
    @ParameterizedTest
    @ValueSource(ints = {4, 5, 17, 200})
    void shouldBeUndefinedWhereEveryoneIsEveryonesNeighbour(int n) {
        int[][] complete = new int[n][];
        for (int i = 0; i < n; i++) {
            int self = i;
            complete[i] = IntStream.range(0, n).filter(j -> j != self).toArray();
        }
        double[] values = new RandomInput(n).normal(n);
        assertThat(GlobalMoran.of(values, Weights.binary(complete))).isEmpty();
        assertThat(GlobalMoran.of(values, Weights.rowStandardised(complete))).isEmpty();
    }

    @Test
    void shouldBeUndefinedWhereOneStandsOutAndAllHaveAsManyNeighbours() {
        assertThat(GlobalMoran.of(new double[] {0, 0, 0, 1, 0, 0}, Weights.binary(RING)))
                .isEmpty();
    }

    @Test
    void shouldBeDefinedOneLinkShortOfEveryonesNeighbours() {
        int n = 200;
        int[][] lists = new int[n][];
        for (int i = 0; i < n; i++) {
            int self = i;
            lists[i] = IntStream.range(0, n)
                    .filter(j -> j != self && self + j != 1)
                    .toArray();
        }
        assertThat(Weights.binary(lists).links()).isEqualTo(n * (n - 1) - 2);
        assertThat(GlobalMoran.of(new RandomInput(12).normal(n), Weights.binary(lists)))
                .isPresent();
    }

    @Test
    void shouldSayWhatIsWrong() {
        Weights ring = Weights.binary(RING);
        assertThatThrownBy(() -> GlobalMoran.of(new double[5], ring))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("values must be one for each of 6 regions, were 5");
        assertThatThrownBy(() -> GlobalMoran.of(new double[] {0, 1, 2, Double.NaN, 4, 5}, ring))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("value of region 3 must be finite, was NaN");
    }

    private static void assertSame(Moran actual, Moran expected) {
        assertThat(actual.regions()).isEqualTo(expected.regions());
        assertThat(actual.i()).isCloseTo(expected.i(), relative(1));
        assertThat(actual.expected()).isCloseTo(expected.expected(), relative(1));
        assertThat(actual.varianceNormality())
                .isCloseTo(expected.varianceNormality(), relative(expected.varianceNormality()));
        assertThat(actual.varianceRandomisation())
                .isCloseTo(expected.varianceRandomisation(), relative(expected.varianceRandomisation()));
        assertThat(actual.z()).isCloseTo(expected.z(), relative(1));
    }

    /** The formulas of Cliff and Ord (1981) over a full matrix, as they are printed. */
    private static Moran slow(double[] x, double[][] w) {
        int n = x.length;
        double mean = Arrays.stream(x).sum() / n;
        double cross = 0;
        double m2 = 0;
        double m4 = 0;
        double s0 = 0;
        double s1 = 0;
        double s2 = 0;
        for (int i = 0; i < n; i++) {
            double marginal = 0;
            for (int j = 0; j < n; j++) {
                cross += w[i][j] * (x[i] - mean) * (x[j] - mean);
                s0 += w[i][j];
                s1 += (w[i][j] + w[j][i]) * (w[i][j] + w[j][i]) / 2;
                marginal += w[i][j] + w[j][i];
            }
            s2 += marginal * marginal;
            m2 += Math.pow(x[i] - mean, 2) / n;
            m4 += Math.pow(x[i] - mean, 4) / n;
        }
        double index = cross / s0 / m2;
        double e = -1.0 / (n - 1);
        double b2 = m4 / (m2 * m2);
        double normality = (n * n * s1 - n * s2 + 3 * s0 * s0) / ((n - 1.0) * (n + 1.0) * s0 * s0) - e * e;
        double randomisation = (n * ((n * n - 3 * n + 3) * s1 - n * s2 + 3 * s0 * s0)
                                - b2 * ((n * n - n) * s1 - 2 * n * s2 + 6 * s0 * s0))
                        / ((n - 1.0) * (n - 2.0) * (n - 3.0) * s0 * s0)
                - e * e;
        return new Moran(n, index, e, normality, randomisation, (index - e) / Math.sqrt(randomisation));
    }
}
