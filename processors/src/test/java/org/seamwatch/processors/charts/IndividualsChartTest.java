package org.seamwatch.processors.charts;

import static java.util.Objects.requireNonNull;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.seamwatch.fixtures.reference.ReferenceEntry;
import org.seamwatch.fixtures.reference.ReferenceValues;
import org.seamwatch.schemas.plan.Sides;
import org.seamwatch.schemas.record.Grade;
import org.seamwatch.schemas.record.Limits;

class IndividualsChartTest {

    private static final IndividualsChart UPPER = new IndividualsChart(Sides.UPPER, 3);
    private static final IndividualsChart BOTH = new IndividualsChart(Sides.BOTH, 3);

    /**
     * The product has no moving ranges: it learns its spread. With centre and spread from the entry the chart's limits
     * must be the published ones (Montgomery's upper one is printed from rounded figures; the expected one is asserted).
     */
    @ParameterizedTest
    @ValueSource(strings = {"imr-nist-flow", "imr-montgomery-concentration"})
    void shouldGiveThePublishedLimitsAndSignals(String id) {
        ReferenceEntry entry = ReferenceValues.entry("shewhart-individuals", id);
        double centre = entry.expected("center");
        double sigma = entry.expected("sigma_hat_1.128");
        Limits limits = BOTH.action();
        assertThat(centre + sigma * requireNonNull(limits.upper()))
                .isCloseTo(entry.expected("UCL_1.128"), within(entry.tolerance()));
        assertThat(centre + sigma * requireNonNull(limits.lower()))
                .isCloseTo(entry.expected("LCL_1.128"), within(entry.tolerance()));

        double[] values = entry.inputs("values");
        List<Double> signals = new ArrayList<>();
        ChartState state = BOTH.start();
        for (int i = 0; i < values.length; i++) {
            state = BOTH.next(state, (values[i] - centre) / sigma);
            if (BOTH.grade(state) == Grade.ACTION) {
                signals.add(i + 1.0);
            }
        }
        assertThat(values).hasSizeGreaterThan(5);
        assertThat(signals).hasSize(entry.expecteds("out_of_limits_1based_1.128").length);
    }

    @Test
    void shouldChartEachScoreByItself() {
        ChartState state = UPPER.next(UPPER.next(UPPER.start(), 5), -0.5);
        assertThat(UPPER.value(state)).isEqualTo(-0.5);
        assertThat(state.runDays()).isEqualTo(1);
        assertThat(UPPER.value(UPPER.start())).isZero();
        assertThat(UPPER.start().runDays()).isZero();
    }

    @Test
    void shouldGradeAgainstActionAndWarningLimits() {
        assertThat(grade(UPPER, 2)).isEqualTo(Grade.NONE);
        assertThat(grade(UPPER, 2.1)).isEqualTo(Grade.WARNING);
        assertThat(grade(UPPER, 3)).isEqualTo(Grade.WARNING);
        assertThat(grade(UPPER, 3.1)).isEqualTo(Grade.ACTION);
        assertThat(grade(UPPER, -4)).isEqualTo(Grade.NONE);
        assertThat(grade(BOTH, -2.1)).isEqualTo(Grade.WARNING);
        assertThat(grade(BOTH, -3.1)).isEqualTo(Grade.ACTION);
    }

    @Test
    void shouldSetWarningLimitsAtTwoThirdsOfTheActionLimits() {
        assertThat(UPPER.action()).isEqualTo(new Limits(null, 3.0));
        assertThat(UPPER.warning()).isEqualTo(new Limits(null, 2.0));
        assertThat(BOTH.warning()).isEqualTo(new Limits(-2.0, 2.0));
    }

    @Test
    void shouldTakeItsLimitFromFalseAlarmsAYear() {
        IndividualsChart chart = IndividualsChart.of(Sides.BOTH, 365.25 * 0.00269979606326019);
        assertThat(chart.name()).isEqualTo("individuals");
        assertThat(chart.limit()).isCloseTo(3, within(1e-12));
    }

    @Test
    void shouldRefuseWhatIsOutOfRange() {
        assertThatThrownBy(() -> UPPER.next(UPPER.start(), Double.POSITIVE_INFINITY))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("score must be finite, was Infinity");
        assertThatThrownBy(() -> new IndividualsChart(Sides.BOTH, Double.NaN))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("limit must be finite and above 0, was NaN");
    }

    private static Grade grade(Chart chart, double score) {
        return chart.grade(chart.next(chart.start(), score));
    }
}
