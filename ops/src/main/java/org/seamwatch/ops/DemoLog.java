package org.seamwatch.ops;

import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import org.apache.kafka.clients.producer.ProducerRecord;
import org.apache.kafka.common.utils.Utils;
import org.seamwatch.fixtures.scenario.ClockRecords;
import org.seamwatch.fixtures.scenario.FeedRecord;
import org.seamwatch.fixtures.scenario.Scenario;
import org.seamwatch.processors.flow.Topics;
import org.seamwatch.schemas.plan.TopicsPlan;
import org.seamwatch.schemas.record.ClockRecord;
import org.seamwatch.topology.replay.ReportKey;

/**
 * A scenario's feed as it goes into the input topics, in time order, with a clock record in every partition of both at
 * each full hour. It ends at noon some days after the last report: every day is closed by then, and no midnight of a
 * geography in UTC comes within the last hour, so that a replay of the log ends where the live run does.
 */
final class DemoLog {

    private static final Duration AFTER_LAST_REPORT = Duration.ofDays(3).plusHours(12);

    private final TopicsPlan topics;
    private final List<FeedRecord> feed;
    private final List<Instant> hours;
    private int nextRecord;
    private int nextHour;

    DemoLog(Scenario scenario, TopicsPlan topics) {
        this.topics = topics;
        this.feed = scenario.records();
        this.hours = ClockRecords.hourly(
                scenario.options().begin(), scenario.options().end().plus(AFTER_LAST_REPORT));
    }

    Instant start() {
        return hours.get(0);
    }

    Instant end() {
        return hours.get(hours.size() - 1);
    }

    /** The first full hour that has not been taken yet. */
    Instant next() {
        return hours.get(nextHour);
    }

    /** How many records it has in all. */
    long size() {
        return feed.size() + 2L * topics.partitions() * hours.size();
    }

    /** The records that come before an instant and have not been taken yet. */
    List<ProducerRecord<byte[], byte[]>> before(Instant end) {
        List<ProducerRecord<byte[], byte[]>> records = new ArrayList<>();
        while (hasHourBefore(end) || hasRecordBefore(end)) {
            boolean clock = hasHourBefore(end)
                    && (nextRecord == feed.size()
                            || !hours.get(nextHour).isAfter(feed.get(nextRecord).timestamp()));
            if (clock) {
                addClocks(hours.get(nextHour++), records);
            } else {
                records.add(report(feed.get(nextRecord++)));
            }
        }
        return records;
    }

    private boolean hasHourBefore(Instant end) {
        return nextHour < hours.size() && hours.get(nextHour).isBefore(end);
    }

    private boolean hasRecordBefore(Instant end) {
        return nextRecord < feed.size() && feed.get(nextRecord).timestamp().isBefore(end);
    }

    private void addClocks(Instant hour, List<ProducerRecord<byte[], byte[]>> records) {
        for (String topic : List.of(Topics.CASE_REPORTS, Topics.ALARM_RESPONSES)) {
            for (int partition = 0; partition < topics.partitions(); partition++) {
                records.add(new ProducerRecord<>(
                        topics.prefix() + topic,
                        partition,
                        hour.toEpochMilli(),
                        ClockRecord.key(),
                        ClockRecord.value()));
            }
        }
    }

    @SuppressWarnings("NullAway") // the client takes records without a key or a value
    private ProducerRecord<byte[], byte[]> report(FeedRecord record) {
        String id = record.key();
        byte[] key = id == null ? null : Utils.utf8(id);
        int partition = key == null ? 0 : ReportKey.partition(key, topics.partitions());
        return new ProducerRecord<>(
                topics.prefix() + Topics.CASE_REPORTS,
                partition,
                record.timestamp().toEpochMilli(),
                key,
                record.value());
    }
}
