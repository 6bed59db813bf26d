package org.seamwatch.schemas.record;

import com.fasterxml.jackson.annotation.JsonInclude;
import java.time.LocalDate;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * One change of an alarm, {@code alarm/1}; the record's key is the series.
 *
 * @param version version of the contract, 1
 * @param alarm id: the series and the day it was raised for, joined by {@code /}
 * @param series id of the series
 * @param geography id of the geography
 * @param condition the condition
 * @param change what happened
 * @param sequence from 1, one more for each change of this alarm
 * @param day the day of the series the change belongs to
 * @param statistics the statistics that signalled in the episode, in the order of the plan
 * @param response the last response, if there is one
 * @param evidence what a decision can be made from
 */
@JsonInclude(JsonInclude.Include.NON_NULL)
public record AlarmChange(
        int version,
        String alarm,
        String series,
        String geography,
        String condition,
        Change change,
        int sequence,
        LocalDate day,
        List<String> statistics,
        @Nullable AlarmResponse response,
        Evidence evidence) {

    public AlarmChange {
        statistics = List.copyOf(statistics);
    }
}
