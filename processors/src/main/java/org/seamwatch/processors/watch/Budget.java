package org.seamwatch.processors.watch;

import java.util.List;
import org.seamwatch.schemas.plan.ChartPlan;
import org.seamwatch.schemas.plan.Plan;
import org.seamwatch.schemas.plan.SeriesPlan;
import org.seamwatch.schemas.plan.StatisticName;

/**
 * How many false alarms a year are intended: the desk's, split over the series by their shares, then equally over a
 * series' statistics and a statistic's charts. By sum: the alarms of all charts together come to about the desk's.
 *
 * @param desk of the whole desk
 * @param series of one series
 */
public record Budget(double desk, double series) {

    static Budget of(Plan plan, SeriesPlan series) {
        double shares = 0;
        for (SeriesPlan each : plan.series()) {
            shares += each.share() * each.conditions().size();
        }
        return new Budget(plan.deskFalseAlarmsPerYear(), plan.deskFalseAlarmsPerYear() * series.share() / shares);
    }

    /** Of each chart of a statistic. */
    public double chart(SeriesPlan plan, StatisticName statistic) {
        List<ChartPlan> charts = plan.charts().getOrDefault(statistic, List.of());
        return series / plan.statistics().size() / charts.size();
    }
}
