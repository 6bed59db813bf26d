package org.seamwatch.processors.flow;

import java.time.Instant;

/** Hours of the log's time, numbered from 1970-01-01T00Z. */
public final class Hours {

    private static final long MILLIS = 3_600_000L;

    private Hours() {}

    /** The hour that contains a timestamp in milliseconds. */
    public static long of(long timestamp) {
        return Math.floorDiv(timestamp, MILLIS);
    }

    /** The end of an hour, in milliseconds. */
    public static long endMillis(long hour) {
        return (hour + 1) * MILLIS;
    }

    /** The end of an hour. */
    public static Instant end(long hour) {
        return Instant.ofEpochMilli(endMillis(hour));
    }

    /** The first hour that ends at or after an instant. */
    public static long endingAtOrAfter(Instant instant) {
        return Math.floorDiv(instant.toEpochMilli() - 1, MILLIS);
    }
}
