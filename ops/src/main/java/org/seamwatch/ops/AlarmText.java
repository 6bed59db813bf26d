package org.seamwatch.ops;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import org.seamwatch.schemas.record.AlarmChange;
import org.seamwatch.schemas.record.AlarmResponse;
import org.seamwatch.schemas.record.Change;
import org.seamwatch.schemas.record.Cluster;
import org.seamwatch.schemas.record.ClusterRegion;
import org.seamwatch.schemas.record.Evidence;
import org.seamwatch.schemas.record.EvidenceChart;
import org.seamwatch.schemas.record.Limits;
import org.seamwatch.schemas.record.Quality;
import org.seamwatch.schemas.record.Verdict;

/**
 * A change of an alarm as a short block for people: what, where, since when, how sure, how good the data are, what to do
 * next, and what it is not.
 */
final class AlarmText {

    private static final int PLACES = 4;
    private static final int CLUSTERS = 3;

    private final AlarmChange alarm;
    private final Evidence evidence;
    private final List<String> lines = new ArrayList<>();

    private AlarmText(AlarmChange alarm) {
        this.alarm = alarm;
        this.evidence = alarm.evidence();
    }

    /** The block, several lines with an empty one at the end. */
    static String of(AlarmChange alarm) {
        AlarmText text = new AlarmText(alarm);
        text.head();
        if (text.asksForAction()) {
            text.where();
            text.since();
            text.sure();
        }
        text.data();
        text.response(alarm.response());
        text.row("next", next(alarm.change()));
        text.howToAnswer();
        text.row("caution", alarm.evidence().caution());
        return String.join(System.lineSeparator(), text.lines) + System.lineSeparator();
    }

    private void head() {
        lines.add("ALARM " + word(alarm.change()) + "  " + alarm.alarm() + "  #" + alarm.sequence() + ", day "
                + alarm.day());
        row("what", evidence.summary());
    }

    private boolean asksForAction() {
        Change change = alarm.change();
        return change == Change.RAISED || change == Change.STRENGTHENED || change == Change.OVERDUE;
    }

    /** "Ended" alone could be read as the end of an outbreak. */
    private static String word(Change change) {
        return change == Change.ENDED ? "back inside its limits" : change.name().toLowerCase(Locale.ROOT);
    }

    private void where() {
        List<Cluster> clusters = evidence.clusters();
        for (int i = 0; i < Math.min(CLUSTERS, clusters.size()); i++) {
            Cluster cluster = clusters.get(i);
            String places = cluster.regions().stream()
                    .limit(PLACES)
                    .map(AlarmText::place)
                    .collect(Collectors.joining("; "));
            int more =
                    cluster.regionCount() - Math.min(PLACES, cluster.regions().size());
            row(
                    i == 0 ? "where" : "",
                    String.format(Locale.ROOT, "%,d cases, %,.1f expected: ", cluster.cases(), cluster.expected())
                            + places
                            + (more > 0 ? "; and " + more + " more" : ""));
        }
        if (clusters.isEmpty()) {
            row("where", "no single place stands out");
        }
        row(
                "",
                "in " + evidence.period().from() + " to " + evidence.period().to() + " by "
                        + evidence.period().dateBasis() + " date; expected: by usual share of all cases of these days;"
                        + " named because they are high");
    }

    private static String place(ClusterRegion region) {
        Double rate = region.ratePer100000();
        String perPeople = rate == null ? "" : String.format(Locale.ROOT, ", %,.1f per 100,000", rate);
        return String.format(
                Locale.ROOT,
                "%s (%s) %,d, %,.1f expected%s",
                region.name(),
                region.region(),
                region.cases(),
                region.expected(),
                perPeople);
    }

    private void since() {
        List<String> begun = new ArrayList<>();
        for (EvidenceChart chart : evidence.charts()) {
            if (chart.began() != null) {
                begun.add("the " + chart.chart() + " chart of " + chart.statistic()
                        + " has been above its centre since " + chart.began());
            }
        }
        row("since", begun.isEmpty() ? "not known" : String.join("; ", begun));
    }

    private void sure() {
        for (EvidenceChart chart : evidence.charts()) {
            row(
                    "how sure",
                    String.format(
                            Locale.ROOT,
                            "the %s chart of %s stands at %.2f, its action limit is %s",
                            chart.chart(),
                            chart.statistic(),
                            chart.value(),
                            limits(chart.action())));
        }
        row(
                "",
                String.format(
                        Locale.ROOT,
                        "limits are set so that this series alarms for nothing about %s times a year (the desk: %s)",
                        number(evidence.method().seriesFalseAlarmsPerYear()),
                        number(evidence.method().deskFalseAlarmsPerYear())));
        if (evidence.method().youngLearning()) {
            row("", "learning is young: only " + evidence.method().learningDays() + " days have taught");
        }
    }

    /** At most two decimals. */
    private static String number(double value) {
        return BigDecimal.valueOf(value)
                .setScale(2, RoundingMode.HALF_UP)
                .stripTrailingZeros()
                .toPlainString();
    }

    static String limits(Limits limits) {
        List<String> sides = new ArrayList<>();
        if (limits.lower() != null) {
            sides.add(String.format(Locale.ROOT, "%.3f", limits.lower()));
        }
        if (limits.upper() != null) {
            sides.add(String.format(Locale.ROOT, "%.3f", limits.upper()));
        }
        return String.join(" and ", sides);
    }

    private void data() {
        Quality quality = evidence.quality();
        row(
                "data",
                String.format(
                        Locale.ROOT,
                        "%,d cases, %,d of them preliminary, %,d net after their day had closed; %s; regions not judged: %d",
                        quality.cases(),
                        quality.preliminary(),
                        quality.late(),
                        quality.revision() == 0 ? "first view" : "revision " + quality.revision(),
                        quality.unjudgedRegions()));
    }

    private void response(@Nullable AlarmResponse response) {
        if (response != null) {
            row("answer", word(response));
        }
    }

    private static String word(AlarmResponse response) {
        return word(response.verdict()) + " by " + response.by() + " at " + response.at();
    }

    private static String word(Verdict verdict) {
        return verdict.name().toLowerCase(Locale.ROOT).replace('_', '-');
    }

    private static String next(Change change) {
        return switch (change) {
            case RAISED, STRENGTHENED ->
                "look at the reports of these places, ask their sources whether anything changed in testing or "
                        + "reporting, then answer the alarm";
            case RESPONDED -> "follow up as answered; the answer can be changed";
            case OVERDUE -> "open for a long time: it needs a verdict";
            case ENDED -> "being inside the limits does not say that it is over: answer what it was";
            case WITHDRAWN -> "revised reports no longer show the signal: tell those who were told of it";
        };
    }

    private void howToAnswer() {
        if (alarm.change() == Change.RAISED
                || alarm.change() == Change.STRENGTHENED
                || alarm.change() == Change.OVERDUE) {
            String verdicts =
                    Arrays.stream(Verdict.values()).map(AlarmText::word).collect(Collectors.joining(", "));
            row("", "answers go to alarm-responses, key " + alarm.series() + ", with a verdict: " + verdicts);
        }
    }

    private void row(String label, String text) {
        lines.add(String.format(Locale.ROOT, "  %-9s %s", label, text));
    }
}
