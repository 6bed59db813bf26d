package org.seamwatch.ops;

import java.time.Clock;
import java.time.Duration;
import java.time.Instant;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import org.apache.kafka.clients.consumer.ConsumerRecord;
import org.apache.kafka.clients.consumer.KafkaConsumer;
import org.apache.kafka.common.TopicPartition;
import org.apache.kafka.common.serialization.ByteArrayDeserializer;
import org.seamwatch.fixtures.broker.BrokerSettings;
import org.seamwatch.fixtures.broker.Brokers;
import org.seamwatch.fixtures.broker.Drain;
import org.seamwatch.fixtures.broker.EmbeddedBroker;
import org.seamwatch.fixtures.broker.TopicTool;
import org.seamwatch.fixtures.scenario.Scenario;
import org.seamwatch.processors.flow.Topics;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.schemas.json.Json;
import org.seamwatch.schemas.plan.Plan;
import org.seamwatch.schemas.record.AccountingLine;
import org.seamwatch.schemas.record.AlarmChange;
import org.seamwatch.topology.Accounting;
import org.seamwatch.topology.service.StreamsService;
import org.seamwatch.topology.service.TopicSetup;

/** A demo's broker, service and feed. */
final class DemoRun implements AutoCloseable {

    private static final Duration LOADED_AT_ONCE = Duration.ofDays(2);
    private static final Duration DAY = Duration.ofDays(1);
    private static final Duration DAY_LASTS = Duration.ofSeconds(2);
    private static final Duration LOOK = Duration.ofMillis(200);
    private static final Duration MOST_PATIENCE = Duration.ofMinutes(10);
    private static final DateTimeFormatter DATE = DateTimeFormatter.ofPattern("EEE d MMM yyyy", Locale.ENGLISH);

    private final Console console;
    private final EmbeddedBroker broker;
    private final TopicTool topics;
    private final StreamsService service;
    private final Plan plan;
    private final DemoLog log;
    private final Drain drain;
    private final DemoState state;
    private final DemoStop stop;

    private DemoRun(
            Console console, Scenario scenario, Plans plans, EmbeddedBroker broker, DemoState state, DemoStop stop) {
        this.console = console;
        this.broker = broker;
        this.state = state;
        this.stop = stop;
        this.plan = here(plans.read().plan(), broker.bootstrapServers(), state);
        this.log = new DemoLog(scenario, plan.topics());
        this.topics = TopicTool.of(broker.bootstrapServers(), Map.of("linger.ms", 20, "batch.size", 256 * 1024));
        TopicSetup.prepare(plan).forEach(console::warn);
        this.service = new StreamsService(Watch.of(plan, plans.geographies()));
        this.drain = new Drain(
                topics,
                broker.bootstrapServers(),
                service.applicationId(),
                service.inputTopics(),
                service.topicsBetween());
    }

    /** Starts broker and service. */
    static DemoRun start(Console console, Scenario scenario, Plans plans, DemoStop stop) {
        DemoState state = DemoState.make("seamwatch-state");
        EmbeddedBroker broker = Brokers.embedded(BrokerSettings.defaults());
        console.say("A Kafka broker runs in this process at " + broker.bootstrapServers() + ".");
        DemoRun run = new DemoRun(console, scenario, plans, broker, state, stop);
        run.service.start();
        return run;
    }

    /** The plan against the embedded broker, with its state in a folder that goes with the demo. */
    private static Plan here(Plan plan, String bootstrap, DemoState state) {
        Map<String, String> kafka = new HashMap<>(plan.kafka());
        kafka.put("bootstrap.servers", bootstrap);
        kafka.put("state.dir", state.folder().toString());
        return new Plan(
                plan.file(),
                kafka,
                plan.run(),
                plan.topics(),
                plan.geographies(),
                plan.deskFalseAlarmsPerYear(),
                plan.series());
    }

    /** Runs the whole feed through. */
    void everything() throws InterruptedException {
        history(log.end().plusMillis(1));
    }

