package org.seamwatch.topology.service;

import java.nio.file.Path;
import java.util.Properties;
import java.util.Set;
import org.apache.kafka.clients.admin.AdminClientConfig;
import org.apache.kafka.clients.consumer.ConsumerConfig;
import org.apache.kafka.clients.producer.ProducerConfig;
import org.apache.kafka.common.KafkaException;
import org.apache.kafka.common.config.TopicConfig;
import org.apache.kafka.streams.StreamsConfig;
import org.apache.kafka.streams.errors.StreamsException;
import org.seamwatch.schemas.InputException;
import org.seamwatch.schemas.plan.Plan;
import org.seamwatch.topology.LogTime;

/** Engine properties: ours, then the plan's, then what the flow's guarantees rest on. */
public final class StreamsSettings {

    /** A message to the series or a rejected record with key and value of 256 KiB each, with room to spare. */
    static final int MAX_REQUEST = 4 << 20;

    private static final int SESSION_MS = 6_000;
    private static final int HEARTBEAT_MS = 1_500;
    private static final int COMMIT_MS = 200;
    private static final int SEGMENT_BYTES = 64 << 20;
    private static final int BATCH_BYTES = 128 << 10;
    private static final long CACHE_BYTES = 16L << 20;

    private static final Set<String> ENGINE_KEYS = StreamsConfig.configDef().names();
    private static final Set<String> CLIENT_KEYS = AdminClientConfig.configNames();

    private StreamsSettings() {}

    /** The properties of an engine that runs a plan. */
    public static Properties of(Plan plan) {
        Properties p = new Properties();
        p.put(StreamsConfig.STATE_DIR_CONFIG, defaultStateDir().toString());
        p.put(StreamsConfig.COMMIT_INTERVAL_MS_CONFIG, COMMIT_MS);
        p.put(StreamsConfig.STATESTORE_CACHE_MAX_BYTES_CONFIG, CACHE_BYTES);
        p.put(StreamsConfig.ROCKSDB_CONFIG_SETTER_CLASS_CONFIG, RocksSettings.class);
        // No result depends on the order between partitions, so no task waits for one.
        p.put(StreamsConfig.MAX_TASK_IDLE_MS_CONFIG, StreamsConfig.MAX_TASK_IDLE_MS_DISABLED);
        p.put(StreamsConfig.consumerPrefix(ConsumerConfig.SESSION_TIMEOUT_MS_CONFIG), SESSION_MS);
        p.put(StreamsConfig.consumerPrefix(ConsumerConfig.HEARTBEAT_INTERVAL_MS_CONFIG), HEARTBEAT_MS);
        p.put(StreamsConfig.consumerPrefix(ConsumerConfig.MAX_PARTITION_FETCH_BYTES_CONFIG), MAX_REQUEST);
        p.put(StreamsConfig.producerPrefix(ProducerConfig.MAX_REQUEST_SIZE_CONFIG), MAX_REQUEST);
        p.put(StreamsConfig.producerPrefix(ProducerConfig.COMPRESSION_TYPE_CONFIG), "lz4");
        // A batch costs its compressor's start and a place in a request, whatever its size.
        p.put(StreamsConfig.producerPrefix(ProducerConfig.BATCH_SIZE_CONFIG), BATCH_BYTES);
        p.put(StreamsConfig.ENABLE_METRICS_PUSH_CONFIG, false);
        p.putAll(plan.kafka());
        p.put(StreamsConfig.APPLICATION_ID_CONFIG, ApplicationId.of(plan));
        p.put(StreamsConfig.NUM_STREAM_THREADS_CONFIG, plan.run().threads());
        p.put(StreamsConfig.NUM_STANDBY_REPLICAS_CONFIG, plan.run().standbys());
        p.put(StreamsConfig.REPLICATION_FACTOR_CONFIG, plan.topics().replication());
        p.put(StreamsConfig.PROCESSING_GUARANTEE_CONFIG, StreamsConfig.EXACTLY_ONCE_V2);
        p.put(StreamsConfig.DEFAULT_TIMESTAMP_EXTRACTOR_CLASS_CONFIG, LogTime.class);
        // Replayed time is old, and may be ahead of a broker's clock: no internal topic may mind.
        p.put(StreamsConfig.topicPrefix(TopicConfig.RETENTION_MS_CONFIG), "-1");
        p.put(
                StreamsConfig.topicPrefix(TopicConfig.MESSAGE_TIMESTAMP_AFTER_MAX_MS_CONFIG),
                Long.toString(Long.MAX_VALUE));
        p.put(StreamsConfig.topicPrefix(TopicConfig.MESSAGE_TIMESTAMP_TYPE_CONFIG), "CreateTime");
        // Segments end by size: by their records' time, a replayed year would leave one for each week.
        p.put(StreamsConfig.topicPrefix(TopicConfig.SEGMENT_MS_CONFIG), Long.toString(Long.MAX_VALUE));
        p.put(StreamsConfig.topicPrefix(TopicConfig.SEGMENT_BYTES_CONFIG), Integer.toString(SEGMENT_BYTES));
        return p;
    }

    /** Properties for plain clients: the plan's but for what only the engine knows. */
    static Properties client(Plan plan) {
        Properties p = new Properties();
        plan.kafka().forEach((key, value) -> {
            if (CLIENT_KEYS.contains(key) || !ENGINE_KEYS.contains(key)) {
                p.put(key, value);
            }
        });
        return p;
    }

    /** What is wrong with the plan's properties, as one line. */
    static InputException wrong(Plan plan, KafkaException e) {
        Throwable cause = e;
        while (cause.getCause() instanceof KafkaException deeper) {
            cause = deeper;
        }
        return new InputException(plan.file() + ": kafka: " + cause.getMessage());
    }

    /** Whether the engine could not start because another holds its state folder; it says so in words only. */
    static boolean isFolderInUse(KafkaException e) {
        return e instanceof StreamsException
                && e.getMessage() != null
                && e.getMessage().startsWith("Unable to initialize state");
    }

    /** The folder of local state. */
    static Path stateDir(Properties settings) {
        return Path.of(String.valueOf(settings.get(StreamsConfig.STATE_DIR_CONFIG)));
    }

    private static Path defaultStateDir() {
        return Path.of(System.getProperty("user.home", "."), ".seamwatch", "state");
    }
}
