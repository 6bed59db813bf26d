package org.seamwatch.processors.statistics;

import org.seamwatch.schemas.record.StatisticStatus;

/** The value of a statistic on a day, before anything is learned from it. */
public interface Reading {

    /** Whether the day can be used. */
    StatisticStatus status();

    /** The statistic; not to be asked for where the status is not usable. */
    double value();

    /** Whether the status is usable. */
    default boolean usable() {
        return status() == StatisticStatus.USABLE;
    }
}
