package org.seamwatch.processors.charts;

import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.seamwatch.processors.distributions.NormalScore;
import org.seamwatch.schemas.plan.Sides;

/** Action limits from an intended number of false alarms a year, solved and not looked up. */
public final class LimitSolver {

    /** Days in a year. */
    public static final double YEAR = 365.25;

    /** Nobody can verify a longer run length; the integral equation loses digits with it. */
    private static final double LONGEST_RUN = 1e7;

    private static final int MAX_STEPS = 200;
    private static final double PRECISION = 1e-12;

    private LimitSolver() {}

    /**
     * Limit of an individuals chart: the probability to be beyond it on a usable day in control is falseAlarmsPerYear /
     * 365.25, on the upper side, or half of it on each.
     *
     * @return limit in standard deviations
     * @throws IllegalArgumentException when no limit above zero has that probability
     */
    public static double individuals(Sides sides, double falseAlarmsPerYear) {
        double most = YEAR / shortest(sides);
        if (!(falseAlarmsPerYear > 0 && falseAlarmsPerYear < most)) {
            throw new IllegalArgumentException("false alarms a year of an individuals chart must be above 0 and below "
                    + most + ", were " + falseAlarmsPerYear);
        }
        return NormalScore.upperQuantile(falseAlarmsPerYear / YEAR * shortest(sides) / 2);
    }

    /**
     * Limit of an EWMA chart whose mean run length in control is 365.25 / falseAlarmsPerYear usable days.
     *
     * @return limit in the unit of the average
     * @throws IllegalArgumentException when no limit has that run length
     */
    public static double ewma(double weight, Sides sides, double falseAlarmsPerYear) {
        double least = YEAR / LONGEST_RUN;
        double most = YEAR / shortest(sides);
        if (!(falseAlarmsPerYear >= least && falseAlarmsPerYear < most)) {
            throw new IllegalArgumentException("false alarms a year of an ewma chart must be at least " + least
                    + " and below " + most + ", were " + falseAlarmsPerYear);
        }
        return ewmaForRunLength(weight, sides, YEAR / falseAlarmsPerYear);
    }

    /**
     * Limit of an EWMA chart for a mean run length in control.
     *
     * @param runLength usable days; above 1 for both sides, above 2 for the upper side, whose average rises above zero on
     *     every other day; at most 1e7
     * @return limit in the unit of the average
     * @throws IllegalArgumentException when the run length is out of range
     */
    public static double ewmaForRunLength(double weight, Sides sides, double runLength) {
        Checks.weight(weight);
        double shortest = shortest(sides);
        if (!(runLength > shortest && runLength <= LONGEST_RUN)) {
            throw new IllegalArgumentException("mean run length of an ewma chart must be above " + shortest
                    + " and at most " + LONGEST_RUN + " days, was " + runLength);
        }
        double high = EwmaChart.deviation(weight);
        while (RunLength.ewma(weight, sides, high, 0) < runLength) {
            high *= 1.25;
        }
        double target = StrictMath.log(runLength);
        return new BrentSolver(PRECISION, PRECISION)
                .solve(MAX_STEPS, limit -> StrictMath.log(meanRun(weight, sides, limit)) - target, 0, high);
    }

    private static double meanRun(double weight, Sides sides, double limit) {
        return limit == 0 ? shortest(sides) : RunLength.ewma(weight, sides, limit, 0);
    }

    /** Mean run length with limits at zero: every value is beyond two of them, every other beyond the upper one. */
    private static double shortest(Sides sides) {
        return sides == Sides.UPPER ? 2 : 1;
    }
}
