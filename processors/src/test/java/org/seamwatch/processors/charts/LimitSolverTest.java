package org.seamwatch.processors.charts;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.seamwatch.fixtures.reference.ReferenceEntry;
import org.seamwatch.fixtures.reference.ReferenceValues;
import org.seamwatch.schemas.plan.Sides;

class LimitSolverTest {

    /** Relative error of the run length at a solved limit; the solver stops at 1e-12 of the limit. */
    private static final double SOLVED = 1e-8;

    @Test
    void shouldGiveTheCriticalValuesOfCrowder() {
        ReferenceEntry entry = ReferenceValues.entry("ewma", "ewma-crit-crowder89");
        double[] weights = entry.inputs("lambda");
        double[] widths = entry.expecteds("L");
        double target = entry.input().path("ARL0").asDouble();
        assertThat(weights).hasSize(5);
        for (int i = 0; i < weights.length; i++) {
            double limit = LimitSolver.ewmaForRunLength(weights[i], Sides.BOTH, target);
            assertThat(limit / EwmaChart.deviation(weights[i])).isCloseTo(widths[i], within(entry.tolerance()));
        }
    }

    @ParameterizedTest
    @CsvSource({
        "0.2, UPPER, 2.5",
        "0.2, UPPER, 400",
        "0.05, UPPER, 3652.5",
        "1, UPPER, 243.5",
        "0.01, BOTH, 365.25",
        "0.2, BOTH, 1.2",
        "0.2, BOTH, 1e7",
        "0.2, UPPER, 1e7",
        "1, BOTH, 370"
    })
    void shouldReachTheRunLength(double weight, Sides sides, double target) {
        double limit = LimitSolver.ewmaForRunLength(weight, sides, target);
        assertThat(RunLength.ewma(weight, sides, limit, 0)).isCloseTo(target, within(SOLVED * target));
    }

    @Test
    void shouldTurnFalseAlarmsAYearIntoARunLengthOfTheEwma() {
        double limit = LimitSolver.ewma(0.2, Sides.UPPER, 1.5);
        assertThat(RunLength.ewma(0.2, Sides.UPPER, limit, 0)).isCloseTo(365.25 / 1.5, within(SOLVED * 243.5));
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.1, 1, 1.5, 6, 100})
    void shouldTurnFalseAlarmsAYearIntoATailOfTheIndividualsChart(double share) {
        double days = 365.25 / share;
        double upper = LimitSolver.individuals(Sides.UPPER, share);
        assertThat(RunLength.individuals(Sides.UPPER, upper, 0)).isCloseTo(days, within(1e-12 * days));
        double both = LimitSolver.individuals(Sides.BOTH, share);
        assertThat(RunLength.individuals(Sides.BOTH, both, 0)).isCloseTo(days, within(1e-12 * days));
        assertThat(both).isGreaterThan(upper);
    }

    /** The design's own figure: an individuals limit at 1.5 a year of 2.64 without serial dependence, on the upper side. */
    @Test
    void shouldGiveTheKnownIndividualsLimit() {
        assertThat(LimitSolver.individuals(Sides.UPPER, 1.5)).isCloseTo(2.64, within(0.005));
    }

    @Test
    void shouldGiveNarrowerLimitsForMoreFalseAlarms() {
        double last = Double.POSITIVE_INFINITY;
        for (double share : new double[] {0.05, 0.1, 0.5, 1, 3, 12, 50}) {
            double limit = LimitSolver.ewma(0.2, Sides.UPPER, share);
            assertThat(limit).isLessThan(last);
            last = limit;
        }
    }

    @ParameterizedTest
    @CsvSource({
        "UPPER, 2, 2.0",
        "UPPER, 1e8, 2.0",
        "BOTH, 1, 1.0",
        "BOTH, NaN, 1.0",
        "BOTH, -5, 1.0",
        "BOTH, Infinity, 1.0"
    })
    void shouldRefuseARunLengthNoLimitHas(Sides sides, double target, String shortest) {
        assertThatThrownBy(() -> LimitSolver.ewmaForRunLength(0.2, sides, target))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("mean run length of an ewma chart must be above " + shortest
                        + " and at most 1.0E7 days, was " + target);
    }

    @ParameterizedTest
    @CsvSource({"UPPER, 0, 182.625", "UPPER, 182.625, 182.625", "BOTH, 366, 365.25", "BOTH, NaN, 365.25"})
    void shouldRefuseFalseAlarmsNoIndividualsLimitHas(Sides sides, double share, String most) {
        assertThatThrownBy(() -> LimitSolver.individuals(sides, share))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("false alarms a year of an individuals chart must be above 0 and below " + most + ", were "
                        + share);
    }

    @ParameterizedTest
    @CsvSource({"UPPER, 0, 182.625", "UPPER, 200, 182.625", "BOTH, -1, 365.25"})
    void shouldRefuseFalseAlarmsNoEwmaLimitHas(Sides sides, double share, String most) {
        assertThatThrownBy(() -> LimitSolver.ewma(0.2, sides, share))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("false alarms a year of an ewma chart must be at least 3.6525E-5 and below " + most
                        + ", were " + share);
    }
}
