package org.seamwatch.processors.charts;

import org.seamwatch.schemas.plan.Sides;
import org.seamwatch.schemas.record.Limits;

/**
 * The exponentially weighted moving average of the scores (Roberts 1959, Technometrics 1:239-250) with fixed limits, z =
 * (1 - w) z + w q from z = 0. With an upper side only the average is reflected at the centre, z = max(0, (1 - w) z + w
 * q), so that a quiet spell does not have to be made up for before a rise is seen.
 *
 * <p>The run of days begins after the last day at the centre (one side), or with the last day on which the average
 * changed its side (both).
 *
 * @param weight weight w of the newest score, in [0.01, 1]
 * @param sides sides with limits
 * @param limit distance of the action limits from zero, in the unit of z
 */
public record EwmaChart(double weight, Sides sides, double limit) implements Chart {

    public EwmaChart {
        Checks.weight(weight);
        Checks.limit(limit);
    }

    /** The chart whose mean time to a false alarm, from a start at zero, is a year divided by this number. */
    public static EwmaChart of(double weight, Sides sides, double falseAlarmsPerYear) {
        return new EwmaChart(weight, sides, LimitSolver.ewma(weight, sides, falseAlarmsPerYear));
    }

    /** Standard deviation of the unreflected average of independent scores in the long run, sqrt(w / (2 - w)). */
    public static double deviation(double weight) {
        return StrictMath.sqrt(Checks.weight(weight) / (2 - weight));
    }

    @Override
    public String name() {
        return "ewma";
    }

    @Override
    public ChartState start() {
        return new ChartState(new double[] {0}, 0);
    }

    @Override
    public ChartState next(ChartState state, double score) {
        double old = value(state);
        double mean = (1 - weight) * old + weight * Checks.score(score);
        double value = sides == Sides.UPPER ? StrictMath.max(0, mean) : mean;
        return new ChartState(new double[] {value}, runDays(state, old, value));
    }

    private static int runDays(ChartState state, double old, double value) {
        if (value == 0) {
            return 0;
        }
        return old * value < 0 ? 1 : state.runDays() + 1;
    }

    @Override
    public double value(ChartState state) {
        return state.memory()[0];
    }

    @Override
    public Limits action() {
        return SymmetricLimits.at(sides, limit);
    }

    @Override
    public Limits warning() {
        return SymmetricLimits.at(sides, limit * WARNING_PART);
    }
}
