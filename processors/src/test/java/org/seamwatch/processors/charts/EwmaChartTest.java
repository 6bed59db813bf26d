package org.seamwatch.processors.charts;

import static java.util.Objects.requireNonNull;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.seamwatch.fixtures.reference.ReferenceEntry;
import org.seamwatch.fixtures.reference.ReferenceValues;
import org.seamwatch.schemas.plan.Sides;
import org.seamwatch.schemas.record.Grade;
import org.seamwatch.schemas.record.Limits;

class EwmaChartTest {

    private static final EwmaChart UPPER = new EwmaChart(0.5, Sides.UPPER, 1.5);
    private static final EwmaChart BOTH = new EwmaChart(0.5, Sides.BOTH, 1.5);

    @ParameterizedTest
    @ValueSource(strings = {"ewma-nist", "ewma-montgomery"})
    void shouldGiveThePublishedAverages(String id) {
        ReferenceEntry entry = ReferenceValues.entry("ewma", id);
        double target = entry.input().path("target").asDouble();
        double sigma = entry.input().path("sigma").asDouble();
        EwmaChart chart = published(entry);
        double[] values = entry.inputs("values");
        double[] z = entry.expecteds("z");
        ChartState state = chart.start();
        for (int i = 0; i < values.length; i++) {
            state = chart.next(state, (values[i] - target) / sigma);
            assertThat(target + sigma * chart.value(state)).isCloseTo(z[i], within(entry.tolerance()));
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"ewma-nist", "ewma-montgomery"})
    void shouldGiveThePublishedFixedLimitsAndSignals(String id) {
        ReferenceEntry entry = ReferenceValues.entry("ewma", id);
        double target = entry.input().path("target").asDouble();
        double sigma = entry.input().path("sigma").asDouble();
        EwmaChart chart = published(entry);
        Limits limits = chart.action();
        assertThat(target + sigma * requireNonNull(limits.upper()))
                .isCloseTo(entry.expected("UCL_asymptotic"), within(entry.tolerance()));
        assertThat(target + sigma * requireNonNull(limits.lower()))
                .isCloseTo(entry.expected("LCL_asymptotic"), within(entry.tolerance()));

        double[] values = entry.inputs("values");
        List<Double> signals = new ArrayList<>();
        ChartState state = chart.start();
        for (int i = 0; i < values.length; i++) {
            state = chart.next(state, (values[i] - target) / sigma);
            if (chart.grade(state) == Grade.ACTION) {
                signals.add(i + 1.0);
            }
        }
        assertThat(signals).containsExactly(boxed(entry.expecteds("signals_asymptotic_1based")));
    }

    private static Double[] boxed(double[] values) {
        return Arrays.stream(values).boxed().toArray(Double[]::new);
    }

    private static EwmaChart published(ReferenceEntry entry) {
        double weight = entry.input().path("lambda").asDouble();
        double width = entry.input().path("L").asDouble();
        return new EwmaChart(weight, Sides.BOTH, width * EwmaChart.deviation(weight));
    }

    @Test
    void shouldReflectAtTheCentreWithAnUpperSideOnly() {
        ChartState state = run(UPPER, -3, -2);
        assertThat(UPPER.value(state)).isZero();
        assertThat(UPPER.value(UPPER.next(state, 1))).isEqualTo(0.5);
        assertThat(BOTH.value(run(BOTH, -3, -2, 1))).isEqualTo(-0.375);
    }

    @Test
    void shouldCountTheDaysSinceItLastStoodAtTheCentre() {
        assertThat(UPPER.start().runDays()).isZero();
        assertThat(run(UPPER, -1, -1).runDays()).isZero();
        assertThat(run(UPPER, -1, -1, 2).runDays()).isEqualTo(1);
        assertThat(run(UPPER, -1, -1, 2, -0.5, 2).runDays()).isEqualTo(3);
        assertThat(run(UPPER, 2, 2, -9, 2).runDays()).isEqualTo(1);
    }

    @Test
    void shouldBeginANewRunWhereATwoSidedAverageChangesItsSide() {
        assertThat(run(BOTH, -1, -1).runDays()).isEqualTo(2);
        assertThat(run(BOTH, -1, -1, 2).runDays()).isEqualTo(1);
        assertThat(run(BOTH, -1, -1, 2, 2).runDays()).isEqualTo(2);
        assertThat(run(BOTH, 1, -0.5).runDays()).isZero();
    }

    @Test
    void shouldGradeAgainstActionAndWarningLimits() {
        assertThat(UPPER.grade(run(UPPER, 2))).isEqualTo(Grade.NONE);
        assertThat(UPPER.grade(run(UPPER, 2.5))).isEqualTo(Grade.WARNING);
        assertThat(UPPER.grade(run(UPPER, 3))).isEqualTo(Grade.WARNING);
        assertThat(UPPER.grade(run(UPPER, 3.5))).isEqualTo(Grade.ACTION);
        assertThat(UPPER.grade(run(UPPER, -9))).isEqualTo(Grade.NONE);
        assertThat(BOTH.grade(run(BOTH, -2.5))).isEqualTo(Grade.WARNING);
        assertThat(BOTH.grade(run(BOTH, -3.5))).isEqualTo(Grade.ACTION);
    }

    @Test
    void shouldSetWarningLimitsAtTwoThirdsOfTheActionLimits() {
        assertThat(UPPER.action()).isEqualTo(new Limits(null, 1.5));
        assertThat(UPPER.warning()).isEqualTo(new Limits(null, 1.0));
        assertThat(BOTH.warning()).isEqualTo(new Limits(-1.0, 1.0));
    }

    @Test
    void shouldTakeItsLimitFromFalseAlarmsAYear() {
        EwmaChart chart = EwmaChart.of(0.2, Sides.UPPER, 1.5);
        assertThat(chart.name()).isEqualTo("ewma");
        assertThat(chart.limit()).isEqualTo(LimitSolver.ewma(0.2, Sides.UPPER, 1.5));
    }

    @Test
    void shouldRefuseWhatIsOutOfRange() {
        assertThatThrownBy(() -> UPPER.next(UPPER.start(), Double.NaN))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("score must be finite, was NaN");
        assertThatThrownBy(() -> new EwmaChart(0, Sides.BOTH, 1))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("weight must be in [0.01, 1], was 0.0");
        assertThatThrownBy(() -> new EwmaChart(0.2, Sides.BOTH, -1))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("limit must be finite and above 0, was -1.0");
    }

    private static ChartState run(Chart chart, double... scores) {
        ChartState state = chart.start();
        for (double score : scores) {
            state = chart.next(state, score);
        }
        return state;
    }
}
