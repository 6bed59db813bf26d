package org.seamwatch.processors.learning;

import java.time.LocalDate;

/**
 * A usable value that has not taught yet, because an alarm was open on its day.
 *
 * @param day its day
 * @param value the value
 * @param lags the values before it, as they stood on that day
 */
public record WaitingDay(LocalDate day, double value, Lags lags) {}
