package org.seamwatch.processors.intake;

import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneId;
import java.time.zone.ZoneOffsetTransition;
import java.time.zone.ZoneRules;
import java.util.HashMap;
import java.util.Map;

/** The local date of instants in some zones. Remembers each zone's last day, which most instants asked for lie in. */
final class LocalDays {

    private static final long DAY_MILLIS = 86_400_000;

    /** A time in which a zone has one date and one offset: clocks put back at midnight give a date twice. */
    private record Day(LocalDate date, long start, long end) {

        static Day of(long millis, ZoneId zone) {
            Instant instant = Instant.ofEpochMilli(millis);
            ZoneRules rules = zone.getRules();
            long offset = rules.getOffset(instant).getTotalSeconds() * 1_000L;
            long day = Math.floorDiv(millis + offset, DAY_MILLIS);
            long start = day * DAY_MILLIS - offset;
            long end = start + DAY_MILLIS;
            ZoneOffsetTransition before = rules.previousTransition(instant.plusMillis(1));
            ZoneOffsetTransition after = rules.nextTransition(instant);
            return new Day(
                    LocalDate.ofEpochDay(day),
                    before == null ? start : Math.max(start, before.getInstant().toEpochMilli()),
                    after == null ? end : Math.min(end, after.getInstant().toEpochMilli()));
        }

        boolean holds(long millis) {
            return start <= millis && millis < end;
        }
    }

    private final Map<ZoneId, Day> last = new HashMap<>();

    /** The date in a zone at a time in milliseconds since 1970-01-01T00Z. */
    LocalDate at(long millis, ZoneId zone) {
        Day day = last.get(zone);
        if (day == null || !day.holds(millis)) {
            day = Day.of(millis, zone);
            last.put(zone, day);
        }
        return day.date();
    }
}
