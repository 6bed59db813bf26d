package org.seamwatch.processors.spatial;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class MeasuresTest {

    /** Absolute: values are of the order of one to ten thousand, computed twice in double precision. */
    private static final double ROUNDING = 1e-9;

    @Test
    void shouldFindMeasuresByName() {
        assertThat(Measures.names()).containsExactly("count", "rate", "eb-rate", "share-residual");
        for (String name : Measures.names()) {
            assertThat(Measures.named(name).name()).isEqualTo(name);
        }
        assertThat(Measures.named("share-residual")).isInstanceOf(ShareResidualMeasure.class);
        assertThatThrownBy(() -> Measures.named("ratio"))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("measure must be one of count, rate, eb-rate, share-residual, was ratio");
    }

    @Test
    void shouldNeedPopulationsForRates() {
        MeasureInput input = new MeasureInput(new double[] {1, 2}, null, new double[] {0, 0});
        for (String name : new String[] {"rate", "eb-rate"}) {
            assertThat(Measures.named(name).needsPopulation()).isTrue();
            assertThatThrownBy(() -> Measures.named(name).values(input))
                    .isInstanceOf(IllegalArgumentException.class)
                    .hasMessage("measure " + name + " needs populations");
        }
        for (String name : new String[] {"count", "share-residual"}) {
            assertThat(Measures.named(name).needsPopulation()).isFalse();
            assertThat(Measures.named(name).values(input)).hasSize(2);
        }
    }

    @Test
    void shouldEqualHandExample() {
        MeasureInput input = new MeasureInput(new double[] {3, 1}, new double[] {1000, 3000}, new double[] {6, 2});
        assertThat(new CountMeasure().values(input)).containsExactly(3, 1);
        assertThat(new RateMeasure().values(input)).containsExactly(new double[] {0.003, 1 / 3000.0}, within(ROUNDING));
        // E = 4 (6 + 2/4) / 10 and 4 (2 + 6/4) / 10.
        assertThat(Shares.expected(4, input.history(), input.population()))
                .containsExactly(new double[] {2.6, 1.4}, within(ROUNDING));
        assertThat(new ShareResidualMeasure().values(input))
                .containsExactly(
                        new double[] {
                            2 * (Math.sqrt(3.375) - Math.sqrt(2.975)), 2 * (Math.sqrt(1.375) - Math.sqrt(1.775))
                        },
                        within(ROUNDING));
        // b = 0.001, s2 = (1000 * 0.002^2 + 3000 / 1500^2) / 4000 = 4/3 e-6, a = s2 - 0.001 / 2000.
        double a = 4e-6 / 3 - 0.5e-6;
        assertThat(new EbRateMeasure().values(input))
                .containsExactly(
                        new double[] {0.002 / Math.sqrt(a + 1e-6), (1 / 3000.0 - 0.001) / Math.sqrt(a + 0.001 / 3000)},
                        within(ROUNDING));
    }

    @Test
    void shouldShareEquallyWithoutPopulations() {
        assertThat(Shares.expected(10, new double[] {6, 2}, null))
                .containsExactly(new double[] {7, 3}, within(ROUNDING));
        assertThat(Shares.expected(10, new double[] {6, 2}, new double[] {500, 500}))
                .containsExactly(new double[] {7, 3}, within(ROUNDING));
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3})
    void shouldExpectTheTotalAltogetherAndSomethingEverywhere(long seed) {
        RandomInput input = new RandomInput(seed);
        double[] expected = Shares.expected(412, input.counts(64, 3), input.populations(64));
        assertThat(Shares.sum(expected)).isCloseTo(412, within(ROUNDING));
        assertThat(Arrays.stream(expected).min().orElseThrow()).isPositive();
    }

    @ParameterizedTest
    @ValueSource(longs = {4, 5, 6})
    void shouldAgreeWithFormulasWrittenOut(long seed) {
        RandomInput random = new RandomInput(seed);
        double[] y = random.counts(50, 12);
        double[] n = random.populations(50);
        double[] s = random.counts(50, 200);
        double total = Arrays.stream(y).sum();
        double people = Arrays.stream(n).sum();
        double b = total / people;
        double s2 = 0;
        for (int i = 0; i < 50; i++) {
            s2 += n[i] / people * Math.pow(y[i] / n[i] - b, 2);
        }
        double a = Math.max(0, s2 - b / (people / 50));
        double[] bayes = new double[50];
        double[] residual = new double[50];
        for (int i = 0; i < 50; i++) {
            bayes[i] = (y[i] / n[i] - b) / Math.sqrt(a + b / n[i]);
            double expected =
                    total * (s[i] + 50 * n[i] / people) / (Arrays.stream(s).sum() + 50);
            residual[i] = 2 * (Math.sqrt(y[i] + 0.375) - Math.sqrt(expected + 0.375));
        }
        MeasureInput input = new MeasureInput(y, n, s);
        assertThat(new EbRateMeasure().values(input)).containsExactly(bayes, within(ROUNDING));
        assertThat(new ShareResidualMeasure().values(input)).containsExactly(residual, within(ROUNDING));
    }

    static Measure[] measures() {
        return Measures.names().stream().map(Measures::named).toArray(Measure[]::new);
    }

    @ParameterizedTest
    @MethodSource("measures")
    void shouldNotDependOnTheOrderOfRegions(Measure measure) {
        RandomInput random = new RandomInput(7);
        double[] cases = random.counts(40, 9);
        double[] population = random.populations(40);
        double[] history = random.counts(40, 90);
        double[] values = measure.values(new MeasureInput(cases, population, history));
        double[] turned = measure.values(new MeasureInput(reversed(cases), reversed(population), reversed(history)));
        assertThat(turned).containsExactly(reversed(values), within(ROUNDING));
    }

    /** Only ratios of populations count, but for the rate itself. */
    @ParameterizedTest
    @ValueSource(strings = {"eb-rate", "share-residual"})
    void shouldNotDependOnTheUnitOfPopulation(String name) {
        RandomInput random = new RandomInput(8);
        double[] cases = random.counts(40, 9);
        double[] population = random.populations(40);
        double[] thousands = Arrays.stream(population).map(p -> p / 1000).toArray();
        double[] history = random.counts(40, 90);
        Measure measure = Measures.named(name);
        assertThat(measure.values(new MeasureInput(cases, thousands, history)))
                .containsExactly(measure.values(new MeasureInput(cases, population, history)), within(ROUNDING));
    }

    @ParameterizedTest
    @MethodSource("measures")
    void shouldBeFlatWithoutCases(Measure measure) {
        RandomInput random = new RandomInput(9);
        double[] values =
                measure.values(new MeasureInput(new double[20], random.populations(20), random.counts(20, 30)));
        assertThat(values).containsOnly(0);
    }

    @ParameterizedTest
    @MethodSource("measures")
    void shouldTakeNoRegions(Measure measure) {
        assertThat(measure.values(new MeasureInput(new double[0], new double[0], new double[0])))
                .isEmpty();
    }

    @ParameterizedTest
    @MethodSource("measures")
    void shouldNotChangeItsInput(Measure measure) {
        double[] cases = {3, 1, 7};
        double[] population = {10, 20, 30};
        double[] history = {5, 0, 2};
        measure.values(new MeasureInput(cases, population, history))[0] = 99;
        assertThat(cases).containsExactly(3, 1, 7);
        assertThat(population).containsExactly(10, 20, 30);
        assertThat(history).containsExactly(5, 0, 2);
    }

    @Test
    void shouldSayWhatIsWrongWithInput() {
        double[] two = {1, 2};
        assertThatThrownBy(() -> new MeasureInput(two, null, new double[3]))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("history must be one for each of 2 regions, were 3");
        assertThatThrownBy(() -> new MeasureInput(two, new double[1], two))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("population must be one for each of 2 regions, were 1");
        assertThatThrownBy(() -> new MeasureInput(new double[] {1, -1}, null, two))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("cases of region 1 must be finite and at least 0, was -1.0");
        assertThatThrownBy(() -> new MeasureInput(two, null, new double[] {Double.NaN, 1}))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("history of region 0 must be finite and at least 0, was NaN");
        assertThatThrownBy(() -> new MeasureInput(two, new double[] {5, 0}, two))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("population of region 1 must be finite and above 0, was 0.0");
    }

    private static double[] reversed(double[] x) {
        double[] result = new double[x.length];
        Arrays.setAll(result, i -> x[x.length - 1 - i]);
        return result;
    }
}
