package org.seamwatch.topology;

import java.util.Set;
import org.apache.kafka.streams.processor.api.Processor;
import org.apache.kafka.streams.processor.api.ProcessorContext;
import org.apache.kafka.streams.processor.api.ProcessorSupplier;
import org.apache.kafka.streams.processor.api.Record;
import org.apache.kafka.streams.state.StoreBuilder;
import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.flow.InputSizes;
import org.seamwatch.processors.flow.Topics;
import org.seamwatch.processors.intake.ResponseIntake;
import org.seamwatch.processors.watch.Watch;

/** Intake of one partition of {@code alarm-responses}. */
final class ResponseProcessor implements Processor<byte[], byte[], byte[], byte[]> {

    private final Watch watch;
    private final InputSizes sizes;
    private @Nullable ProcessorContext<byte[], byte[]> context;
    private @Nullable ResponseIntake intake;

    private ResponseProcessor(Watch watch, InputSizes sizes) {
        this.watch = watch;
        this.sizes = sizes;
    }

    /** Supplies one processor for each task, with its stores. */
    record Supplier(Watch watch, InputSizes sizes) implements ProcessorSupplier<byte[], byte[], byte[], byte[]> {

        @Override
        public Processor<byte[], byte[], byte[], byte[]> get() {
            return new ResponseProcessor(watch, sizes);
        }

        @Override
        public Set<StoreBuilder<?>> stores() {
            return FlowStores.ofResponses();
        }
    }

    @Override
    public void init(ProcessorContext<byte[], byte[]> task) {
        context = task;
        intake = new ResponseIntake(
                watch,
                task.taskId().partition(),
                sizes,
                FlowStores.shelf(task, Names.RESPONSE_ACCOUNTS),
                new IntakeForwarder(
                        task, Names.repartitionEntry(Names.RESPONSE_CHANGES), Names.REJECTED_RESPONSES_SINK));
    }

    @Override
    public void process(Record<byte[], byte[]> record) {
        Inputs.ready(intake).accept(Inputs.logRecord(Topics.ALARM_RESPONSES, Inputs.ready(context), record));
    }
}
