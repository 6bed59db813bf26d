package org.seamwatch.ops;

import java.time.Duration;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import java.util.concurrent.atomic.AtomicReference;
import java.util.stream.Collectors;
import org.apache.kafka.clients.admin.Admin;
import org.apache.kafka.clients.admin.AdminClientConfig;
import org.apache.kafka.clients.admin.OffsetSpec;
import org.apache.kafka.clients.admin.TopicDescription;
import org.apache.kafka.clients.producer.KafkaProducer;
import org.apache.kafka.clients.producer.Producer;
import org.apache.kafka.clients.producer.ProducerConfig;
import org.apache.kafka.clients.producer.ProducerRecord;
import org.apache.kafka.clients.producer.RecordMetadata;
import org.apache.kafka.common.KafkaException;
import org.apache.kafka.common.TopicPartition;
import org.apache.kafka.common.errors.UnknownTopicOrPartitionException;
import org.apache.kafka.common.serialization.ByteArraySerializer;
import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.flow.Topics;
import org.seamwatch.schemas.InputException;
import org.seamwatch.schemas.plan.Plan;

/** The topic of case reports, to be written to. */
final class ReportTopic implements AutoCloseable {

    private static final long PATIENCE_SECONDS = 15;
    private static final String PRODUCER = "producer.";

    private final String topic;
    private final String where;
    private final Admin admin;
    private final Producer<byte[], byte[]> producer;
    private final TopicDescription description;
    private final AtomicReference<@Nullable Exception> failure = new AtomicReference<>();

    private ReportTopic(
            String topic, String where, Admin admin, Producer<byte[], byte[]> producer, TopicDescription description) {
        this.topic = topic;
        this.where = where;
        this.admin = admin;
        this.producer = producer;
        this.description = description;
    }

    /** Connects; fails where Kafka does not answer or has no such topic. */
    static ReportTopic open(Plan plan) {
        String topic = plan.topics().prefix() + Topics.CASE_REPORTS;
        String where = String.valueOf(plan.kafka().get("bootstrap.servers"));
        Admin admin;
        try {
            admin = Admin.create(chosen(plan.kafka(), AdminClientConfig.configNames()));
        } catch (KafkaException e) {
            throw new InputException(plan.file() + ": kafka: " + reason(e));
        }
        try {
            TopicDescription description = describe(admin, topic, where);
            return new ReportTopic(topic, where, admin, new KafkaProducer<>(producer(plan)), description);
        } catch (RuntimeException e) {
            admin.close(Duration.ZERO);
            throw e;
        }
    }

    private static TopicDescription describe(Admin admin, String topic, String where) {
        try {
            return admin.describeTopics(List.of(topic))
                    .allTopicNames()
                    .get(PATIENCE_SECONDS, TimeUnit.SECONDS)
                    .values()
                    .iterator()
                    .next();
        } catch (ExecutionException e) {
            if (e.getCause() instanceof UnknownTopicOrPartitionException) {
                throw new CommandFailure("no topic " + topic + " at " + where + ": it has been deleted just now", e);
            }
            throw new CommandFailure("Kafka at " + where + " cannot be used: " + reason(e), e);
        } catch (TimeoutException e) {
            throw new CommandFailure(
                    "Kafka at " + where + " does not answer within " + PATIENCE_SECONDS + " seconds", e);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new CommandFailure("interrupted", e);
        }
    }

    /** Settings that a client knows; a plan may hold Streams' own beside them. */
    private static Map<String, Object> chosen(Map<String, String> kafka, Set<String> known) {
        Map<String, Object> properties = new HashMap<>();
        kafka.forEach((key, value) -> {
            if (known.contains(key)) {
                properties.put(key, value);
            }
        });
        return properties;
    }

    private static Map<String, Object> producer(Plan plan) {
        Map<String, Object> properties = new HashMap<>();
        properties.put(ProducerConfig.LINGER_MS_CONFIG, "20");
        properties.putAll(chosen(plan.kafka(), ProducerConfig.configNames()));
        plan.kafka().forEach((key, value) -> {
            if (key.startsWith(PRODUCER)) {
                properties.put(key.substring(PRODUCER.length()), value);
            }
        });
        properties.put(ProducerConfig.ACKS_CONFIG, "all");
        properties.put(ProducerConfig.ENABLE_IDEMPOTENCE_CONFIG, "true");
        properties.put(ProducerConfig.KEY_SERIALIZER_CLASS_CONFIG, ByteArraySerializer.class.getName());
        properties.put(ProducerConfig.VALUE_SERIALIZER_CLASS_CONFIG, ByteArraySerializer.class.getName());
        return properties;
    }

    /** The greatest timestamp in the topic, milliseconds since 1970-01-01T00Z; -1 where it is empty. */
    long greatestTimestamp() {
        Map<TopicPartition, OffsetSpec> wanted = description.partitions().stream()
                .collect(Collectors.toMap(
                        p -> new TopicPartition(topic, p.partition()), p -> OffsetSpec.maxTimestamp()));
        try {
            return admin.listOffsets(wanted).all().get(PATIENCE_SECONDS, TimeUnit.SECONDS).values().stream()
                    .mapToLong(found -> found.timestamp())
                    .max()
                    .orElse(-1);
        } catch (ExecutionException | TimeoutException e) {
            throw new CommandFailure("offsets of " + topic + " at " + where + " cannot be read: " + reason(e), e);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new CommandFailure("interrupted", e);
        }
    }

    /** Sends a record; a failure shows with the next call. */
    void send(byte[] key, byte[] value, long timestamp) {
        check();
        try {
            // A failure comes through the callback; nobody waits for the future.
            var unused = producer.send(new ProducerRecord<>(topic, null, timestamp, key, value), this::sent);
        } catch (KafkaException e) {
            throw notSent(e);
        }
    }

    private void sent(@Nullable RecordMetadata record, @Nullable Exception e) {
        if (e != null) {
            failure.compareAndSet(null, e);
        }
    }

    /** Waits until everything sent has been acknowledged. */
    void flush() {
        producer.flush();
        check();
    }

    private void check() {
        Exception failed = failure.get();
        if (failed != null) {
            throw notSent(failed);
        }
    }

    private CommandFailure notSent(Exception e) {
        return new CommandFailure("a report could not be sent to " + topic + " at " + where + ": " + reason(e), e);
    }

    private static String reason(Throwable e) {
        Throwable cause = e;
        while (cause.getCause() != null) {
            cause = cause.getCause();
        }
        return cause.getMessage() == null ? cause.getClass().getSimpleName() : cause.getMessage();
    }

    @Override
    public void close() {
        producer.close();
        admin.close();
    }
}
