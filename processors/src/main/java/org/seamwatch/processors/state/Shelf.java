package org.seamwatch.processors.state;

import java.util.List;
import org.jspecify.annotations.Nullable;

/** Rows by key. Each value begins with a version byte of its own codec. Not for use by more than one thread. */
public interface Shelf {

    /** The row, or null. */
    byte @Nullable [] get(String key);

    /** Writes a row; the array is not touched afterwards. */
    void put(String key, byte[] value);

    /** Removes a row, if there is one. */
    void remove(String key);

    /**
     * All rows whose key begins with a prefix, in an order of the shelf's own that no result may depend on.
     *
     * @param prefix ends in an ASCII character
     */
    List<Row> rows(String prefix);

    /** Visits every row; rows may be removed during the visit. */
    void visit(RowVisitor visitor);

    /**
     * A row.
     *
     * @param key its key
     * @param value its bytes
     */
    @SuppressWarnings("ArrayRecordComponent") // handed over, never compared
    record Row(String key, byte[] value) {}

    /** Takes one row. */
    @FunctionalInterface
    interface RowVisitor {
        void row(String key, byte[] value);
    }
}
