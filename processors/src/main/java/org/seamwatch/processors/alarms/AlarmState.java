package org.seamwatch.processors.alarms;

import com.fasterxml.jackson.annotation.JsonIgnore;
import java.time.LocalDate;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.seamwatch.schemas.record.AlarmResponse;

/**
 * An alarm as the series keeps it.
 *
 * @param id series and day it was raised for; fixed
 * @param raisedFor the day it was first raised for
 * @param start first signalling day of its episode, as the data now have it
 * @param lastSignal last signalling day of its episode
 * @param end the day that ended its episode; null while that is open
 * @param withdrawn whether revised data took its episode away
 * @param sequence changes so far
 * @param statistics statistics that have signalled in its episode
 * @param overdue whether it has been said to be overdue
 * @param response the last response
 */
public record AlarmState(
        String id,
        LocalDate raisedFor,
        LocalDate start,
        LocalDate lastSignal,
        @Nullable LocalDate end,
        boolean withdrawn,
        int sequence,
        List<String> statistics,
        boolean overdue,
        @Nullable AlarmResponse response) {

    /** So many days open make an alarm overdue. */
    public static final int OVERDUE_DAYS = 56;

    public AlarmState {
        statistics = List.copyOf(statistics);
    }

    static AlarmState raised(String id, Episode episode) {
        return new AlarmState(
                id,
                episode.start(),
                episode.start(),
                episode.lastSignal(),
                null,
                false,
                1,
                episode.statistics(),
                false,
                null);
    }

    /** Whether it waits for its end. */
    @JsonIgnore
    public boolean isOpen() {
        return !withdrawn && end == null;
    }

    /** Whether it is open and no one has said what it was. */
    boolean isUnanswered() {
        return isOpen() && (response == null || !response.verdict().isAnswer());
    }

    /** Whether its episode reaches a day or goes on after it. */
    boolean reaches(LocalDate day) {
        return isOpen() || !lastDay().isBefore(day);
    }

    boolean overlaps(Episode episode) {
        boolean startsInTime = episode.end() == null || !start.isAfter(episode.end());
        boolean lastsLongEnough = isOpen() || !lastDay().isBefore(episode.start());
        return startsInTime && lastsLongEnough;
    }

    private LocalDate lastDay() {
        return end == null ? lastSignal : end;
    }

    /** The last day that anything of it is known of. */
    public LocalDate newestDay() {
        return lastDay();
    }

    AlarmState as(Episode episode) {
        return new AlarmState(
                id,
                raisedFor,
                episode.start(),
                episode.lastSignal(),
                episode.end(),
                false,
                sequence,
                episode.statistics(),
                overdue,
                response);
    }

    AlarmState withdraw() {
        return new AlarmState(id, raisedFor, start, lastSignal, end, true, sequence, statistics, overdue, response);
    }

    AlarmState next() {
        return new AlarmState(
                id, raisedFor, start, lastSignal, end, withdrawn, sequence + 1, statistics, overdue, response);
    }

    AlarmState asOverdue() {
        return new AlarmState(id, raisedFor, start, lastSignal, end, withdrawn, sequence, statistics, true, response);
    }

    /** The alarm with a response, as one more change. */
    public AlarmState answered(AlarmResponse newResponse) {
        return new AlarmState(
                        id, raisedFor, start, lastSignal, end, withdrawn, sequence, statistics, overdue, newResponse)
                .next();
    }
}
