package org.seamwatch.processors.watch;

import java.nio.charset.StandardCharsets;
import java.util.List;
import org.seamwatch.schemas.Sha256;
import org.seamwatch.schemas.geography.Geography;
import org.seamwatch.schemas.plan.GeographyPlan;
import org.seamwatch.schemas.plan.Plan;
import org.seamwatch.schemas.plan.SeriesPlan;
import org.seamwatch.schemas.plan.StatisticName;

/** SHA-256 of what results depend on beside the log. Where topics live and how many threads run is no part of it. */
final class PlanHash {

    private PlanHash() {}

    static String of(Plan plan, List<Geography> geographies) {
        StringBuilder text = new StringBuilder("desk " + plan.deskFalseAlarmsPerYear());
        geographies.forEach(g -> text.append(text(g)));
        plan.series().forEach(s -> text.append(text(s)));
        return sha256(text.toString());
    }

    /**
     * Of what one series learns from: what is computed, on what, and how it is charted. Limits, budget, permutations and
     * the times of close and revision are no part of it: with others of them, learning goes on.
     */
    static String of(SeriesPlan series, Geography geography) {
        List<Object> parts = List.of(
                series.dayOf(),
                series.windowDays(),
                series.measure(),
                series.contiguity(),
                series.weights(),
                series.thinBelow(),
                series.holidays());
        return sha256(text(geography) + "\nlearns " + parts + charts(series));
    }

    private static String text(Geography geography) {
        GeographyPlan g = geography.plan();
        return "\ngeography " + g.id() + " " + g.timeZone() + " " + g.populationYear() + " " + g.tolerance() + " "
                + geography.sha256();
    }

    private static String text(SeriesPlan s) {
        StringBuilder text = new StringBuilder("\nseries ");
        List<Object> parts = List.of(
                s.geography(),
                s.conditions(),
                String.valueOf(s.from()),
                s.dayOf(),
                s.closeAfterDays(),
                s.reviseForDays(),
                s.windowDays(),
                s.measure(),
                s.permutations(),
                s.contiguity(),
                s.weights(),
                s.thinBelow(),
                s.share(),
                s.warmUpDays(),
                s.holidays());
        parts.forEach(part -> text.append(part).append(' '));
        return text.append(charts(s)).toString();
    }

    private static String charts(SeriesPlan s) {
        StringBuilder text = new StringBuilder();
        for (StatisticName name : s.statistics()) {
            text.append(' ').append(name.word()).append(s.charts().get(name));
        }
        return text.toString();
    }

    private static String sha256(String text) {
        return Sha256.hex(text.getBytes(StandardCharsets.UTF_8));
    }
}