    /** Runs the feed before an instant through, and waits until the service has read it. */
    void history(Instant end) throws InterruptedException {
        long sent = 0;
        try (Progress progress = new Progress(console, "demo", "records", log.size())) {
            for (Instant to = log.start().plus(LOADED_AT_ONCE); sent < log.size(); to = to.plus(LOADED_AT_ONCE)) {
                Instant until = to.isBefore(end) ? to : end;
                sent += topics.send(log.before(until)).size();
                long read = drain.read();
                progress.now(read, read);
                if (!until.isBefore(end) || stop.isAsked()) {
                    break;
                }
            }
            awaitAll(progress);
        }
    }

    private void awaitAll(Progress progress) throws InterruptedException {
        long deadline = System.nanoTime() + MOST_PATIENCE.toNanos();
        try {
            for (stop.pause(Duration.ZERO); !drain.isEmpty(); stop.pause(LOOK)) {
                long read = drain.read();
                progress.now(read, read);
                if (service.failures() > 0 || System.nanoTime() - deadline > 0) {
                    throw new CommandFailure(
                            "the service did not read the whole feed, " + service.failures()
                                    + " of its threads have ended",
                            null);
                }
            }
        } catch (InterruptedException e) {
            progress.stopped();
            throw e;
        }
    }

    /** Plays the rest, a day every two seconds, and prints alarms as they come. */
    void play() throws InterruptedException {
        try (KafkaConsumer<byte[], byte[]> alarms = alarms()) {
            Instant next = log.next();
            console.say("");
            console.say("From here on a day takes two seconds.");
            for (; !next.isAfter(log.end()); next = next.plus(DAY)) {
                topics.send(log.before(next.plus(DAY)));
                console.say(next.atZone(ZoneOffset.UTC).format(DATE));
                print(alarms, DAY_LASTS);
            }
            print(alarms, DAY_LASTS);
        }
    }

    /** Waits to be interrupted. */
    void stayUp() throws InterruptedException {
        console.say("");
        console.say("The feed is at its end. The service stays up, with its topics at " + broker.bootstrapServers()
                + "; Ctrl-C ends the demo.");
        stop.await();
    }

    private KafkaConsumer<byte[], byte[]> alarms() {
        KafkaConsumer<byte[], byte[]> consumer = new KafkaConsumer<>(
                Map.of("bootstrap.servers", broker.bootstrapServers(), "isolation.level", "read_committed"),
                new ByteArrayDeserializer(),
                new ByteArrayDeserializer());
        consumer.assign(consumer.partitionsFor(plan.topics().prefix() + Topics.ALARMS).stream()
                .map(p -> new TopicPartition(p.topic(), p.partition()))
                .toList());
        consumer.seekToEnd(consumer.assignment());
        consumer.assignment().forEach(consumer::position);
        return consumer;
    }

    private void print(KafkaConsumer<byte[], byte[]> alarms, Duration time) throws InterruptedException {
        Clock clock = Clock.systemUTC();
        for (Instant end = clock.instant().plus(time); clock.instant().isBefore(end); ) {
            for (ConsumerRecord<byte[], byte[]> record : alarms.poll(LOOK)) {
                console.say(AlarmText.of(Json.read(record.value(), AlarmChange.class)));
            }
            stop.pause(Duration.ZERO);
        }
    }

    /** What the plan accepts for the whole desk. */
    double falseAlarmsPerYear() {
        return plan.deskFalseAlarmsPerYear();
    }

    /** What the run has left in its topics. */
    DemoResults results() {
        DemoResults results = new DemoResults(topics, plan.topics().prefix());
        results.read();
        return results;
    }

    /** What became of every record, held against what the topics hold. */
    List<AccountingLine> accounts() {
        List<AccountingLine> accounts = service.accounting();
        for (AccountingLine line : accounts) {
            String topic = plan.topics().prefix() + line.topic();
            long held = topics.endOffsets(topic).getOrDefault(line.partition(), 0L)
                    - topics.startOffsets(topic).getOrDefault(line.partition(), 0L);
            if (line.read() != held || !Accounting.balances(line)) {
                throw new CommandFailure(
                        "the accounts do not balance: " + line + ", the partition holds " + held, null);
            }
        }
        long read = accounts.stream().mapToLong(AccountingLine::read).sum();
        console.say(String.format(
                Locale.ROOT, "Everything is accounted for: %,d records read, as many as the input topics hold.", read));
        return accounts;
    }

    @Override
    public void close() {
        service.close();
        topics.close();
        broker.close();
        state.close();
    }
}
