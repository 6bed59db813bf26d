package org.seamwatch.processors.watch;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.List;
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

    /** Of one series: its budget too, which depends on the shares of the others. */
    static String of(Plan plan, SeriesPlan series, Geography geography) {
        return sha256("budget " + Budget.of(plan, series).series() + text(geography) + text(series));
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
        for (StatisticName name : s.statistics()) {
            text.append(name.word()).append(s.charts().get(name)).append(' ');
        }
        return text.toString();
    }

    private static String sha256(String text) {
        try {
            byte[] hash = MessageDigest.getInstance("SHA-256").digest(text.getBytes(StandardCharsets.UTF_8));
            return HexFormat.of().formatHex(hash);
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java platform has SHA-256", e);
        }
    }
}
