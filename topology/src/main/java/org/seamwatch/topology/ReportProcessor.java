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
import org.seamwatch.processors.intake.ReportIntake;
import org.seamwatch.processors.watch.Watch;

/** Intake of one partition of {@code case-reports}. */
final class ReportProcessor implements Processor<byte[], byte[], byte[], byte[]> {

    private final Watch watch;
    private final InputSizes sizes;
    private @Nullable ProcessorContext<byte[], byte[]> context;
    private @Nullable ReportIntake intake;

    private ReportProcessor(Watch watch, InputSizes sizes) {
        this.watch = watch;
        this.sizes = sizes;
    }

    /** Supplies one processor for each task, with its stores. */
    record Supplier(Watch watch, InputSizes sizes) implements ProcessorSupplier<byte[], byte[], byte[], byte[]> {

        @Override
        public Processor<byte[], byte[], byte[], byte[]> get() {
            return new ReportProcessor(watch, sizes);
        }

        @Override
        public Set<StoreBuilder<?>> stores() {
            return FlowStores.ofReports();
        }
    }

    @Override
    public void init(ProcessorContext<byte[], byte[]> task) {
        context = task;
        intake = new ReportIntake(
                watch,
                task.taskId().partition(),
                sizes,
                FlowStores.shelf(task, Names.LEDGER),
                FlowStores.shelf(task, Names.TALLY),
                FlowStores.shelf(task, Names.REPORT_ACCOUNTS),
                new IntakeForwarder(task, Names.repartitionEntry(Names.REPORT_CHANGES), Names.REJECTED_REPORTS_SINK));
    }

    @Override
    public void process(Record<byte[], byte[]> record) {
        Inputs.ready(intake).accept(Inputs.logRecord(Topics.CASE_REPORTS, Inputs.ready(context), record));
    }
}
