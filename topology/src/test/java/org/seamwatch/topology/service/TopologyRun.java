package org.seamwatch.topology.service;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import org.apache.kafka.clients.producer.ProducerRecord;
import org.awaitility.Awaitility;
import org.seamwatch.fixtures.broker.Drain;
import org.seamwatch.fixtures.broker.KafkaBroker;
import org.seamwatch.fixtures.broker.TopicTool;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.topology.TestPlan;

/**
 * A log in fresh topics and the instances of the service that read it. Instances differ in their state folder; one
 * that is started again under the same name finds the state it left.
 */
public final class TopologyRun implements AutoCloseable {

    private static final Duration LIMIT = Duration.ofMinutes(3);

    private final KafkaBroker broker;
    private final TopicTool tool;
    private final Path folder;
    private final TestPlan plan;
    private final String prefix;
    private final List<StreamsService> running = new ArrayList<>();

    private TopologyRun(KafkaBroker broker, TopicTool tool, Path folder, String name, TestPlan plan) {
        this.broker = broker;
        this.tool = tool;
        this.folder = folder;
        this.prefix = name + ".";
        this.plan = plan.kafka("bootstrap.servers", broker.bootstrapServers()).prefix(prefix);
    }

    /**
     * A run in topics of its own.
     *
     * @param name prefix of its topics, unique on the broker
     * @param plan its shape: partitions, threads
     */
    public static TopologyRun of(KafkaBroker broker, TopicTool tool, Path folder, String name, TestPlan plan) {
        TopologyRun run = new TopologyRun(broker, tool, folder, name, plan);
        assertThat(TopicSetup.prepare(run.plan.plan())).isEmpty();
        return run;
    }

    /** Writes lines to their partitions under their timestamps. */
    public TopologyRun load(List<LogLine> lines) {
        tool.send(lines.stream()
                .map(line -> new ProducerRecord<>(
                        prefix + line.topic(), line.partition(), line.timestamp(), line.key(), line.value()))
                .toList());
        return this;
    }

    /** Starts an instance over the state folder of this name. */
    public StreamsService start(String instance) {
        Watch watch = plan.kafka("state.dir", folder.resolve(prefix + instance)).watch();
        StreamsService service = new StreamsService(watch);
        running.add(service);
        service.start();
        return service;
    }

    /** Stops an instance as its clean end does. */
    public void stop(StreamsService service) {
        running.remove(service);
        service.close();
    }

    /** The folder with the state of an instance. */
    public Path state(String instance) {
        return folder.resolve(prefix + instance);
    }

    /** Waits until everything in the log is read and applied. */
    public TopologyRun awaitEnd() {
        Drain drain = drain();
        Awaitility.await("the end of " + prefix)
                .atMost(LIMIT)
                .pollInterval(Duration.ofMillis(100))
                .until(() -> {
                    assertThat(running).allMatch(service -> service.failures() == 0);
                    return drain.isEmpty();
                });
        return this;
    }

    /** Waits until so many input records are read. */
    public void awaitRead(long records) {
        Drain drain = drain();
        Awaitility.await(records + " records of " + prefix)
                .atMost(LIMIT)
                .pollInterval(Duration.ofMillis(20))
                .until(() -> drain.read() >= records);
    }

    /** What the run has said so far. */
    public Outputs outputs() {
        return Outputs.read(tool, prefix);
    }

    public String prefix() {
        return prefix;
    }

    private Drain drain() {
        StreamsService any = running.get(0);
        return new Drain(tool, broker.bootstrapServers(), any.applicationId(), any.inputTopics(), any.topicsBetween());
    }

    @Override
    public void close() {
        List.copyOf(running).forEach(this::stop);
    }
}
