package org.seamwatch.topology.service;

import java.time.Duration;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import org.apache.kafka.clients.admin.Admin;
import org.apache.kafka.clients.admin.Config;
import org.apache.kafka.clients.admin.ListTopicsOptions;
import org.apache.kafka.clients.admin.NewTopic;
import org.apache.kafka.clients.admin.OffsetSpec;
import org.apache.kafka.common.KafkaException;
import org.apache.kafka.common.TopicPartition;
import org.apache.kafka.common.config.ConfigResource;
import org.apache.kafka.common.config.TopicConfig;
import org.apache.kafka.common.errors.TopicExistsException;
import org.seamwatch.schemas.InputException;
import org.seamwatch.schemas.plan.Plan;
import org.seamwatch.schemas.plan.TopicsPlan;
import org.seamwatch.topology.Names;

/** Creates the topics that are missing, and checks those that are there, before the engine starts. */
public final class TopicSetup {

    private final Answers answers;
    private final Admin admin;
    private final Plan plan;
    private final List<String> warnings = new ArrayList<>();

    private TopicSetup(Admin admin, Plan plan) {
        this.answers = new Answers(plan);
        this.admin = admin;
        this.plan = plan;
    }

    /**
     * Makes sure that every topic of the plan is there and as it must be.
     *
     * @return warnings, one line each
     * @throws InputException where plan and topics do not fit, or the plan's properties are no use
     * @throws NoBrokerException where no broker answers
     */
    public static List<String> prepare(Plan plan) {
        Admin admin = admin(plan);
        try {
            return new TopicSetup(admin, plan).prepare();
        } finally {
            // What has had no answer by now is not waited for.
            admin.close(Duration.ZERO);
        }
    }

    private static Admin admin(Plan plan) {
        try {
            return Admin.create(StreamsSettings.client(plan));
        } catch (KafkaException e) {
            throw StreamsSettings.wrong(plan, e);
        }
    }

    private List<String> prepare() {
        Set<String> existing = answers.of(
                admin.listTopics(new ListTopicsOptions().listInternal(true)).names(), "listing topics");
        List<TopicSpec> specs = TopicSpec.of(plan.topics());
        List<TopicSpec> present =
                specs.stream().filter(spec -> existing.contains(spec.name())).toList();
        List<TopicSpec> missing =
                specs.stream().filter(spec -> !existing.contains(spec.name())).toList();
        checkCounts(present, existing);
        checkConfigs(present);
        create(missing);
        awaitLeaders(specs);
        return List.copyOf(warnings);
    }

    /**
     * Waits until the leader of each partition answers. A topic is listed a moment before its leaders take records,
     * and what a producer sends in that moment may be refused out of order for as long as it retries.
     */
    private void awaitLeaders(List<TopicSpec> specs) {
        Map<TopicPartition, OffsetSpec> ends = new HashMap<>();
        for (TopicSpec spec : specs) {
            for (int p = 0; p < spec.partitions(); p++) {
                ends.put(new TopicPartition(spec.name(), p), OffsetSpec.latest());
            }
        }
        answers.ofAgain(() -> admin.listOffsets(ends).all(), "waiting for the leaders of topics");
    }

    private void checkCounts(List<TopicSpec> present, Set<String> existing) {
        Map<String, TopicSpec> wanted = new TreeMap<>();
        present.forEach(spec -> wanted.put(spec.name(), spec));
        for (TopicSpec internal : internalTopics()) {
            if (existing.contains(internal.name())) {
                wanted.put(internal.name(), internal);
            }
        }
        answers.of(admin.describeTopics(wanted.keySet()).allTopicNames(), "describing topics")
                .forEach((name, found) -> {
                    TopicSpec spec = wanted.get(name);
                    if (spec != null && found.partitions().size() != spec.partitions()) {
                        throw otherCount(spec, found.partitions().size());
                    }
                });
    }

    /** The engine's own topics show what an earlier run was told. */
    private List<TopicSpec> internalTopics() {
        TopicsPlan topics = plan.topics();
        String application = ApplicationId.of(plan);
        List<TopicSpec> specs = new ArrayList<>();
        for (String changes : List.of(Names.REPORT_CHANGES, Names.RESPONSE_CHANGES)) {
            String name = application + "-" + Names.repartitionTopic(changes);
            specs.add(new TopicSpec(name, topics.seriesPartitions(), "topics.seriesPartitions", false, Map.of()));
        }
        return specs;
    }

    private InputException otherCount(TopicSpec spec, int found) {
        String advice = spec.input()
                ? "the number of input partitions is part of the log; to grow, replay into topics under a new prefix"
                : "set it back, or replay into topics under a new prefix";
        return new InputException(plan.file() + ": " + spec.planKey() + ": topic " + spec.name() + " has " + found
                + " partitions, the plan says " + spec.partitions() + ": " + advice);
    }

    private void checkConfigs(List<TopicSpec> present) {
        List<ConfigResource> inputs = present.stream()
                .filter(TopicSpec::input)
                .map(spec -> new ConfigResource(ConfigResource.Type.TOPIC, spec.name()))
                .toList();
        answers.of(admin.describeConfigs(inputs).all(), "reading settings of topics")
                .forEach((resource, config) -> checkInput(resource.name(), config));
    }

    private void checkInput(String topic, Config config) {
        if (value(config, TopicConfig.CLEANUP_POLICY_CONFIG).contains(TopicConfig.CLEANUP_POLICY_COMPACT)) {
            throw new InputException("topic " + topic + ": cleanup.policy must be delete, was "
                    + value(config, TopicConfig.CLEANUP_POLICY_CONFIG) + ": compaction removes earlier revisions");
        }
        if (!value(config, TopicConfig.MESSAGE_TIMESTAMP_TYPE_CONFIG).equals("CreateTime")) {
            throw new InputException("topic " + topic + ": message.timestamp.type must be CreateTime, was "
                    + value(config, TopicConfig.MESSAGE_TIMESTAMP_TYPE_CONFIG));
        }
        warnOfEnd(topic, config, TopicConfig.RETENTION_MS_CONFIG);
        warnOfEnd(topic, config, TopicConfig.RETENTION_BYTES_CONFIG);
    }

    private void warnOfEnd(String topic, Config config, String key) {
        String value = value(config, key);
        if (!value.equals("-1")) {
            warnings.add("topic " + topic + ": " + key + " should be -1, was " + value
                    + ": what it deletes can never be replayed");
        }
    }

    private static String value(Config config, String key) {
        return Optional.ofNullable(config.get(key)).map(entry -> entry.value()).orElse("");
    }

    private void create(List<TopicSpec> missing) {
        short replication = (short) plan.topics().replication();
        int brokers =
                answers.of(admin.describeCluster().nodes(), "counting brokers").size();
        if (!missing.isEmpty() && replication > brokers) {
            throw new InputException(plan.file() + ": topics.replication must be at most the number of brokers, was "
                    + replication + " with " + brokers);
        }
        List<NewTopic> topics = missing.stream()
                .map(spec -> new NewTopic(spec.name(), spec.partitions(), replication).configs(spec.configs()))
                .toList();
        admin.createTopics(topics).values().forEach((name, created) -> {
            try {
                answers.of(created, "creating topic " + name);
            } catch (IllegalStateException e) {
                // Another instance that starts at the same time may have been quicker; its plan is the same.
                if (!(e.getCause() instanceof TopicExistsException)) {
                    throw e;
                }
            }
        });
    }
}
