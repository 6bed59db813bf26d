package org.seamwatch.topology;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Properties;
import org.apache.kafka.common.serialization.Serdes;
import org.apache.kafka.streams.processor.api.MockProcessorContext;
import org.apache.kafka.streams.state.KeyValueBytesStoreSupplier;
import org.apache.kafka.streams.state.KeyValueStore;
import org.apache.kafka.streams.state.Stores;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.seamwatch.processors.state.MemoryShelf;
import org.seamwatch.processors.state.Shelf;

class StoreShelfTest {

    private static final int ROWS = 2_500;

    private static KeyValueStore<String, byte[]> store(boolean persistent, Path folder) {
        KeyValueBytesStoreSupplier supplier =
                persistent ? Stores.persistentKeyValueStore("rows") : Stores.inMemoryKeyValueStore("rows");
        KeyValueStore<String, byte[]> store = Stores.keyValueStoreBuilder(supplier, Serdes.String(), Serdes.ByteArray())
                .withLoggingDisabled()
                .build();
        MockProcessorContext<Void, Void> context = new MockProcessorContext<>(
                new Properties(), new org.apache.kafka.streams.processor.TaskId(0, 0), folder.toFile());
        store.init(context.getStateStoreContext(), store);
        return store;
    }

    @ParameterizedTest(name = "on disk: {0}")
    @ValueSource(booleans = {true, false})
    void shouldBehaveAsAShelfInMemory(boolean persistent, @TempDir Path folder) {
        KeyValueStore<String, byte[]> store = store(persistent, folder);
        Shelf shelf = new StoreShelf(store);
        Shelf memory = new MemoryShelf();
        for (Shelf each : List.of(shelf, memory)) {
            for (String key : List.of("a|1", "a|10", "a|2", "a", "ab|1", "b|1", "a|é")) {
                each.put(key, key.getBytes(StandardCharsets.UTF_8));
            }
            each.remove("a|2");
            each.remove("none");
        }
        assertThat(shelf.get("a|10")).isEqualTo(memory.get("a|10"));
        assertThat(shelf.get("a|2")).isNull();
        assertThat(keys(shelf.rows("a|"))).isEqualTo(keys(memory.rows("a|"))).containsExactly("a|1", "a|10", "a|é");
        assertThat(shelf.rows("c|")).isEmpty();
        store.close();
    }

    @ParameterizedTest(name = "on disk: {0}")
    @ValueSource(booleans = {true, false})
    void shouldVisitEveryRowOnceWhileRowsAreRemoved(boolean persistent, @TempDir Path folder) {
        KeyValueStore<String, byte[]> store = store(persistent, folder);
        Shelf shelf = new StoreShelf(store);
        for (int i = 0; i < ROWS; i++) {
            shelf.put(String.format("%05d", i), new byte[] {(byte) i});
        }
        List<String> seen = new ArrayList<>();
        shelf.visit((key, value) -> {
            seen.add(key);
            if (seen.size() % 2 == 0) {
                shelf.remove(key);
            }
        });
        assertThat(seen).hasSize(ROWS).isSorted().doesNotHaveDuplicates();
        assertThat(shelf.rows("0")).hasSize(ROWS / 2);
        store.close();
    }

    private static List<String> keys(List<Shelf.Row> rows) {
        return rows.stream().map(Shelf.Row::key).toList();
    }
}
