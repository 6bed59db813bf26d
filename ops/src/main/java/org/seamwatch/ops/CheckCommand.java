package org.seamwatch.ops;

import java.util.Locale;
import java.util.concurrent.Callable;
import org.seamwatch.processors.charts.Chart;
import org.seamwatch.processors.statistics.Statistic;
import org.seamwatch.processors.watch.SeriesSpec;
import org.seamwatch.schemas.geography.Geography;
import org.seamwatch.schemas.geography.Region;
import org.seamwatch.schemas.plan.DayOf;
import org.seamwatch.schemas.plan.PlanPrinter;
import org.seamwatch.schemas.plan.SeriesPlan;
import org.seamwatch.schemas.plan.StatisticName;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;

/** Checks a plan and its geographies, and shows what they come to. */
@Command(
        name = "check",
        description = "Checks a plan and its geographies, and shows what they come to.",
        footer = {
            "",
            "Prints every key with its value or default, regions, links, isolated regions and pieces, and each chart's"
                    + " limits and intended false alarms a year. Warnings do not change the exit code."
        })
final class CheckCommand implements Callable<Integer> {

    /** Nobody can verify a tail that is reached less often than once in ten years. */
    private static final double SMALLEST_SHARE = 0.1;

    private static final int NAMED_REGIONS = 10;

    private final Console console;

    @Mixin
    private PlanOption plan = new PlanOption();

    CheckCommand(Console console) {
        this.console = console;
    }

    @Override
    public Integer call() {
        Plans plans = plan.read(console);
        console.say("Plan " + plan.file());
        PlanPrinter.lines(plans.read()).forEach(line -> console.say("  " + line));
        plans.geographies().forEach(this::geography);
        plans.watch().series().values().forEach(this::series);
        plans.read().plan().series().forEach(this::warn);
        plans.watch().series().values().forEach(this::warn);
        return Failures.DONE;
    }

    private void geography(Geography geography) {
        double people = 0;
        boolean known = true;
        for (Region region : geography.regions()) {
            Double population = region.population();
            known &= population != null;
            people += population == null ? 0 : population;
        }
        console.say("");
        console.say(String.format(
                Locale.ROOT,
                "Geography %s: %,d regions, %s",
                geography.id(),
                geography.regions().size(),
                known ? String.format(Locale.ROOT, "%,.0f people", people) : "no populations"));
    }

    private void series(SeriesSpec spec) {
        Ties ties = Ties.of(spec.ground().weights());
        console.say("");
        console.say("Series " + spec.id() + ", by " + spec.plan().dayOf().word() + " date");
        console.say(String.format(
                Locale.ROOT,
                "  neighbours (%s): %,d links, %s, %s",
                spec.plan().contiguity().words(),
                ties.links(),
                ties.pieces() == 1 ? "one piece" : ties.pieces() + " pieces",
                isolated(spec, ties)));
        console.say(String.format(
                Locale.ROOT,
                "  false alarms intended: %.3f a year of the desk's %.3f",
                spec.budget().series(),
                spec.budget().desk()));
        for (Statistic statistic : spec.statistics()) {
            for (Chart chart : statistic.board().charts()) {
                console.say(String.format(
                        Locale.ROOT,
                        "  %s, %s chart: action limit %s, warning limit %s; %.3f false alarms a year intended",
                        statistic.name(),
                        chart.name(),
                        AlarmText.limits(chart.action()),
                        AlarmText.limits(chart.warning()),
                        share(spec, statistic)));
            }
        }
        console.say("  the first " + spec.plan().warmUpDays()
                + " usable days teach and raise nothing; until 120 days have taught, limits are less sure");
    }

    private static String isolated(SeriesSpec spec, Ties ties) {
        if (ties.isolated().isEmpty()) {
            return "no isolated region";
        }
        StringBuilder text = new StringBuilder(ties.isolated().size() + " isolated: ");
        for (int i = 0; i < Math.min(NAMED_REGIONS, ties.isolated().size()); i++) {
            Region region = spec.regions().get(ties.isolated().get(i));
            text.append(i == 0 ? "" : ", ").append(region.id()).append(' ').append(region.name());
        }
        int more = ties.isolated().size() - NAMED_REGIONS;
        return more > 0 ? text + " and " + more + " more" : text.toString();
    }

    private static double share(SeriesSpec spec, Statistic statistic) {
        for (StatisticName name : spec.plan().statistics()) {
            if (name.word().equals(statistic.name())) {
                return spec.budget().chart(spec.plan(), name);
            }
        }
        throw new IllegalStateException("no statistic of the plan is " + statistic.name());
    }

    private void warn(SeriesPlan series) {
        if (series.dayOf() == DayOf.EVENT) {
            console.warn("series " + series.geography() + " " + series.conditions()
                    + ": dayOf: event, and how complete a day is when it closes is not known: days close before late"
                    + " reports arrive, and look too low until they do");
        }
    }

    private void warn(SeriesSpec spec) {
        for (Statistic statistic : spec.statistics()) {
            double share = share(spec, statistic);
            if (share < SMALLEST_SHARE) {
                console.warn(String.format(
                        Locale.ROOT,
                        "series %s: each chart of %s has a share of %.3f false alarms a year, under %.1f: nobody can"
                                + " verify such a tail; raise desk.falseAlarmsPerYear or watch less",
                        spec.id(),
                        statistic.name(),
                        share,
                        SMALLEST_SHARE));
            }
        }
    }
}
