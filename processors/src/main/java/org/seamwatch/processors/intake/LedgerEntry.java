package org.seamwatch.processors.intake;

import java.time.Instant;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.flow.Cases;
import org.seamwatch.processors.state.ByteReader;
import org.seamwatch.processors.state.ByteWriter;
import org.seamwatch.schemas.record.CaseReport;
import org.seamwatch.schemas.record.Position;
import org.seamwatch.schemas.record.ReportStatus;

/**
 * What a report last said. Holds fields of the schema only: anything else a sender wrote is never stored.
 *
 * @param report the report; {@code reportedAt} is not kept
 * @param region the region it was counted in
 * @param contributions where it was counted, at least one
 */
record LedgerEntry(CaseReport report, String region, List<Contribution> contributions) {

    private static final int VERSION = 1;

    LedgerEntry {
        contributions = List.copyOf(contributions);
    }

    /** The cases it counts for; a withdrawn report counts for none. */
    Cases cases() {
        if (report.status() == ReportStatus.WITHDRAWN) {
            return Cases.NONE;
        }
        return new Cases(report.count(), report.status() == ReportStatus.PRELIMINARY ? report.count() : 0);
    }

    LedgerEntry with(List<Contribution> newContributions) {
        return new LedgerEntry(report, region, newContributions);
    }

    byte[] row() {
        CaseReport r = report;
        ByteWriter out = new ByteWriter(VERSION);
        out.text(r.source()).number(r.revision()).text(r.status().name()).text(r.condition());
        out.textOrNull(r.region());
        Position position = r.position();
        if (position != null) {
            out.real(position.lon()).real(position.lat());
        }
        out.number(r.eventDate().toEpochDay()).textOrNull(text(r.reportDate())).number(r.count());
        out.text(region).number(contributions.size());
        contributions.forEach(c -> out.text(c.series()).number(c.day().toEpochDay()));
        return out.bytes();
    }

    static LedgerEntry from(String reportId, byte[] row) {
        ByteReader in = new ByteReader(row, VERSION);
        String source = in.text();
        long revision = in.number();
        ReportStatus status = ReportStatus.valueOf(in.text());
        String condition = in.text();
        String code = in.textOrNull();
        Position position = code == null ? new Position(in.real(), in.real()) : null;
        LocalDate eventDate = LocalDate.ofEpochDay(in.number());
        String reportDate = in.textOrNull();
        int count = in.integer();
        String region = in.text();
        List<Contribution> contributions = contributions(in);
        CaseReport report = new CaseReport(
                1,
                reportId,
                source,
                revision,
                status,
                condition,
                code,
                position,
                eventDate,
                reportDate == null ? null : LocalDate.parse(reportDate),
                Instant.EPOCH,
                count);
        return new LedgerEntry(report, region, contributions);
    }

    /** The contributions of a row, without reading the rest. */
    static List<Contribution> contributions(byte[] row) {
        ByteReader in = new ByteReader(row, VERSION);
        in.skipText();
        in.number();
        in.skipText();
        in.skipText();
        if (!in.skipText()) {
            in.real();
            in.real();
        }
        in.number();
        in.skipText();
        in.number();
        in.skipText();
        return contributions(in);
    }

    private static List<Contribution> contributions(ByteReader in) {
        int size = in.integer();
        List<Contribution> contributions = new ArrayList<>(size);
        for (int n = size; n > 0; n--) {
            contributions.add(new Contribution(in.text(), LocalDate.ofEpochDay(in.number())));
        }
        return contributions;
    }

    private static @Nullable String text(@Nullable LocalDate date) {
        return date == null ? null : date.toString();
    }
}
