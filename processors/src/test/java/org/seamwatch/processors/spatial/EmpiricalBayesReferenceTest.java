package org.seamwatch.processors.spatial;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.seamwatch.fixtures.reference.ReferenceEntry;

/** The {@code ebmoran} entries of {@code reference-values/local-moran-getis-eb.json} (Assunção and Reis 1999). */
class EmpiricalBayesReferenceTest {

    static Stream<ReferenceEntry> entries() {
        return Reference.entries("local-moran-getis-eb", entry -> entry.id().startsWith("ebmoran"));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("entries")
    void shouldEqualReferencePrior(ReferenceEntry entry) {
        EmpiricalBayes prior = EmpiricalBayes.of(entry.inputs("cases"), entry.inputs("population"));
        assertThat(prior.b()).as(entry.source()).isCloseTo(entry.expected("b"), within(entry.tolerance()));
        assertThat(prior.s2()).isCloseTo(entry.expected("s2"), Reference.relative(entry.expected("s2")));
        double a = entry.expected("a_before_truncation");
        assertThat(prior.a()).isCloseTo(a, Reference.relative(a));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("entries")
    void shouldEqualReferenceValuesAndIndex(ReferenceEntry entry) {
        double[] z = new EbRateMeasure().values(input(entry));
        assertThat(z).as(entry.source()).containsExactly(entry.expecteds("z"), within(entry.tolerance()));
        assertThat(index(z, entry)).isCloseTo(entry.expected("EBI_mean_subtracted"), within(entry.tolerance()));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("entries")
    void shouldEqualReferenceWithPublishedRule(ReferenceEntry entry) {
        double[] z = EbRateMeasure.withPublishedRule().values(input(entry));
        assertThat(z)
                .as(entry.source())
                .containsExactly(entry.expecteds("z_alternative_rule"), within(entry.tolerance()));
        double expected = entry.expected("EBI_alternative_rule_mean_subtracted");
        assertThat(index(z, entry)).isCloseTo(expected, within(entry.tolerance()));
    }

    /** The paper leaves the mean of z, which is near zero, in the cross product. */
    @ParameterizedTest(name = "{0}")
    @MethodSource("entries")
    void shouldEqualPrintedFormWithoutSubtractingTheMean(ReferenceEntry entry) {
        Weights weights = Reference.weights(entry);
        double[] z = new EbRateMeasure().values(input(entry));
        double cross = 0;
        for (int i = 0; i < z.length; i++) {
            cross += z[i] * weights.lag(z, i);
        }
        double index = z.length / weights.s0() * cross / Centred.of(z).sumOfSquares();
        double expected = entry.expected("EBI_as_printed_in_paper_no_mean_subtraction");
        assertThat(index).as(entry.source()).isCloseTo(expected, within(entry.tolerance()));
    }

    @Test
    void shouldFindAllEntries() {
        assertThat(entries()).hasSize(3);
    }

    /** These entries count all regions, those without neighbours included. */
    private static double index(double[] z, ReferenceEntry entry) {
        return GlobalMoran.keepingIsolated(z, Reference.weights(entry), z.length)
                .orElseThrow()
                .i();
    }

    private static MeasureInput input(ReferenceEntry entry) {
        double[] cases = entry.inputs("cases");
        return new MeasureInput(cases, entry.inputs("population"), new double[cases.length]);
    }
}
