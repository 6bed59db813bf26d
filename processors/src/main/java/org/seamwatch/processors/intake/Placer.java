package org.seamwatch.processors.intake;

import java.time.Duration;
import java.time.Instant;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.watch.SeriesSpec;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.schemas.plan.DayOf;
import org.seamwatch.schemas.record.CaseReport;
import org.seamwatch.schemas.record.Position;
import org.seamwatch.schemas.record.RejectReason;

/** Finds the region, the series and the days a report counts in. */
final class Placer {

    private static final Duration CLOCK_TOLERANCE = Duration.ofMinutes(10);

    private final Watch watch;

    Placer(Watch watch) {
        this.watch = watch;
    }

    /** Either the entry a report makes, or why it makes none. */
    record Placing(
            @Nullable LedgerEntry entryOrNull, @Nullable Refusal why) {

        LedgerEntry entry() {
            if (entryOrNull == null) {
                throw new IllegalStateException("a report without a place has no entry");
            }
            return entryOrNull;
        }
    }

    Placing place(CaseReport report, long timestamp) {
        Instant logTime = Instant.ofEpochMilli(timestamp);
        if (report.reportedAt().isAfter(logTime.plus(CLOCK_TOLERANCE))) {
            return no(
                    RejectReason.CLOCK_AHEAD,
                    "reportedAt",
                    "reportedAt must be at most 10 minutes ahead of the log's " + logTime + ", was "
                            + report.reportedAt());
        }
        String region = region(report);
        if (region == null) {
            return no(RejectReason.OUTSIDE_EVERY_REGION, "position", "position must lie in a region of the plan");
        }
        List<SeriesSpec> series = watch.route(report.condition(), region);
        if (series.isEmpty()) {
            return unrouted(report, region);
        }
        List<Contribution> contributions = new ArrayList<>(series.size());
        for (SeriesSpec spec : series) {
            LocalDate day = day(report, spec);
            LocalDate latest = logTime.atZone(spec.zone()).toLocalDate().plusDays(1);
            if (day.isAfter(latest)) {
                return no(
                        RejectReason.FUTURE_DAY,
                        spec.plan().dayOf() == DayOf.EVENT || report.reportDate() == null ? "eventDate" : "reportDate",
                        "the report's day must be at most one day after the log's date, was " + day);
            }
            contributions.add(new Contribution(spec.id(), day));
        }
        return new Placing(new LedgerEntry(report, region, contributions), null);
    }

    private @Nullable String region(CaseReport report) {
        String code = report.region();
        if (code != null) {
            return code;
        }
        Position position = report.position();
        return position == null ? null : watch.regionAt(position);
    }

    private Placing unrouted(CaseReport report, String region) {
        if (!watch.knowsCondition(report.condition())) {
            return no(
                    RejectReason.UNKNOWN_CONDITION,
                    "condition",
                    "condition must be one of the plan's, was " + report.condition());
        }
        if (!watch.knowsRegion(region)) {
            return no(RejectReason.UNKNOWN_REGION, "region", "region must be one of the plan's, was " + region);
        }
        return no(
                RejectReason.NO_SERIES_TAKES_IT,
                "condition",
                "no series of the plan watches " + report.condition() + " in region " + region);
    }

    private static LocalDate day(CaseReport report, SeriesSpec spec) {
        if (spec.plan().dayOf() == DayOf.EVENT) {
            return report.eventDate();
        }
        LocalDate given = report.reportDate();
        return given != null ? given : report.reportedAt().atZone(spec.zone()).toLocalDate();
    }

    private static Placing no(RejectReason reason, String field, String detail) {
        return new Placing(null, new Refusal(reason, field, detail));
    }
}
