package org.seamwatch.schemas.record;

import java.time.LocalDate;

/**
 * A stretch of days.
 *
 * @param from first day
 * @param to last day
 * @param dateBasis {@code report} or {@code event}: which date of a report makes its day
 */
public record Period(LocalDate from, LocalDate to, String dateBasis) {}
