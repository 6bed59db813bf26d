package org.seamwatch.processors.spatial;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.seamwatch.processors.spatial.Reference.relative;

import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.seamwatch.fixtures.reference.ReferenceEntry;
import org.seamwatch.fixtures.reference.ReferenceValues;

/**
 * The entries of {@code reference-values/moran-global.json}, each with its source: Cliff and Ord (1969, 1981), Anselin
 * (1988, 1995), Cressie (1991), Davison and Hinkley (1997), and hand examples.
 */
class GlobalMoranReferenceTest {

    private static final String FAMILY = "moran-global";

    /** Monte Carlo permutations against an exact p, and how many standard errors of that p are allowed. */
    private static final int PERMUTATIONS = 200_000;

    private static final double STANDARD_ERRORS = 4;

    static Stream<ReferenceEntry> indices() {
        return Reference.entries(FAMILY, entry -> entry.expected().has("E_I"));
    }

    static Stream<ReferenceEntry> enumerations() {
        return Reference.entries(FAMILY, entry -> entry.id().startsWith("moran-exactperm"));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("indices")
    void shouldEqualReference(ReferenceEntry entry) {
        Weights weights = Reference.weights(entry);
        double[] values = entry.inputs("values");
        Moran moran = weights.isolatedCount() > 0
                ? GlobalMoran.keepingIsolated(values, weights, (int) entry.expected("n_used"))
                        .orElseThrow()
                : GlobalMoran.of(values, weights).orElseThrow();

        assertThat(moran.i()).as(entry.source()).isCloseTo(entry.expected("I"), relative(entry.expected("I")));
        assertThat(moran.expected()).isCloseTo(entry.expected("E_I"), relative(entry.expected("E_I")));
        double normality = entry.expected("Var_normality");
        assertThat(moran.varianceNormality()).isCloseTo(normality, relative(normality));
        double randomisation = entry.expected("Var_randomisation");
        assertThat(moran.varianceRandomisation()).isCloseTo(randomisation, relative(randomisation));
        double z = entry.expected("z_randomisation");
        assertThat(moran.z()).isCloseTo(z, relative(z));
        if (entry.expected().has("n_used")) {
            assertThat(moran.regions()).isEqualTo((int) entry.expected("n_used"));
            assertThat(Centred.of(values).kurtosis()).isCloseTo(entry.expected("b2"), relative(entry.expected("b2")));
        }
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("indices")
    void shouldHaveReferenceConstantsOfWeights(ReferenceEntry entry) {
        Weights weights = Reference.weights(entry);
        assertThat(weights.s0()).as(entry.source()).isCloseTo(entry.expected("S0"), relative(entry.expected("S0")));
        assertThat(weights.s1()).isCloseTo(entry.expected("S1"), relative(entry.expected("S1")));
        assertThat(weights.s2()).isCloseTo(entry.expected("S2"), relative(entry.expected("S2")));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("enumerations")
    void shouldEqualExactPermutationDistribution(ReferenceEntry entry) {
        Weights weights = Reference.weights(entry);
        double[] values = entry.inputs("values");
        double observed = GlobalMoran.of(values, weights).orElseThrow().i();
        double[] indices = Permutations.of(values)
                .mapToDouble(v -> GlobalMoran.of(v, weights).orElseThrow().i())
                .toArray();
        double mean = Shares.sum(indices) / indices.length;
        double squares = 0;
        int greater = 0;
        int less = 0;
        for (double i : indices) {
            squares += (i - mean) * (i - mean);
            greater += i >= observed - Reference.NEAR_ZERO ? 1 : 0;
            less += i <= observed + Reference.NEAR_ZERO ? 1 : 0;
        }
        double n = indices.length;
        assertThat(n).as(entry.source()).isEqualTo(entry.expected("n_permutations"));
        assertThat(observed).isCloseTo(entry.expected("I"), within(entry.tolerance()));
        assertThat(mean).isCloseTo(entry.expected("mean_over_permutations"), within(entry.tolerance()));
        assertThat(squares / n).isCloseTo(entry.expected("variance_over_permutations"), within(entry.tolerance()));
        assertThat(greater / n).isCloseTo(entry.expected("exact_p_greater"), within(entry.tolerance()));
        assertThat(less / n).isCloseTo(entry.expected("exact_p_less"), within(entry.tolerance()));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("enumerations")
    void shouldHaveMomentsOfExactPermutationDistribution(ReferenceEntry entry) {
        Moran moran =
                GlobalMoran.of(entry.inputs("values"), Reference.weights(entry)).orElseThrow();
        assertThat(moran.expected())
                .as(entry.source())
                .isCloseTo(entry.expected("mean_over_permutations"), within(entry.tolerance()));
        assertThat(moran.varianceRandomisation())
                .isCloseTo(entry.expected("variance_over_permutations"), within(entry.tolerance()));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("enumerations")
    void shouldApproachExactPermutationP(ReferenceEntry entry) {
        double exact = entry.expected("exact_p_greater");
        double p = PermutationTest.upper(entry.inputs("values"), Reference.weights(entry), PERMUTATIONS, 20_240_203L);
        double standardError = Math.sqrt(exact * (1 - exact) / PERMUTATIONS);
        assertThat(p).as(entry.source()).isCloseTo(exact, within(STANDARD_ERRORS * standardError));
    }

    @Test
    void shouldGivePseudoPOfReference() {
        ReferenceEntry entry = ReferenceValues.entry(FAMILY, "moran-mc-pseudo-p");
        double[] permutations = entry.inputs("M");
        double[] reaching = entry.inputs("R");
        double[] expected = entry.expecteds("p");
        assertThat(permutations).hasSize(4);
        for (int k = 0; k < permutations.length; k++) {
            assertThat(PermutationTest.pseudoP((int) reaching[k], (int) permutations[k]))
                    .as(entry.source())
                    .isCloseTo(expected[k], within(entry.tolerance()));
        }
    }

    @Test
    void shouldCoverEveryEntryOfTheFamily() {
        assertThat(indices().count() + enumerations().count() + 1)
                .isEqualTo(ReferenceValues.all(FAMILY).size())
                .isEqualTo(24);
    }
}
