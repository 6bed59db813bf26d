package org.seamwatch.schemas.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.SortedSet;
import java.util.TreeMap;
import java.util.regex.Pattern;

/** Prints every key of a plan with its value, and says which values are defaults. Secrets are not printed. */
public final class PlanPrinter {

    private static final Pattern SECRET = Pattern.compile("password|secret|jaas|credential|token|\\.key|keystore");

    private final SortedSet<String> given;
    private final List<String> lines = new ArrayList<>();

    private PlanPrinter(SortedSet<String> given) {
        this.given = given;
    }

    /** One line a key, such as {@code series[0].closeAfter: 1d (default)}, in the order of the manual. */
    public static List<String> lines(ReadPlan read) {
        PlanPrinter printer = new PlanPrinter(read.given());
        Plan plan = read.plan();
        new TreeMap<>(plan.kafka()).forEach((key, value) -> printer.add("kafka." + key, open(key, value)));
        printer.run(plan.run());
        printer.topics(plan.topics());
        for (int i = 0; i < plan.geographies().size(); i++) {
            printer.geography("geographies[" + i + "].", plan.geographies().get(i));
        }
        printer.add("desk.falseAlarmsPerYear", number(plan.deskFalseAlarmsPerYear()));
        for (int i = 0; i < plan.series().size(); i++) {
            printer.series("series[" + i + "].", plan.series().get(i));
        }
        return List.copyOf(printer.lines);
    }

    private static String open(String key, String value) {
        return SECRET.matcher(key.toLowerCase(Locale.ROOT)).find() ? "(not shown)" : value;
    }

    private void run(RunPlan run) {
        add("run.threads", run.threads());
        add("run.standbys", run.standbys());
    }

    private void topics(TopicsPlan topics) {
        add("topics.prefix", '"' + topics.prefix() + '"');
        add("topics.partitions", topics.partitions());
        add("topics.seriesPartitions", topics.seriesPartitions());
        add("topics.replication", topics.replication());
        add("topics.rejectedRetention", topics.rejectedRetention().toDays() + "d");
    }

    private void geography(String at, GeographyPlan geography) {
        add(at + "file", geography.file());
        add(at + "id", geography.id());
        add(at + "timeZone", geography.timeZone());
        add(at + "regionId", geography.regionId());
        add(at + "regionName", geography.regionName());
        add(
                at + "population",
                geography.population() == null ? "population, where there is one" : geography.population());
        add(at + "populationYear", geography.populationYear() == null ? "not said" : geography.populationYear());
        add(at + "regions", '"' + geography.regions() + '"');
        add(at + "tolerance", number(geography.tolerance()));
    }

    private void series(String at, SeriesPlan series) {
        add(at + "geography", series.geography());
        add(at + "conditions", series.conditions());
        add(at + "from", series.from() == null ? "the log's first day less reviseFor" : series.from());
        add(at + "dayOf", series.dayOf().word());
        add(at + "closeAfter", series.closeAfterDays() + "d");
        add(at + "reviseFor", series.reviseForDays() + "d");
        add(at + "windowDays", series.windowDays());
        add(
                at + "statistics",
                series.statistics().stream().map(StatisticName::word).toList());
        add(at + "measure", series.measure());
        add(at + "permutations", series.permutations());
        add(at + "contiguity", series.contiguity().words());
        add(at + "weights", series.weights().word());
        add(at + "thinBelow", series.thinBelow());
        add(at + "share", number(series.share()));
        add(at + "learning.warmUpDays", series.warmUpDays());
        for (StatisticName statistic : series.statistics()) {
            charts(at + "charts." + statistic.word(), series.charts().getOrDefault(statistic, List.of()));
        }
        add(
                at + "holidays",
                series.holidays().stream().map(PlanPrinter::holiday).toList());
    }

    private void charts(String at, List<ChartPlan> charts) {
        for (int i = 0; i < charts.size(); i++) {
            ChartPlan chart = charts.get(i);
            String path = at + "[" + i + "]." + chart.name() + ".";
            if (chart instanceof ChartPlan.Ewma ewma) {
                add(path + "weight", number(ewma.weight()));
            }
            add(path + "order", chart.order());
            add(path + "sides", chart.sides().word());
        }
    }

    private static String holiday(HolidayPlan holiday) {
        return holiday.day() + (holiday.regions().equals("*") ? "" : " in " + holiday.regions());
    }

    /** 6 rather than 6.0. */
    private static String number(double value) {
        return value == Math.rint(value) && Math.abs(value) < 1e15
                ? Long.toString((long) value)
                : Double.toString(value);
    }

    private void add(String path, Object value) {
        lines.add(path + ": " + value + (given.contains(path) ? "" : " (default)"));
    }
}
