package org.seamwatch.processors.series;

import java.time.LocalDate;
import java.util.SortedSet;
import java.util.TreeSet;
import org.jspecify.annotations.Nullable;

/**
 * How far a series is.
 *
 * @param hash hash of the series' plan that its states were made under
 * @param begins first day that is counted
 * @param learnsFrom first day that is judged; later than begins where the plan has changed
 * @param lastClosed last closed day; null before the first
 * @param dirtyFrom earliest closed day that must be judged again; null where none must
 * @param changed days whose counts have changed since the last close and that are closed or lie before the beginning
 * @param withoutEffect responses that named no known alarm
 */
public record SeriesBook(
        String hash,
        LocalDate begins,
        LocalDate learnsFrom,
        @Nullable LocalDate lastClosed,
        @Nullable LocalDate dirtyFrom,
        SortedSet<LocalDate> changed,
        long withoutEffect) {

    public SeriesBook {
        changed = new TreeSet<>(changed);
    }

    static SeriesBook start(String hash, LocalDate begins) {
        return new SeriesBook(hash, begins, begins, null, null, new TreeSet<>(), 0);
    }

    LocalDate nextDay() {
        return lastClosed == null ? begins : lastClosed.plusDays(1);
    }

    boolean hasClosed(LocalDate day) {
        return lastClosed != null && !day.isAfter(lastClosed);
    }

    /** Whether a day waits for no close: it has had its own, or lies before the beginning. */
    boolean isPast(LocalDate day) {
        return day.isBefore(begins) || hasClosed(day);
    }

    /** A past day has changed; it is judged again only where it can be. */
    SeriesBook changed(LocalDate day, boolean judgeAgain) {
        SortedSet<LocalDate> days = new TreeSet<>(changed);
        days.add(day);
        boolean earlier = dirtyFrom == null || day.isBefore(dirtyFrom);
        return new SeriesBook(
                hash, begins, learnsFrom, lastClosed, judgeAgain && earlier ? day : dirtyFrom, days, withoutEffect);
    }

    SeriesBook closed(LocalDate day) {
        return new SeriesBook(hash, begins, learnsFrom, day, null, new TreeSet<>(), withoutEffect);
    }

    SeriesBook oneMoreWithoutEffect() {
        return new SeriesBook(hash, begins, learnsFrom, lastClosed, dirtyFrom, changed, withoutEffect + 1);
    }

    /** Learning starts afresh with the next day, under another plan; what is counted stays. */
    SeriesBook relearning(String newHash) {
        return new SeriesBook(newHash, begins, nextDay(), lastClosed, null, changed, withoutEffect);
    }
}
