package org.seamwatch.topology;

import java.util.Set;
import org.apache.kafka.streams.processor.api.Processor;
import org.apache.kafka.streams.processor.api.ProcessorContext;
import org.apache.kafka.streams.processor.api.ProcessorSupplier;
import org.apache.kafka.streams.processor.api.Record;
import org.apache.kafka.streams.state.StoreBuilder;
import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.flow.SeriesMessageCodec;
import org.seamwatch.processors.series.SeriesShelves;
import org.seamwatch.processors.series.SeriesStage;
import org.seamwatch.processors.watch.Watch;

/** One partition of the series stage. */
final class SeriesProcessor implements Processor<byte[], byte[], byte[], byte[]> {

    private final Watch watch;
    private final int partitions;
    private @Nullable SeriesStage stage;

    private SeriesProcessor(Watch watch, int partitions) {
        this.watch = watch;
        this.partitions = partitions;
    }

    /** Supplies one processor for each task, with its stores. */
    record Supplier(Watch watch, int partitions) implements ProcessorSupplier<byte[], byte[], byte[], byte[]> {

        @Override
        public Processor<byte[], byte[], byte[], byte[]> get() {
            return new SeriesProcessor(watch, partitions);
        }

        @Override
        public Set<StoreBuilder<?>> stores() {
            return FlowStores.ofSeries();
        }
    }

    @Override
    public void init(ProcessorContext<byte[], byte[]> task) {
        int partition = task.taskId().partition();
        SeriesShelves shelves = new SeriesShelves(
                FlowStores.shelf(task, Names.PROGRESS),
                FlowStores.shelf(task, Names.PENDING),
                FlowStores.shelf(task, Names.COUNTS),
                FlowStores.shelf(task, Names.DAYS),
                FlowStores.shelf(task, Names.BOOKS));
        stage = new SeriesStage(
                watch, id -> SeriesPartition.of(id, partitions) == partition, shelves, new SeriesForwarder(task));
    }

    @Override
    public void process(Record<byte[], byte[]> record) {
        Inputs.ready(stage).accept(SeriesMessageCodec.read(record.value()));
    }
}
