package org.seamwatch.ops.bench;

import java.time.Duration;
import java.time.Instant;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import org.apache.kafka.clients.producer.ProducerRecord;
import org.apache.kafka.common.utils.Utils;
import org.seamwatch.fixtures.broker.TopicTool;
import org.seamwatch.fixtures.scenario.ClockRecords;
import org.seamwatch.fixtures.scenario.FeedRecord;
import org.seamwatch.fixtures.scenario.Scenario;
import org.seamwatch.processors.flow.Topics;
import org.seamwatch.schemas.plan.TopicsPlan;
import org.seamwatch.schemas.record.ClockRecord;

/**
 * The log that both jobs read, loaded once.
 *
 * @param reports records of the scenario, clock records not counted
 * @param countable reports that the bare job counts
 * @param records all records of all input partitions
 */
record BenchLog(long reports, long countable, long records) {

    private static final Duration AFTER_LAST_REPORT = Duration.ofDays(3);
    private static final int BATCH = 20_000;

    /** Loads a scenario with a clock record in each input partition at every full hour. */
    static BenchLog load(Scenario scenario, TopicsPlan topics, TopicTool tool) {
        Loading loading = new Loading(topics, tool);
        Deque<Instant> hours = new ArrayDeque<>(ClockRecords.hourly(
                scenario.options().begin(), scenario.options().end().plus(AFTER_LAST_REPORT)));
        for (FeedRecord record : scenario.records()) {
            while (!hours.isEmpty() && !hours.peek().isAfter(record.timestamp())) {
                loading.clocks(hours.remove());
            }
            loading.report(record);
        }
        hours.forEach(loading::clocks);
        loading.flush();
        return new BenchLog(scenario.records().size(), loading.countable, loading.sent);
    }

    /** Records on their way. */
    private static final class Loading {

        private final TopicsPlan topics;
        private final TopicTool tool;
        private final List<ProducerRecord<byte[], byte[]>> batch = new ArrayList<>();
        private long sent;
        private long countable;

        Loading(TopicsPlan topics, TopicTool tool) {
            this.topics = topics;
            this.tool = tool;
        }

        void clocks(Instant hour) {
            for (String topic : List.of(Topics.CASE_REPORTS, Topics.ALARM_RESPONSES)) {
                for (int p = 0; p < topics.partitions(); p++) {
                    add(new ProducerRecord<>(
                            topics.prefix() + topic, p, hour.toEpochMilli(), ClockRecord.key(), ClockRecord.value()));
                }
            }
        }

        @SuppressWarnings("NullAway") // the client takes records without a key or a value
        void report(FeedRecord record) {
            String id = record.key();
            byte[] key = id == null ? null : Utils.utf8(id);
            int partition = key == null ? 0 : Utils.toPositive(Utils.murmur2(key)) % topics.partitions();
            countable += BareJob.key(record.value()) == null ? 0 : 1;
            add(new ProducerRecord<>(
                    topics.prefix() + Topics.CASE_REPORTS,
                    partition,
                    record.timestamp().toEpochMilli(),
                    key,
                    record.value()));
        }

        private void add(ProducerRecord<byte[], byte[]> record) {
            batch.add(record);
            if (batch.size() == BATCH) {
                flush();
            }
        }

        void flush() {
            sent += tool.send(batch).size();
            batch.clear();
        }
    }
}
