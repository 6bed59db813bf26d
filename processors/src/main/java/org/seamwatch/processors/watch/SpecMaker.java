package org.seamwatch.processors.watch;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.seamwatch.processors.charts.Chart;
import org.seamwatch.processors.charts.EwmaChart;
import org.seamwatch.processors.charts.IndividualsChart;
import org.seamwatch.processors.learning.Learner;
import org.seamwatch.processors.spatial.Measures;
import org.seamwatch.processors.statistics.Board;
import org.seamwatch.processors.statistics.DayInput;
import org.seamwatch.processors.statistics.MoranStatistic;
import org.seamwatch.processors.statistics.Statistic;
import org.seamwatch.schemas.InputException;
import org.seamwatch.schemas.geography.Geography;
import org.seamwatch.schemas.plan.ChartPlan;
import org.seamwatch.schemas.plan.ContiguityRule;
import org.seamwatch.schemas.plan.Plan;
import org.seamwatch.schemas.plan.SeriesPlan;
import org.seamwatch.schemas.plan.StatisticName;
import org.seamwatch.schemas.plan.WeightStyle;

/** Makes the series of a plan ready. */
final class SpecMaker {

    /** Days beyond the time of revision for which the ledger knows reports, and some for days not closed yet. */
    private static final int LEDGER_DAYS = 30 + 5;

    private final Plan plan;
    private final Map<String, Geography> geographies = new HashMap<>();
    private final Map<GroundKey, Ground> grounds = new HashMap<>();

    private record GroundKey(String geography, ContiguityRule rule, WeightStyle style) {}

    SpecMaker(Plan plan, List<Geography> geographies) {
        this.plan = plan;
        geographies.forEach(g -> this.geographies.put(g.id(), g));
    }

    List<SeriesSpec> specs() {
        List<SeriesSpec> specs = new ArrayList<>();
        for (SeriesPlan each : plan.series()) {
            Geography geography = geographies.get(each.geography());
            if (geography == null) {
                throw new IllegalArgumentException(
                        "geography of a series must be one of those given, was " + each.geography());
            }
            for (String condition : each.conditions()) {
                specs.add(spec(each, geography, condition));
            }
        }
        return specs;
    }

    private SeriesSpec spec(SeriesPlan each, Geography geography, String condition) {
        String id = geography.id() + "/" + condition;
        Ground ground = grounds.computeIfAbsent(
                new GroundKey(geography.id(), each.contiguity(), each.weights()),
                key -> Ground.of(geography, key.rule(), key.style()));
        Budget budget = Budget.of(plan, each);
        List<Statistic> statistics = new ArrayList<>();
        for (StatisticName name : each.statistics()) {
            statistics.add(statistic(name, id, each, ground, budget));
        }
        return new SeriesSpec(
                id,
                condition,
                each,
                geography,
                ground,
                budget,
                statistics,
                keepDays(each),
                PlanHash.of(each, geography));
    }

    private int keepDays(SeriesPlan each) {
        int longest = 0;
        for (SeriesPlan other : plan.series()) {
            longest = Math.max(longest, other.reviseForDays());
        }
        int read = each.reviseForDays() + DayInput.HISTORY_FROM + each.windowDays() + 7;
        return Math.max(longest + LEDGER_DAYS, read);
    }

    private Statistic statistic(StatisticName name, String series, SeriesPlan each, Ground ground, Budget budget) {
        List<ChartPlan> plans = each.charts().getOrDefault(name, name.defaultCharts());
        double share = budget.chart(each, name);
        List<Chart> charts =
                plans.stream().map(p -> chart(series, name, p, share)).toList();
        Board board = new Board(Learner.of(plans.get(0).order()), charts, each.warmUpDays());
        return switch (name) {
            case MORAN ->
                new MoranStatistic(
                        series, each, Measures.named(each.measure()), ground.weights(), ground.populations(), board);
        };
    }

    private Chart chart(String series, StatisticName statistic, ChartPlan chart, double falseAlarmsPerYear) {
        try {
            if (chart instanceof ChartPlan.Ewma ewma) {
                return EwmaChart.of(ewma.weight(), ewma.sides(), falseAlarmsPerYear);
            }
            return IndividualsChart.of(chart.sides(), falseAlarmsPerYear);
        } catch (IllegalArgumentException e) {
            throw new InputException(plan.file() + ": series " + series + ": " + chart.name() + " chart of "
                    + statistic.word() + ": " + e.getMessage());
        }
    }
}
