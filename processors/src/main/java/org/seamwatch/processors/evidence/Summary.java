package org.seamwatch.processors.evidence;

import java.time.LocalDate;
import java.time.format.DateTimeFormatter;
import java.time.temporal.ChronoUnit;
import java.util.List;
import java.util.Locale;
import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.alarms.AlarmMove;
import org.seamwatch.processors.alarms.AlarmState;
import org.seamwatch.processors.watch.SeriesSpec;
import org.seamwatch.schemas.record.Change;
import org.seamwatch.schemas.record.Cluster;
import org.seamwatch.schemas.record.ClusterRegion;
import org.seamwatch.schemas.record.EvidenceChart;
import org.seamwatch.schemas.record.Grade;
import org.seamwatch.schemas.record.Quality;

/** The sentence that evidence begins with. */
final class Summary {

    private static final String NOT_CONFIRMED = "a statistical signal, not a confirmed outbreak.";
    private static final DateTimeFormatter DAY = DateTimeFormatter.ofPattern("d MMMM", Locale.ENGLISH);
    private static final DateTimeFormatter FULL_DAY = DateTimeFormatter.ofPattern("EEEE d MMMM yyyy", Locale.ENGLISH);
    private static final int NAMED = 3;

    private final SeriesSpec spec;
    private final String title;

    Summary(SeriesSpec spec) {
        this.spec = spec;
        this.title = Wording.title(spec.condition()) + ", "
                + Wording.title(spec.geography().id()) + ": ";
    }

    String of(AlarmMove move, EvidenceInput in, List<Cluster> clusters, List<EvidenceChart> charts, Quality quality) {
        AlarmState alarm = move.alarm();
        if (move.change() == Change.ENDED) {
            return title + "back inside its limits on " + in.day().format(FULL_DAY) + ", after signals "
                    + signals(alarm) + "; that does not say that anything is over; " + NOT_CONFIRMED;
        }
        if (move.change() == Change.WITHDRAWN && in.planChanged()) {
            return title
                    + "withdrawn; the plan of this series has changed and learning has begun afresh, so the signals "
                    + signals(alarm)
                    + " are not followed any further; that does not say that anything is over; what was raised was "
                    + NOT_CONFIRMED;
        }
        if (move.change() == Change.WITHDRAWN) {
            return title + "withdrawn; with the reports as they now stand no signal is left " + signals(alarm)
                    + "; silence is not safety; what was raised was " + NOT_CONFIRMED;
        }
        String open = move.change() == Change.OVERDUE
                ? "open for " + ChronoUnit.DAYS.between(alarm.start(), move.day()) + " days without a verdict; "
                : "";
        return title + open + places(clusters, quality) + " in the " + EvidenceMaker.PERIOD_DAYS + " days to "
                + in.day().format(FULL_DAY) + " by " + spec.plan().dayOf().word() + " date" + since(charts) + "; "
                + view(quality) + "; " + NOT_CONFIRMED;
    }

    private static String signals(AlarmState alarm) {
        return alarm.start().equals(alarm.lastSignal())
                ? "on " + alarm.start().format(DAY)
                : "from " + alarm.start().format(DAY) + " to "
                        + alarm.lastSignal().format(DAY);
    }

    private static String places(List<Cluster> clusters, Quality quality) {
        if (clusters.isEmpty()) {
            return Wording.count(quality.cases(), "case") + ", no group of regions far above its usual share,";
        }
        Cluster first = clusters.get(0);
        List<String> names =
                first.regions().stream().limit(NAMED).map(ClusterRegion::name).toList();
        return Wording.count(first.cases(), "case") + " (" + Wording.number(first.expected())
                + " expected by usual share) in " + Wording.list(names, first.regionCount() - names.size());
    }

    private static String since(List<EvidenceChart> charts) {
        EvidenceChart beyond = strongest(charts);
        if (beyond == null) {
            return "";
        }
        LocalDate began = beyond.began();
        Double limit = beyond.action().upper();
        return ", " + Wording.statistic(beyond.statistic()) + " unusual for this series (chart at "
                + Wording.hundredths(beyond.value())
                + (limit == null ? "" : ", action limit " + Wording.hundredths(limit))
                + (began == null ? "" : ", above its centre since " + began.format(DAY)) + ")";
    }

    private static @Nullable EvidenceChart strongest(List<EvidenceChart> charts) {
        return charts.stream()
                .filter(c -> c.grade() == Grade.ACTION)
                .findFirst()
                .orElse(null);
    }

    private static String view(Quality quality) {
        String revised = quality.revision() == 0 ? "first view" : "revised " + Wording.times(quality.revision());
        if (quality.cases() == 0 || quality.preliminary() == 0) {
            return revised;
        }
        return revised + ", " + StrictMath.round(100.0 * quality.preliminary() / quality.cases()) + " % preliminary";
    }
}
