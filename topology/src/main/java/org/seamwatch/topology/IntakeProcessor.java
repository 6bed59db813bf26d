package org.seamwatch.topology;

import java.util.Set;
import java.util.function.Function;
import org.apache.kafka.streams.processor.api.Processor;
import org.apache.kafka.streams.processor.api.ProcessorContext;
import org.apache.kafka.streams.processor.api.ProcessorSupplier;
import org.apache.kafka.streams.processor.api.Record;
import org.apache.kafka.streams.state.StoreBuilder;
import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.flow.InputSizes;
import org.seamwatch.processors.flow.Topics;
import org.seamwatch.processors.intake.Intake;
import org.seamwatch.processors.intake.ReportIntake;
import org.seamwatch.processors.intake.ResponseIntake;
import org.seamwatch.processors.watch.Watch;

/** Intake of one partition of an input topic. */
final class IntakeProcessor implements Processor<byte[], byte[], byte[], byte[]> {

    private final Supplier supplier;
    private @Nullable ProcessorContext<byte[], byte[]> context;
    private @Nullable Intake intake;

    private IntakeProcessor(Supplier supplier) {
        this.supplier = supplier;
    }

    /**
     * Supplies one processor for each task.
     *
     * @param topic input topic, without prefix
     * @param stores of a task
     * @param intake of a task
     */
    record Supplier(
            String topic, Set<StoreBuilder<?>> stores, Function<ProcessorContext<byte[], byte[]>, Intake> intake)
            implements ProcessorSupplier<byte[], byte[], byte[], byte[]> {

        @Override
        public Processor<byte[], byte[], byte[], byte[]> get() {
            return new IntakeProcessor(this);
        }
    }

    /** For {@code case-reports}. */
    static Supplier ofReports(Watch watch, InputSizes sizes) {
        return new Supplier(
                Topics.CASE_REPORTS,
                FlowStores.ofReports(),
                task -> new ReportIntake(
                        watch,
                        task.taskId().partition(),
                        sizes,
                        FlowStores.shelf(task, Names.LEDGER),
                        FlowStores.shelf(task, Names.TALLY),
                        FlowStores.shelf(task, Names.REPORT_ACCOUNTS),
                        new IntakeForwarder(
                                task, Names.repartitionEntry(Names.REPORT_CHANGES), Names.REJECTED_REPORTS_SINK)));
    }

    /** For {@code alarm-responses}. */
    static Supplier ofResponses(Watch watch, InputSizes sizes) {
        return new Supplier(
                Topics.ALARM_RESPONSES,
                FlowStores.ofResponses(),
                task -> new ResponseIntake(
                        watch,
                        task.taskId().partition(),
                        sizes,
                        FlowStores.shelf(task, Names.RESPONSE_ACCOUNTS),
                        new IntakeForwarder(
                                task, Names.repartitionEntry(Names.RESPONSE_CHANGES), Names.REJECTED_RESPONSES_SINK)));
    }

    @Override
    public void init(ProcessorContext<byte[], byte[]> task) {
        context = task;
        intake = supplier.intake().apply(task);
    }

    @Override
    public void process(Record<byte[], byte[]> record) {
        Inputs.ready(intake).accept(Inputs.logRecord(supplier.topic(), Inputs.ready(context), record));
    }
}
