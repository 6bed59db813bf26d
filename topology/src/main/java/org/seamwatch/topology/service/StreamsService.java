package org.seamwatch.topology.service;

import java.time.Clock;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Properties;
import java.util.concurrent.CountDownLatch;
import java.util.stream.Stream;
import org.apache.kafka.clients.producer.KafkaProducer;
import org.apache.kafka.clients.producer.ProducerConfig;
import org.apache.kafka.common.KafkaException;
import org.apache.kafka.common.TopicPartition;
import org.apache.kafka.common.serialization.ByteArraySerializer;
import org.apache.kafka.streams.CloseOptions;
import org.apache.kafka.streams.KafkaStreams;
import org.seamwatch.processors.flow.Topics;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.schemas.plan.Plan;
import org.seamwatch.schemas.record.AccountingLine;
import org.seamwatch.topology.FlowTopology;
import org.seamwatch.topology.Names;

/** One instance of the running flow. Topics must be there: see {@link TopicSetup}. */
public final class StreamsService implements AutoCloseable {

    private static final Duration CLOSE_LIMIT = Duration.ofSeconds(30);

    private final Plan plan;
    private final KafkaStreams streams;
    private final FailureRule failures = new FailureRule();
    private final CountDownLatch ended = new CountDownLatch(1);

    /** An instance that has not started. */
    public StreamsService(Watch watch) {
        plan = watch.plan();
        streams = engine(watch);
        streams.setUncaughtExceptionHandler(failures);
        streams.setStateListener((now, before) -> {
            if (now == KafkaStreams.State.ERROR || now == KafkaStreams.State.NOT_RUNNING) {
                ended.countDown();
            }
        });
    }

    private static KafkaStreams engine(Watch watch) {
        try {
            return new KafkaStreams(FlowTopology.of(watch), StreamsSettings.of(watch.plan()));
        } catch (KafkaException e) {
            throw StreamsSettings.wrong(watch.plan(), e);
        }
    }

    /** Starts the threads and returns; {@link #state} says when they run. */
    public void start() {
        streams.start();
    }

    public KafkaStreams.State state() {
        return streams.state();
    }

    /** The id under which the engine keeps offsets and state. */
    public String applicationId() {
        return ApplicationId.of(plan);
    }

    /** Full names of the topics that it reads from outside. */
    public List<String> inputTopics() {
        return Stream.of(Topics.CASE_REPORTS, Topics.ALARM_RESPONSES)
                .map(topic -> plan.topics().prefix() + topic)
                .toList();
    }

    /** Full names of the topics between its stages. */
    public List<String> topicsBetween() {
        return Stream.of(Names.REPORT_CHANGES, Names.RESPONSE_CHANGES)
                .map(changes -> applicationId() + "-" + Names.repartitionTopic(changes))
                .toList();
    }

    /** How many stream threads have died. */
    public long failures() {
        return failures.failures();
    }

    /** The engine, for metrics and queries. */
    public KafkaStreams streams() {
        return streams;
    }

    /** What became of every record read by this instance. */
    public List<AccountingLine> accounting() {
        return Accounts.read(streams);
    }

    /** A clockmaker for the input topics of the plan, not started. */
    public Clockmaker clockmaker(Clock clock) {
        Properties properties = StreamsSettings.client(plan);
        properties.put(ProducerConfig.ACKS_CONFIG, "all");
        return new Clockmaker(
                new KafkaProducer<>(properties, new ByteArraySerializer(), new ByteArraySerializer()),
                inputPartitions(),
                clock);
    }

    private List<TopicPartition> inputPartitions() {
        List<TopicPartition> partitions = new ArrayList<>();
        for (String topic : inputTopics()) {
            for (int p = 0; p < plan.topics().partitions(); p++) {
                partitions.add(new TopicPartition(topic, p));
            }
        }
        return partitions;
    }

    /** Waits until the engine has stopped, by {@link #close} or by a fault; whether it was a fault. */
    public boolean awaitEnd() throws InterruptedException {
        ended.await();
        return failures.stops();
    }

    /** Stops the threads, commits, and leaves the group at once, so that others take over in seconds. */
    @Override
    public void close() {
        streams.close(CloseOptions.groupMembershipOperation(CloseOptions.GroupMembershipOperation.LEAVE_GROUP)
                .withTimeout(CLOSE_LIMIT));
        ended.countDown();
    }
}
