package org.seamwatch.schemas.record;

import org.jspecify.annotations.Nullable;

/** Reads {@code case-report/1} from bytes of any origin. Unknown fields are skipped; nothing makes it throw. */
public final class CaseReportReader {

    /** The highest revision: the largest whole number that every JSON reader keeps exactly, 2^53 - 1. */
    public static final long MAX_REVISION = (1L << 53) - 1;

    private static final KnownFields KNOWN = KnownFields.of(
                    "version",
                    "reportId",
                    "source",
                    "revision",
                    "status",
                    "condition",
                    "region",
                    "position",
                    "eventDate",
                    "reportDate",
                    "reportedAt",
                    "count")
            .withObject("position", "lon", "lat");
    private static final FieldReader.Words<ReportStatus> STATUSES = new FieldReader.Words<>(ReportStatus.class);

    private CaseReportReader() {}

    /** The report, or why the bytes are none. */
    public static ReadResult<CaseReport> read(byte @Nullable [] value) {
        try {
            return new ReadResult.Parsed<>(report(new FieldReader(UntrustedJson.read(value, KNOWN))));
        } catch (Refused e) {
            return e.result();
        }
    }

    private static CaseReport report(FieldReader fields) throws Refused {
        fields.version();
        return new CaseReport(
                1,
                fields.id("reportId"),
                fields.plainId("source"),
                fields.integer("revision", 0, MAX_REVISION, 0),
                fields.word("status", STATUSES),
                fields.plainId("condition"),
                region(fields),
                fields.has("region") ? null : position(fields.object("position")),
                fields.date("eventDate"),
                fields.optionalDate("reportDate"),
                fields.instant("reportedAt"),
                (int) fields.integer("count", 0, CaseReport.MAX_COUNT, 1));
    }

    private static @Nullable String region(FieldReader fields) throws Refused {
        boolean placed = fields.has("position");
        if (fields.has("region")) {
            if (placed) {
                throw new Refused(
                        RejectReason.REGION_AND_POSITION,
                        "region",
                        "exactly one of region and position must be there, were both");
            }
            return fields.plainId("region");
        }
        if (!placed) {
            throw new Refused(RejectReason.NO_PLACE, "region", "one of region and position must be there, was neither");
        }
        return null;
    }

    private static Position position(FieldReader fields) throws Refused {
        return new Position(fields.degrees("lon", 180), fields.degrees("lat", 90));
    }
}
