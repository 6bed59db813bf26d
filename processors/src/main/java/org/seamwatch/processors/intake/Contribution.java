package org.seamwatch.processors.intake;

import java.time.LocalDate;

/**
 * Where a report counts.
 *
 * @param series id of the series
 * @param day its day there
 */
record Contribution(String series, LocalDate day) {}
