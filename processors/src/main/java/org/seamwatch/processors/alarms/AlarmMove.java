package org.seamwatch.processors.alarms;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;
import org.seamwatch.schemas.record.Change;

/**
 * A change of an alarm.
 *
 * @param alarm the alarm after it
 * @param change what is said of it; null where revised days moved it and nothing is to be said
 * @param day the day of the series it belongs to
 */
public record AlarmMove(AlarmState alarm, @Nullable Change change, LocalDate day) {}
