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
    private final Horizon horizon;
    private final LocalDays days = new LocalDays();

    Placer(Watch watch, Horizon horizon) {
        this.watch = watch;
        this.horizon = horizon;
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

    /**
     * Places a report.
     *
     * @param timestamp the record's, which the report's dates must not be ahead of
     * @param time the partition's, which they must not lie too far behind
     */
    Placing place(CaseReport report, long timestamp, long time) {
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
        return placed(report, region, series, timestamp, time);
    }

    private Placing placed(CaseReport report, String region, List<SeriesSpec> series, long timestamp, long time) {
        List<Contribution> contributions = new ArrayList<>(series.size());
        for (SeriesSpec spec : series) {
            LocalDate day = day(report, spec);
            LocalDate latest = days.at(timestamp, spec.zone()).plusDays(1);
            if (day.isAfter(latest)) {
                return no(
                        RejectReason.FUTURE_DAY,
                        field(report, spec),
                        "the report's day must be at most one day after the log's date, was " + day);
            }
            contributions.add(new Contribution(spec.id(), day));
        }
        List<Contribution> within = horizon.within(contributions, time);
        if (within.isEmpty()) {
            return no(
                    RejectReason.TOO_OLD,
                    field(report, series.get(0)),
                    "the report's day must lie within the ledger's horizon, was "
                            + contributions.get(0).day());
        }
        return new Placing(new LedgerEntry(report, region, within), null);
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

    /** The field that {@link #day} is taken from. */
    private static String field(CaseReport report, SeriesSpec spec) {
        if (spec.plan().dayOf() == DayOf.EVENT) {
            return "eventDate";
        }
        return report.reportDate() == null ? "reportedAt" : "reportDate";
    }

    private static Placing no(RejectReason reason, String field, String detail) {
        return new Placing(null, new Refusal(reason, field, detail));
    }
}
