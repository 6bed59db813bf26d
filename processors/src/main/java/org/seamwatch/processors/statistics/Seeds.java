package org.seamwatch.processors.statistics;

import java.time.LocalDate;

/** Seeds from data, so that the same day of the same series is always tried with the same randomness. */
final class Seeds {

    private static final long FNV_OFFSET = 0xcbf29ce484222325L;
    private static final long FNV_PRIME = 0x100000001b3L;

    private Seeds() {}

    /** FNV-1a of the series' characters, then of the day's number. */
    static long of(String series, LocalDate day) {
        long hash = FNV_OFFSET;
        for (int i = 0; i < series.length(); i++) {
            hash = (hash ^ series.charAt(i)) * FNV_PRIME;
        }
        return (hash ^ day.toEpochDay()) * FNV_PRIME;
    }
}
