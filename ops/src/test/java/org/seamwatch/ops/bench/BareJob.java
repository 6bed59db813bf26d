package org.seamwatch.ops.bench;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.json.JsonMapper;
import java.io.IOException;
import java.time.Duration;
import java.util.List;
import java.util.Properties;
import org.apache.kafka.common.serialization.Serdes;
import org.apache.kafka.common.utils.Bytes;
import org.apache.kafka.streams.AutoOffsetReset;
import org.apache.kafka.streams.CloseOptions;
import org.apache.kafka.streams.KafkaStreams;
import org.apache.kafka.streams.KeyValue;
import org.apache.kafka.streams.StoreQueryParameters;
import org.apache.kafka.streams.StreamsBuilder;
import org.apache.kafka.streams.StreamsConfig;
import org.apache.kafka.streams.Topology;
import org.apache.kafka.streams.kstream.Consumed;
import org.apache.kafka.streams.kstream.Grouped;
import org.apache.kafka.streams.kstream.Materialized;
import org.apache.kafka.streams.state.KeyValueIterator;
import org.apache.kafka.streams.state.KeyValueStore;
import org.apache.kafka.streams.state.QueryableStoreTypes;
import org.jspecify.annotations.Nullable;

/**
 * The measure: what the same log costs a Streams job that does nothing but count. Parse JSON, re-key to region and day,
 * count in RocksDB. It checks nothing, knows no revisions, and counts a duplicate twice.
 */
final class BareJob implements Job {

    private static final JsonMapper MAPPER = new JsonMapper();
    private static final String GROUPED = "by-region-and-day";
    private static final String COUNTS = "counts";
    private static final byte[] NOTHING = {};
    private static final Duration CLOSE_LIMIT = Duration.ofSeconds(30);

    private final String topic;
    private final String application;
    private final long counted;
    private final KafkaStreams streams;

    /**
     * A bare job.
     *
     * @param settings the engine's, with an application id of its own
     * @param counted how many records of the topic have a {@link #key}
     */
    BareJob(String topic, Properties settings, long counted) {
        this.topic = topic;
        this.application = settings.getProperty(StreamsConfig.APPLICATION_ID_CONFIG);
        this.counted = counted;
        this.streams = new KafkaStreams(topology(topic), settings);
    }

    private static Topology topology(String topic) {
        StreamsBuilder builder = new StreamsBuilder();
        builder.stream(
                        topic,
                        Consumed.with(Serdes.ByteArray(), Serdes.ByteArray())
                                .withOffsetResetPolicy(AutoOffsetReset.earliest()))
                .flatMap(BareJob::entry)
                .groupByKey(Grouped.with(GROUPED, Serdes.String(), Serdes.ByteArray()))
                .count(Materialized.<String, Long, KeyValueStore<Bytes, byte[]>>as(COUNTS)
                        .withKeySerde(Serdes.String())
                        .withValueSerde(Serdes.Long()));
        return builder.build();
    }

    private static List<KeyValue<String, byte[]>> entry(byte @Nullable [] key, byte @Nullable [] value) {
        String regionDay = key(value);
        return regionDay == null ? List.of() : List.of(new KeyValue<>(regionDay, NOTHING));
    }

    /** Region and day of a report; null where the record has none that can be read. */
    static @Nullable String key(byte @Nullable [] value) {
        if (value == null) {
            return null;
        }
        try {
            JsonNode report = MAPPER.readTree(value);
            JsonNode day = report.get("eventDate");
            return day == null ? null : report.path("region").asText() + "|" + day.asText();
        } catch (IOException e) {
            return null;
        }
    }

    @Override
    public KafkaStreams streams() {
        return streams;
    }

    @Override
    public void start() {
        streams.start();
    }

    @Override
    public List<String> inputs() {
        return List.of(topic);
    }

    @Override
    public List<String> between() {
        return List.of(application + "-" + GROUPED + "-repartition");
    }

    /** Every record must be counted, once. */
    @Override
    public void check() {
        long sum = 0;
        var store = streams.store(
                StoreQueryParameters.fromNameAndType(COUNTS, QueryableStoreTypes.<String, Long>keyValueStore()));
        try (KeyValueIterator<String, Long> rows = store.all()) {
            while (rows.hasNext()) {
                sum += rows.next().value;
            }
        }
        if (sum != counted) {
            throw new IllegalStateException("counts must sum to " + counted + ", did to " + sum);
        }
    }

    @Override
    public void close() {
        streams.close(CloseOptions.groupMembershipOperation(CloseOptions.GroupMembershipOperation.LEAVE_GROUP)
                .withTimeout(CLOSE_LIMIT));
    }
}
