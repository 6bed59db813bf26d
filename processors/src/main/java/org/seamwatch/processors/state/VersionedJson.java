package org.seamwatch.processors.state;

import java.util.Arrays;
import org.seamwatch.schemas.json.Json;

/** Rows that are records: a version byte, then the record as JSON. */
public final class VersionedJson {

    private VersionedJson() {}

    /** The row of a record. */
    public static byte[] row(int version, Object value) {
        byte[] json = Json.bytes(value);
        byte[] row = new byte[json.length + 1];
        row[0] = (byte) version;
        System.arraycopy(json, 0, row, 1, json.length);
        return row;
    }

    /** The record of a row. */
    public static <T> T read(byte[] row, int version, Class<T> type) {
        if (row.length == 0 || row[0] != version) {
            throw new IllegalArgumentException("row version of " + type.getSimpleName() + " must be " + version
                    + ", was " + (row.length == 0 ? "absent" : row[0]));
        }
        return Json.read(Arrays.copyOfRange(row, 1, row.length), type);
    }
}
