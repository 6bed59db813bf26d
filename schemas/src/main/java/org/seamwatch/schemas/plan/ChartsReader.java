package org.seamwatch.schemas.plan;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/** Reads {@code charts}: for each statistic a list of charts; a statistic without one has its default. */
final class ChartsReader {

    private static final List<String> CHARTS = List.of("individuals", "ewma");
    private static final double DEFAULT_WEIGHT = 0.2;

    private ChartsReader() {}

    static Map<StatisticName, List<ChartPlan>> read(@Nullable YamlValue value, List<StatisticName> statistics) {
        Map<StatisticName, List<ChartPlan>> charts = new EnumMap<>(StatisticName.class);
        List<String> words = statistics.stream().map(StatisticName::word).toList();
        YamlMap map = value == null ? null : value.map().only(words);
        for (StatisticName statistic : statistics) {
            YamlValue given = map == null ? null : map.get(statistic.word());
            charts.put(statistic, given == null ? statistic.defaultCharts() : charts(given, statistic));
        }
        return charts;
    }

    private static List<ChartPlan> charts(YamlValue value, StatisticName statistic) {
        List<ChartPlan> charts = new ArrayList<>();
        for (YamlValue item : value.filledList()) {
            ChartPlan chart = chart(item, statistic.defaultCharts().get(0));
            for (ChartPlan earlier : charts) {
                if (earlier.name().equals(chart.name())) {
                    throw item.rule("must be another chart, is \"" + chart.name() + "\" again");
                }
                if (earlier.order() != chart.order()) {
                    throw item.rule("must have the order of the other charts of " + statistic.word() + ", "
                            + earlier.order() + ", was " + chart.order());
                }
            }
            charts.add(chart);
        }
        return charts;
    }

    private static ChartPlan chart(YamlValue item, ChartPlan defaults) {
        YamlMap map = item.map().only(CHARTS);
        if (map.keys().size() != 1) {
            throw item.rule("must name one chart, names " + map.keys().size());
        }
        if (map.keys().containsKey("individuals")) {
            YamlMap chart = map.map("individuals", List.of("order", "sides"));
            return new ChartPlan.Individuals(order(chart, defaults), sides(chart, defaults));
        }
        YamlMap chart = map.map("ewma", List.of("weight", "order", "sides"));
        return new ChartPlan.Ewma(weight(chart.get("weight")), order(chart, defaults), sides(chart, defaults));
    }

    private static int order(YamlMap chart, ChartPlan defaults) {
        return chart.integer("order", 0, 3, defaults.order());
    }

    private static Sides sides(YamlMap chart, ChartPlan defaults) {
        return SeriesPlanReader.choice(chart.get("sides"), "sides", Sides.values(), Sides::word, defaults.sides());
    }

    private static double weight(@Nullable YamlValue value) {
        if (value == null) {
            return DEFAULT_WEIGHT;
        }
        double weight = value.decimal();
        if (!(weight > 0 && weight <= 1)) {
            throw value.rule("must be in (0, 1], was " + value.text());
        }
        return weight;
    }
}
