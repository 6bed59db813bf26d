package org.seamwatch.schemas.record;

import com.fasterxml.jackson.annotation.JsonInclude;
import java.time.Instant;
import java.time.LocalDate;
import org.jspecify.annotations.Nullable;

/**
 * One case-report event, {@code case-report/1}.
 *
 * @param version version of the contract, 1
 * @param reportId id of the report over all its revisions, also the record's key
 * @param source the sender
 * @param revision from 0; the higher one wins
 * @param status how sure the source is
 * @param condition the disease, syndrome or organism
 * @param region code of the region; exactly one of region and position is given
 * @param position place of the report; exactly one of region and position is given
 * @param eventDate the day of the event (onset, sample), by the source's calendar
 * @param reportDate the day of the report, where the source gives one
 * @param reportedAt when the source sent it; content, never a clock
 * @param count cases, 0 to 1,000,000
 */
@JsonInclude(JsonInclude.Include.NON_NULL)
public record CaseReport(
        int version,
        String reportId,
        String source,
        long revision,
        ReportStatus status,
        String condition,
        @Nullable String region,
        @Nullable Position position,
        LocalDate eventDate,
        @Nullable LocalDate reportDate,
        Instant reportedAt,
        int count) {

    /** The largest count that one report may carry. */
    public static final int MAX_COUNT = 1_000_000;

    /** Whether both say the same: all fields but {@code reportedAt} and {@code version}. */
    public boolean sameContent(CaseReport other) {
        return withoutSendTime().equals(other.withoutSendTime());
    }

    private CaseReport withoutSendTime() {
        return new CaseReport(
                1,
                reportId,
                source,
                revision,
                status,
                condition,
                region,
                position,
                eventDate,
                reportDate,
                Instant.EPOCH,
                count);
    }
}
