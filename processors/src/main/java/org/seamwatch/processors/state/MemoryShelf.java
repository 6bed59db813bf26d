package org.seamwatch.processors.state;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.jspecify.annotations.Nullable;

/** Rows in memory, for replays. */
public final class MemoryShelf implements Shelf {

    private final TreeMap<String, byte[]> rows = new TreeMap<>();

    @Override
    public byte @Nullable [] get(String key) {
        return rows.get(key);
    }

    @Override
    public void put(String key, byte[] value) {
        rows.put(key, value);
    }

    @Override
    public void remove(String key) {
        rows.remove(key);
    }

    @Override
    public List<Row> rows(String prefix) {
        List<Row> found = new ArrayList<>();
        for (Map.Entry<String, byte[]> e : rows.tailMap(prefix, true).entrySet()) {
            if (!e.getKey().startsWith(prefix)) {
                break;
            }
            found.add(new Row(e.getKey(), e.getValue()));
        }
        return found;
    }

    @Override
    public void visit(RowVisitor visitor) {
        // A copy: entries of the map itself change under the visitor when rows are removed.
        rows("").forEach(row -> visitor.row(row.key(), row.value()));
    }

    /** How many rows there are. */
    public int size() {
        return rows.size();
    }
}
