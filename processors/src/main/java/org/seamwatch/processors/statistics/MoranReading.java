package org.seamwatch.processors.statistics;

import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.spatial.Moran;
import org.seamwatch.schemas.record.StatisticStatus;

/**
 * Moran's I of a day.
 *
 * @param status whether the day can be used
 * @param moran I and its moments; null where the status is not usable
 * @param permutations random relabellings, or null for none
 * @param pUpper their pseudo p on the upper side, or null for none
 */
record MoranReading(
        StatisticStatus status,
        @Nullable Moran moran,
        @Nullable Integer permutations,
        @Nullable Double pUpper) implements Reading {

    static MoranReading without(StatisticStatus status) {
        return new MoranReading(status, null, null, null);
    }

    @Override
    public double value() {
        if (moran == null) {
            throw new IllegalStateException("Moran's I must be usable, was " + status);
        }
        return moran.i();
    }
}
