package org.seamwatch.topology.service;

import java.nio.charset.StandardCharsets;
import java.time.Duration;
import java.time.Instant;
import java.time.LocalTime;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import org.seamwatch.processors.flow.Topics;
import org.seamwatch.schemas.json.Json;
import org.seamwatch.schemas.record.AlarmChange;
import org.seamwatch.schemas.record.AlarmResponse;
import org.seamwatch.schemas.record.Change;
import org.seamwatch.schemas.record.Verdict;

/** Answers to alarms, put into a log where they belong in time. */
final class Responses {

    /** Two hours and a half after the close that raised the alarm, between two clock records. */
    private static final Duration DELAY = Duration.ofMinutes(24 * 60 + 150);

    private Responses() {}

    /** The log with an answer to each alarm that was raised. */
    static List<LogLine> in(List<LogLine> log, List<AlarmChange> alarms, int partitions) {
        List<LogLine> lines = new ArrayList<>(log);
        int partition = 0;
        for (AlarmChange alarm : alarms) {
            if (alarm.change() == Change.RAISED) {
                insert(lines, response(alarm, partition++ % partitions));
            }
        }
        return lines;
    }

    private static void insert(List<LogLine> lines, LogLine response) {
        for (int i = 0; i < lines.size(); i++) {
            if (lines.get(i).timestamp() > response.timestamp()) {
                lines.add(i, response);
                return;
            }
        }
    }

    private static LogLine response(AlarmChange alarm, int partition) {
        Instant at = alarm.day()
                .plusDays(1)
                .atTime(LocalTime.MIDNIGHT)
                .toInstant(ZoneOffset.UTC)
                .plus(DELAY);
        AlarmResponse response =
                new AlarmResponse(1, alarm.alarm(), Verdict.ACKNOWLEDGED, null, null, "desk", at, "seen");
        return new LogLine(
                Topics.ALARM_RESPONSES,
                partition,
                at.toEpochMilli(),
                alarm.series().getBytes(StandardCharsets.UTF_8),
                Json.bytes(response));
    }
}
