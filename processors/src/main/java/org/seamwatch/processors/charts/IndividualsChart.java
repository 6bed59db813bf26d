package org.seamwatch.processors.charts;

import org.seamwatch.schemas.plan.Sides;
import org.seamwatch.schemas.record.Limits;

/**
 * The individuals chart (Shewhart 1931): each score by itself against its limits. The change is dated to the day itself.
 *
 * @param sides sides with limits
 * @param limit distance of the action limits from zero, in standard deviations
 */
public record IndividualsChart(Sides sides, double limit) implements Chart {

    public IndividualsChart {
        Checks.limit(limit);
    }

    /** The chart that is expected to be this often beyond its action limits in control. */
    public static IndividualsChart of(Sides sides, double falseAlarmsPerYear) {
        return new IndividualsChart(sides, LimitSolver.individuals(sides, falseAlarmsPerYear));
    }

    @Override
    public String name() {
        return "individuals";
    }

    @Override
    public ChartState start() {
        return new ChartState(new double[] {0}, 0);
    }

    @Override
    public ChartState next(ChartState state, double score) {
        return new ChartState(new double[] {Checks.score(score)}, 1);
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
