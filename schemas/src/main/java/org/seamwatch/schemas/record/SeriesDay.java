package org.seamwatch.schemas.record;

import com.fasterxml.jackson.annotation.JsonInclude;
import java.time.Instant;
import java.time.LocalDate;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * One closed day of a series, {@code series-day/1}.
 *
 * @param version version of the contract, 1
 * @param series id of the series
 * @param day the day
 * @param revision 0 at the first close, one more each time anything of the day changed
 * @param closedAt end of the hour whose close emitted this revision
 * @param cases cases in the geography on the day
 * @param regions regions of the geography
 * @param isolated regions without neighbours
 * @param unjudged ids of regions that could not be judged on the day, in order
 * @param moran global Moran's I, where the plan asks for it
 */
@JsonInclude(JsonInclude.Include.NON_NULL)
public record SeriesDay(
        int version,
        String series,
        LocalDate day,
        int revision,
        Instant closedAt,
        long cases,
        int regions,
        int isolated,
        List<String> unjudged,
        @Nullable MoranDay moran) {

    public SeriesDay {
        unjudged = List.copyOf(unjudged);
    }

    /** The same day as it would read at another revision. */
    public SeriesDay at(int newRevision, Instant newClosedAt) {
        return new SeriesDay(version, series, day, newRevision, newClosedAt, cases, regions, isolated, unjudged, moran);
    }

    /** The same day with its Moran's I. */
    public SeriesDay withMoran(MoranDay newMoran) {
        return new SeriesDay(version, series, day, revision, closedAt, cases, regions, isolated, unjudged, newMoran);
    }
}
