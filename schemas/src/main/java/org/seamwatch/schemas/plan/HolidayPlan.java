package org.seamwatch.schemas.plan;

import java.time.LocalDate;

/**
 * A holiday.
 *
 * @param day the day
 * @param regions whose holiday: ids with {@code *} for any characters, commas between patterns
 */
public record HolidayPlan(LocalDate day, String regions) {}
