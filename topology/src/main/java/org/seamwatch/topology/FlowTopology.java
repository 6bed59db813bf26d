package org.seamwatch.topology;

import org.apache.kafka.common.serialization.ByteArraySerializer;
import org.apache.kafka.common.serialization.Serdes;
import org.apache.kafka.streams.AutoOffsetReset;
import org.apache.kafka.streams.StreamsBuilder;
import org.apache.kafka.streams.Topology;
import org.apache.kafka.streams.kstream.Consumed;
import org.apache.kafka.streams.kstream.KStream;
import org.apache.kafka.streams.kstream.Named;
import org.apache.kafka.streams.kstream.Repartitioned;
import org.apache.kafka.streams.processor.StreamPartitioner;
import org.apache.kafka.streams.processor.api.ProcessorSupplier;
import org.seamwatch.processors.flow.InputSizes;
import org.seamwatch.processors.flow.Topics;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.schemas.plan.TopicsPlan;

/**
 * The flow as the engine runs it: intake of each input in a sub-topology of its own, one task for each input
 * partition, then the series stage, one task for each partition of series. The topics between are the engine's own
 * repartition topics, because it deletes what it has read from them.
 */
public final class FlowTopology {

    private final Watch watch;
    private final TopicsPlan topics;
    private final InputSizes sizes;

    private FlowTopology(Watch watch) {
        this.watch = watch;
        this.topics = watch.plan().topics();
        this.sizes = new InputSizes(topics.partitions(), topics.partitions());
    }

    /** The topology of a plan. */
    public static Topology of(Watch watch) {
        return new FlowTopology(watch).build();
    }

    private Topology build() {
        StreamsBuilder builder = new StreamsBuilder();
        KStream<byte[], byte[]> reports = changes(
                source(builder, Topics.CASE_REPORTS, Names.REPORTS),
                IntakeProcessor.ofReports(watch, sizes),
                Names.REPORT_INTAKE,
                Names.REPORT_CHANGES);
        KStream<byte[], byte[]> responses = changes(
                source(builder, Topics.ALARM_RESPONSES, Names.RESPONSES),
                IntakeProcessor.ofResponses(watch, sizes),
                Names.RESPONSE_INTAKE,
                Names.RESPONSE_CHANGES);
        reports.merge(responses, Named.as(Names.SERIES_INPUT))
                .process(new SeriesProcessor.Supplier(watch, topics.seriesPartitions()), Named.as(Names.SERIES));
        Topology topology = builder.build();
        sink(
                topology,
                Names.REJECTED_REPORTS_SINK,
                Topics.REJECTED_REPORTS,
                new RejectedPartitioner(),
                Names.REPORT_INTAKE);
        sink(
                topology,
                Names.REJECTED_RESPONSES_SINK,
                Topics.REJECTED_REPORTS,
                new RejectedPartitioner(),
                Names.RESPONSE_INTAKE);
        sink(topology, Names.REGION_DAYS_SINK, Topics.REGION_DAYS, new ResultPartitioner(), Names.SERIES);
        sink(topology, Names.SERIES_DAYS_SINK, Topics.SERIES_DAYS, new ResultPartitioner(), Names.SERIES);
        sink(topology, Names.ALARMS_SINK, Topics.ALARMS, new ResultPartitioner(), Names.SERIES);
        return topology;
    }

    private KStream<byte[], byte[]> source(StreamsBuilder builder, String topic, String name) {
        return builder.stream(
                topics.prefix() + topic,
                Consumed.with(Serdes.ByteArray(), Serdes.ByteArray())
                        .withName(name)
                        .withTimestampExtractor(new LogTime())
                        .withOffsetResetPolicy(AutoOffsetReset.earliest()));
    }

    private KStream<byte[], byte[]> changes(
            KStream<byte[], byte[]> source,
            ProcessorSupplier<byte[], byte[], byte[], byte[]> intake,
            String intakeName,
            String changesName) {
        return source.process(intake, Named.as(intakeName))
                .repartition(Repartitioned.<byte[], byte[]>as(changesName)
                        .withKeySerde(Serdes.ByteArray())
                        .withValueSerde(Serdes.ByteArray())
                        .withNumberOfPartitions(topics.seriesPartitions())
                        .withStreamPartitioner(new ChangesPartitioner()));
    }

    private void sink(
            Topology topology,
            String name,
            String topic,
            StreamPartitioner<byte[], byte[]> partitioner,
            String parent) {
        topology.addSink(
                name,
                topics.prefix() + topic,
                new ByteArraySerializer(),
                new ByteArraySerializer(),
                partitioner,
                parent);
    }
}
