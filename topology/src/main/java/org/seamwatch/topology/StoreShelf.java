package org.seamwatch.topology;

import java.util.ArrayList;
import java.util.List;
import org.apache.kafka.common.serialization.StringSerializer;
import org.apache.kafka.streams.KeyValue;
import org.apache.kafka.streams.state.KeyValueIterator;
import org.apache.kafka.streams.state.KeyValueStore;
import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.state.Shelf;

/** A shelf whose rows lie in a store with a changelog. No iterator stays open behind a call. */
final class StoreShelf implements Shelf {

    private static final StringSerializer KEYS = new StringSerializer();

    /** Rows read before they are handed out: a visit may remove rows, and must not hold a large store in memory. */
    private static final int CHUNK = 1_000;

    private final KeyValueStore<String, byte[]> store;

    StoreShelf(KeyValueStore<String, byte[]> store) {
        this.store = store;
    }

    @Override
    public byte @Nullable [] get(String key) {
        return store.get(key);
    }

    @Override
    public void put(String key, byte[] value) {
        store.put(key, value);
    }

    @Override
    public void remove(String key) {
        store.delete(key);
    }

    @Override
    public List<Row> rows(String prefix) {
        try (KeyValueIterator<String, byte[]> found = store.prefixScan(prefix, KEYS)) {
            return read(found, Integer.MAX_VALUE);
        }
    }

    @Override
    public void visit(RowVisitor visitor) {
        List<Row> rows = chunk(null);
        while (!rows.isEmpty()) {
            rows.forEach(row -> visitor.row(row.key(), row.value()));
            rows = chunk(rows.get(rows.size() - 1).key());
        }
    }

    /** The next rows after a key, from the first for null. No key has a zero character at its end. */
    private List<Row> chunk(@Nullable String after) {
        try (KeyValueIterator<String, byte[]> found = from(after)) {
            return read(found, CHUNK);
        }
    }

    @SuppressWarnings("NullAway") // an open end of a range is null in the store's interface
    private KeyValueIterator<String, byte[]> from(@Nullable String after) {
        return after == null ? store.all() : store.range(after + '\0', null);
    }

    private static List<Row> read(KeyValueIterator<String, byte[]> from, int most) {
        List<Row> rows = new ArrayList<>();
        while (rows.size() < most && from.hasNext()) {
            KeyValue<String, byte[]> row = from.next();
            rows.add(new Row(row.key, row.value));
        }
        return rows;
    }
}
