package org.seamwatch.topology.service;

import java.time.Clock;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Properties;
import java.util.concurrent.CountDownLatch;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.apache.kafka.clients.consumer.Consumer;
import org.apache.kafka.clients.consumer.ConsumerConfig;
import org.apache.kafka.clients.consumer.KafkaConsumer;
import org.apache.kafka.clients.producer.KafkaProducer;
import org.apache.kafka.clients.producer.ProducerConfig;
import org.apache.kafka.common.KafkaException;
import org.apache.kafka.common.TopicPartition;
import org.apache.kafka.common.serialization.ByteArrayDeserializer;
import org.apache.kafka.common.serialization.ByteArraySerializer;
import org.apache.kafka.streams.CloseOptions;
import org.apache.kafka.streams.KafkaStreams;
import org.seamwatch.processors.flow.Topics;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.schemas.InputException;
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
    private final RestoreCount restores = new RestoreCount();
    private final OpenMark mark;
    private final CountDownLatch ended = new CountDownLatch(1);

    /** An instance that has not started. */
    public StreamsService(Watch watch) {
        plan = watch.plan();
        Properties settings = StreamsSettings.of(plan);
        streams = engine(watch, settings);
        // The engine holds the lock of its folder from here on.
        mark = OpenMark.in(StreamsSettings.stateDir(settings), applicationId());
        streams.setGlobalStateRestoreListener(restores);
        streams.setUncaughtExceptionHandler(failures);
        streams.setStateListener((now, before) -> {
            if (now == KafkaStreams.State.ERROR || now == KafkaStreams.State.NOT_RUNNING) {
                ended.countDown();
            }
        });
    }

    private static KafkaStreams engine(Watch watch, Properties settings) {
        try {
            return new KafkaStreams(FlowTopology.of(watch), settings);
        } catch (KafkaException e) {
            if (StreamsSettings.isFolderInUse(e)) {
                throw new InputException(watch.plan().file() + ": kafka.state.dir: the state folder "
                        + StreamsSettings.stateDir(settings)
                        + " is in use by another process; for a second instance on one machine set"
                        + " kafka: { state.dir: ... } to another folder");
            }
            throw StreamsSettings.wrong(watch.plan(), e);
        }
    }

    /** Starts the threads and returns; {@link #state} says when they run. */
    public void start() {
        mark.set();
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

    /** Whether an earlier process left the local state open: the engine then rebuilds it from Kafka. */
    public boolean isStateLeftOpen() {
        return mark.wasSet();
    }

    /** About how many records are still to be read back into local state. */
    public long toRestore() {
        return restores.left();
    }

    /** How many records have been read back into local state since the start. */
    public long restored() {
        return restores.restored();
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

    /** Asks now and then whether the broker is there; to be closed by the caller. */
    public BrokerProbe brokerProbe() {
        return BrokerProbe.of(plan);
    }

    /** A reader of result topics that sees committed records only and belongs to no group; to be closed by the caller. */
    public Consumer<byte[], byte[]> resultReader() {
        Properties properties = StreamsSettings.client(plan);
        properties.remove(ConsumerConfig.GROUP_ID_CONFIG);
        properties.put(ConsumerConfig.ENABLE_AUTO_COMMIT_CONFIG, "false");
        properties.put(ConsumerConfig.ISOLATION_LEVEL_CONFIG, "read_committed");
        return new KafkaConsumer<>(properties, new ByteArrayDeserializer(), new ByteArrayDeserializer());
    }

    /** The partitions of alarms. */
    public List<TopicPartition> alarmPartitions() {
        return IntStream.range(0, plan.topics().seriesPartitions())
                .mapToObj(p -> new TopicPartition(plan.topics().prefix() + Topics.ALARMS, p))
                .toList();
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
        boolean done =
                streams.close(CloseOptions.groupMembershipOperation(CloseOptions.GroupMembershipOperation.LEAVE_GROUP)
                        .withTimeout(CLOSE_LIMIT));
        if (done && !failures.stops()) {
            mark.clear();
        }
        ended.countDown();
    }
}
