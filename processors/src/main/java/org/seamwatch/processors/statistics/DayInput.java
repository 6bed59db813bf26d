package org.seamwatch.processors.statistics;

import java.time.LocalDate;

/**
 * What a statistic of a day is computed from. Arrays are in the order of the geography's regions, and not to be changed.
 *
 * @param day the day
 * @param cases cases of each region in the window that ends on the day
 * @param history cases of each region on the days {@link #HISTORY_FROM} to {@link #HISTORY_TO} before the day
 * @param historyDays how many of those days the series has
 * @param unjudged regions that cannot be judged on the day
 */
@SuppressWarnings("ArrayRecordComponent") // handed over, never compared
public record DayInput(LocalDate day, double[] cases, double[] history, int historyDays, boolean[] unjudged) {

    /** The oldest day of the history, in days before the day. */
    public static final int HISTORY_FROM = 69;

    /** The newest day of the history, in days before the day. */
    public static final int HISTORY_TO = 14;

    /** With fewer days than this the history says nothing of shares. */
    public static final int LEAST_HISTORY = 14;
}
