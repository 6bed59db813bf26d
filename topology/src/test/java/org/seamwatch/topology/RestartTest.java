package org.seamwatch.topology;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Instant;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Properties;
import java.util.Set;
import org.apache.kafka.common.serialization.Serdes;
import org.apache.kafka.streams.processor.StateStore;
import org.apache.kafka.streams.processor.TaskId;
import org.apache.kafka.streams.processor.api.MockProcessorContext;
import org.apache.kafka.streams.processor.api.Processor;
import org.apache.kafka.streams.processor.api.Record;
import org.apache.kafka.streams.state.KeyValueStore;
import org.apache.kafka.streams.state.StoreBuilder;
import org.apache.kafka.streams.state.Stores;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seamwatch.fixtures.scenario.ClockRecords;
import org.seamwatch.processors.flow.InputSizes;
import org.seamwatch.processors.watch.Watch;

/** A processor made anew over the stores of an earlier one says what the earlier one would have said. */
class RestartTest {

    private final Watch watch;
    private final Path folder;

    RestartTest(@TempDir Path folder) {
        this.folder = folder;
        this.watch = TestPlan.in(folder).watch();
    }

    /** One task: a processor over stores that outlive it, one record after the other. */
    private final class Task {

        private final Map<String, KeyValueStore<String, byte[]>> stores = new HashMap<>();
        private final List<String> said = new ArrayList<>();
        private long offset;

        private Task(Set<StoreBuilder<?>> builders) {
            for (StoreBuilder<?> builder : builders) {
                KeyValueStore<String, byte[]> store = Stores.keyValueStoreBuilder(
                                Stores.inMemoryKeyValueStore(builder.name()), Serdes.String(), Serdes.ByteArray())
                        .withLoggingDisabled()
                        .build();
                stores.put(builder.name(), store);
            }
        }

        /** Runs records through a processor of their own. */
        private List<Record<byte[], byte[]>> run(
                Processor<byte[], byte[], byte[], byte[]> processor, List<Record<byte[], byte[]>> records) {
            MockProcessorContext<byte[], byte[]> context =
                    new MockProcessorContext<>(new Properties(), new TaskId(0, 0), folder.toFile());
            stores.values().forEach(store -> open(store, context));
            processor.init(context);
            for (Record<byte[], byte[]> record : records) {
                context.setRecordMetadata("case-reports", 0, offset++);
                processor.process(record);
            }
            List<Record<byte[], byte[]>> forwarded = new ArrayList<>();
            context.forwarded().forEach(each -> {
                said.add(each.childName() + " " + text(each.record()));
                forwarded.add(new Record<>(
                        each.record().key(),
                        each.record().value(),
                        each.record().timestamp()));
            });
            return forwarded;
        }

        private void open(StateStore store, MockProcessorContext<byte[], byte[]> context) {
            if (!store.isOpen()) {
                store.init(context.getStateStoreContext(), store);
            }
            context.addStateStore(store);
        }
    }

    private static String text(Record<? extends byte[], ? extends byte[]> record) {
        return new String(record.key(), StandardCharsets.ISO_8859_1) + " "
                + new String(record.value(), StandardCharsets.ISO_8859_1) + " " + record.timestamp();
    }

    private static List<Record<byte[], byte[]>> records() {
        List<Record<byte[], byte[]>> records = new ArrayList<>();
        for (int hour = 0; hour < 24 * 12; hour++) {
            Instant at = Instant.parse("2024-02-01T00:00:00Z").plusSeconds(hour * 3_600L);
            records.add(record(ClockRecords.KEY, new String(ClockRecords.value(), StandardCharsets.UTF_8), at));
            // Every report comes again 50 hours later with one case more: its day may be closed by then.
            String day = at.toString().substring(0, 10);
            records.add(record("r" + hour, FlowDriver.json("r" + hour, at.toString(), day, 0, 1), at));
            if (hour >= 50) {
                String first = at.minusSeconds(50 * 3_600L).toString().substring(0, 10);
                String id = "r" + (hour - 50);
                records.add(record(id, FlowDriver.json(id, at.toString(), first, 1, 2), at.plusSeconds(1)));
            }
        }
        return records;
    }

    private static Record<byte[], byte[]> record(String key, String value, Instant at) {
        return new Record<>(
                key.getBytes(StandardCharsets.UTF_8), value.getBytes(StandardCharsets.UTF_8), at.toEpochMilli());
    }

    private static <T> List<List<T>> parts(List<T> all, int size) {
        List<List<T>> parts = new ArrayList<>();
        for (int from = 0; from < all.size(); from += size) {
            parts.add(all.subList(from, Math.min(all.size(), from + size)));
        }
        return parts;
    }

    @Test
    void shouldTakeUpIntakeWhereItWasLeft() {
        IntakeProcessor.Supplier supplier = IntakeProcessor.ofReports(watch, new InputSizes(1, 1));
        Task whole = new Task(supplier.stores());
        whole.run(supplier.get(), records());
        Task parted = new Task(supplier.stores());
        parts(records(), 37).forEach(part -> parted.run(supplier.get(), part));
        assertThat(parted.said).hasSizeGreaterThan(24 * 12).isEqualTo(whole.said);
    }

    @Test
    void shouldTakeUpTheSeriesWhereTheyWereLeft() {
        IntakeProcessor.Supplier intake = IntakeProcessor.ofReports(watch, new InputSizes(1, 1));
        List<Record<byte[], byte[]>> messages = new Task(intake.stores()).run(intake.get(), records());
        IntakeProcessor.Supplier responses = IntakeProcessor.ofResponses(watch, new InputSizes(1, 1));
        List<Record<byte[], byte[]>> marks = new Task(responses.stores()).run(responses.get(), clocks());
        List<Record<byte[], byte[]>> both = new ArrayList<>(messages);
        both.addAll(marks);

        SeriesProcessor.Supplier supplier = new SeriesProcessor.Supplier(watch, 1);
        Task whole = new Task(supplier.stores());
        whole.run(supplier.get(), both);
        Task parted = new Task(supplier.stores());
        parts(both, 23).forEach(part -> parted.run(supplier.get(), part));
        assertThat(whole.said).anyMatch(line -> line.contains("\"revision\":1")).hasSizeGreaterThan(30);
        assertThat(parted.said).isEqualTo(whole.said);
    }

    private static List<Record<byte[], byte[]>> clocks() {
        return records().stream()
                .filter(r -> new String(r.key(), StandardCharsets.UTF_8).equals(ClockRecords.KEY))
                .toList();
    }
}
