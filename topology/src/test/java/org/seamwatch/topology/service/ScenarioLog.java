package org.seamwatch.topology.service;

import java.nio.charset.StandardCharsets;
import java.time.Instant;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import org.apache.kafka.common.utils.Utils;
import org.jspecify.annotations.Nullable;
import org.seamwatch.fixtures.scenario.ClockRecords;
import org.seamwatch.fixtures.scenario.FeedRecord;
import org.seamwatch.fixtures.scenario.Scenario;
import org.seamwatch.processors.flow.Topics;

/** A scenario as the log of two input topics, with clock records in every partition at every full hour. */
public final class ScenarioLog {

    private final int partitions;
    private final List<LogLine> lines = new ArrayList<>();

    private ScenarioLog(int partitions) {
        this.partitions = partitions;
    }

    /** The log of a scenario over so many partitions of each input topic. */
    public static List<LogLine> of(Scenario scenario, int partitions) {
        ScenarioLog log = new ScenarioLog(partitions);
        Deque<Instant> hours = new ArrayDeque<>(ClockRecords.hourly(
                scenario.options().begin(), scenario.options().end().plusSeconds(3_600)));
        for (FeedRecord record : scenario.records()) {
            while (!hours.isEmpty() && !hours.peek().isAfter(record.timestamp())) {
                log.clock(hours.remove());
            }
            log.report(record);
        }
        hours.forEach(log::clock);
        return log.lines;
    }

    private void clock(Instant hour) {
        byte[] key = ClockRecords.KEY.getBytes(StandardCharsets.UTF_8);
        for (String topic : List.of(Topics.CASE_REPORTS, Topics.ALARM_RESPONSES)) {
            for (int p = 0; p < partitions; p++) {
                lines.add(new LogLine(topic, p, hour.toEpochMilli(), key, ClockRecords.value()));
            }
        }
    }

    private void report(FeedRecord record) {
        byte[] key = bytes(record.key());
        int partition = key == null ? 0 : Utils.toPositive(Utils.murmur2(key)) % partitions;
        lines.add(new LogLine(Topics.CASE_REPORTS, partition, record.timestamp().toEpochMilli(), key, record.value()));
    }

    private static byte @Nullable [] bytes(@Nullable String text) {
        return text == null ? null : text.getBytes(StandardCharsets.UTF_8);
    }
}
