package org.seamwatch.topology.service;

import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.apache.kafka.common.config.TopicConfig;
import org.seamwatch.processors.flow.Topics;
import org.seamwatch.schemas.plan.TopicsPlan;

/**
 * A topic as it should be.
 *
 * @param name full name
 * @param partitions how many
 * @param planKey the plan's key for that number
 * @param input whether it is the log: its number of partitions is part of it for its life
 * @param configs its settings where we create it
 */
record TopicSpec(String name, int partitions, String planKey, boolean input, Map<String, String> configs) {

    private static final String FOREVER = "-1";

    /** A sender's clock may be ten minutes ahead, as {@code reportedAt} may. */
    private static final String AHEAD = "600000";

    private static final String ANY = Long.toString(Long.MAX_VALUE);

    TopicSpec {
        configs = Map.copyOf(configs);
    }

    static List<TopicSpec> of(TopicsPlan plan) {
        String rejected = Long.toString(plan.rejectedRetention().toMillis());
        return List.of(
                input(plan, Topics.CASE_REPORTS),
                input(plan, Topics.ALARM_RESPONSES),
                ours(plan, Topics.REGION_DAYS, TopicConfig.CLEANUP_POLICY_COMPACT),
                ours(plan, Topics.SERIES_DAYS, TopicConfig.CLEANUP_POLICY_DELETE),
                ours(plan, Topics.ALARMS, TopicConfig.CLEANUP_POLICY_DELETE),
                new TopicSpec(
                        plan.prefix() + Topics.REJECTED_REPORTS,
                        plan.partitions(),
                        "topics.partitions",
                        false,
                        configs(TopicConfig.CLEANUP_POLICY_DELETE, rejected, ANY)));
    }

    private static TopicSpec input(TopicsPlan plan, String topic) {
        return new TopicSpec(
                plan.prefix() + topic,
                plan.partitions(),
                "topics.partitions",
                true,
                configs(TopicConfig.CLEANUP_POLICY_DELETE, FOREVER, AHEAD));
    }

    /** Segments end by size alone: by their records' time, a replayed year would leave one for each week. */
    private static TopicSpec ours(TopicsPlan plan, String topic, String cleanup) {
        Map<String, String> configs = new TreeMap<>(configs(cleanup, FOREVER, ANY));
        configs.put(TopicConfig.SEGMENT_MS_CONFIG, ANY);
        return new TopicSpec(plan.prefix() + topic, plan.seriesPartitions(), "topics.seriesPartitions", false, configs);
    }

    private static Map<String, String> configs(String cleanup, String retention, String ahead) {
        return Map.of(
                TopicConfig.CLEANUP_POLICY_CONFIG,
                cleanup,
                TopicConfig.RETENTION_MS_CONFIG,
                retention,
                TopicConfig.RETENTION_BYTES_CONFIG,
                FOREVER,
                TopicConfig.MESSAGE_TIMESTAMP_TYPE_CONFIG,
                "CreateTime",
                TopicConfig.MESSAGE_TIMESTAMP_AFTER_MAX_MS_CONFIG,
                ahead);
    }
}
