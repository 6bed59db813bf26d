package org.seamwatch.processors.flow;

import java.time.LocalDate;
import java.util.SortedMap;
import java.util.TreeMap;
import org.seamwatch.schemas.record.AlarmResponse;

/** What intake says to the series stage. */
public sealed interface SeriesMessage {

    /**
     * What one input partition changed in one day of a series within one hour.
     *
     * @param series id of the series
     * @param hour hour of the partition's time, in hours since 1970-01-01T00Z
     * @param partition partition of {@code case-reports}
     * @param day day of the series
     * @param cells change by region id
     */
    record DayChange(String series, long hour, int partition, LocalDate day, SortedMap<String, Cases> cells)
            implements SeriesMessage {

        public DayChange {
            cells = new TreeMap<>(cells);
        }
    }

    /**
     * A response, in its hour.
     *
     * @param series id of the series
     * @param hour hour of the partition's time
     * @param partition partition of {@code alarm-responses}
     * @param offset offset in it
     * @param response the response
     */
    record Response(String series, long hour, int partition, long offset, AlarmResponse response)
            implements SeriesMessage {}

    /**
     * The promise of an input partition that it has passed an hour.
     *
     * @param topic input topic, without prefix
     * @param partition its partition
     * @param passedHour the last hour passed
     * @param firstTimestamp timestamp of the partition's first record, milliseconds since 1970-01-01T00Z
     * @param sizes how many partitions each input topic has
     */
    record Watermark(String topic, int partition, long passedHour, long firstTimestamp, InputSizes sizes)
            implements SeriesMessage {}
}
