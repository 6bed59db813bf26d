package org.seamwatch.topology;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.apache.kafka.common.serialization.Serdes;
import org.apache.kafka.streams.processor.api.ProcessorContext;
import org.apache.kafka.streams.state.KeyValueBytesStoreSupplier;
import org.apache.kafka.streams.state.KeyValueStore;
import org.apache.kafka.streams.state.StoreBuilder;
import org.apache.kafka.streams.state.Stores;
import org.seamwatch.processors.state.Shelf;

/**
 * The stores of each processor. Few rows that change with every record lie in memory behind the cache, so that their
 * changelog gets one row a commit; what grows lies in RocksDB.
 */
final class FlowStores {

    private FlowStores() {}

    static Set<StoreBuilder<?>> ofReports() {
        return set(onDisk(Names.LEDGER), inMemory(Names.TALLY), inMemory(Names.REPORT_ACCOUNTS));
    }

    static Set<StoreBuilder<?>> ofResponses() {
        return set(inMemory(Names.RESPONSE_ACCOUNTS));
    }

    static Set<StoreBuilder<?>> ofSeries() {
        return set(
                inMemory(Names.PROGRESS),
                onDisk(Names.PENDING),
                onDisk(Names.COUNTS),
                onDisk(Names.DAYS),
                onDisk(Names.BOOKS));
    }

    /** In an order of its own, so that the topology's description is the same in every run. */
    private static Set<StoreBuilder<?>> set(StoreBuilder<?>... stores) {
        return new LinkedHashSet<>(List.of(stores));
    }

    static Shelf shelf(ProcessorContext<?, ?> context, String store) {
        KeyValueStore<String, byte[]> rows = context.getStateStore(store);
        return new StoreShelf(rows);
    }

    private static StoreBuilder<?> onDisk(String name) {
        return store(Stores.persistentKeyValueStore(name)).withCachingDisabled();
    }

    private static StoreBuilder<?> inMemory(String name) {
        return store(Stores.inMemoryKeyValueStore(name)).withCachingEnabled();
    }

    private static StoreBuilder<KeyValueStore<String, byte[]>> store(KeyValueBytesStoreSupplier supplier) {
        return Stores.keyValueStoreBuilder(supplier, Serdes.String(), Serdes.ByteArray())
                .withLoggingEnabled(Map.of());
    }
}
