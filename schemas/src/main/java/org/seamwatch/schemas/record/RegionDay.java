package org.seamwatch.schemas.record;

import java.time.LocalDate;

/**
 * The cases of one region on one day of a series, {@code region-day/1}.
 *
 * @param version version of the contract, 1
 * @param series id of the series
 * @param region id of the region
 * @param day the day
 * @param count cases
 * @param revision that of its series-day, one more for each late change beyond the time of revision
 */
public record RegionDay(int version, String series, String region, LocalDate day, long count, int revision) {

    /** The key of the record. */
    public String key() {
        return series + "|" + region + "|" + day;
    }
}
