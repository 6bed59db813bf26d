package org.seamwatch.processors.series;

import java.time.LocalDate;
import java.util.SortedSet;
import java.util.TreeSet;
import org.jspecify.annotations.Nullable;

/**
 * How far a series is.
 *
 * @param hash hash of what the series learned from when its states were made
 * @param begins first day that is counted
 * @param learnsFrom first day that is judged; later than begins where the plan has changed
 * @param lastClosed last closed day; null before the first
 * @param dirtyFrom earliest closed day that must be judged again; null where none must
 * @param changed days whose counts have changed since the last close and that are closed or lie before the beginning
 * @param unread days whose counts have changed without all closed days that read them being judged again
 * @param withoutEffect responses that named no known alarm
 */
public record SeriesBook(
        String hash,
        LocalDate begins,
        LocalDate learnsFrom,
        @Nullable LocalDate lastClosed,
        @Nullable LocalDate dirtyFrom,
        SortedSet<LocalDate> changed,
        SortedSet<LocalDate> unread,
        long withoutEffect) {

    public SeriesBook {
        changed = new TreeSet<>(changed);
        unread = new TreeSet<>(unread);
    }

    static SeriesBook start(String hash, LocalDate begins) {
        return new SeriesBook(hash, begins, begins, null, null, new TreeSet<>(), new TreeSet<>(), 0);
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

    /**
     * A past day has changed.
     *
     * @param young whether days are judged again for it: from itself on, or from the first that can be
     */
    SeriesBook changed(LocalDate day, boolean young) {
        SortedSet<LocalDate> days = new TreeSet<>(changed);
        days.add(day);
        LocalDate again = day.isBefore(learnsFrom) ? learnsFrom : day;
        boolean earlier = dirtyFrom == null || again.isBefore(dirtyFrom);
        LocalDate from = young && hasClosed(again) && earlier ? again : dirtyFrom;
        return new SeriesBook(hash, begins, learnsFrom, lastClosed, from, days, unread, withoutEffect);
    }

    /** Days whose counts may not be what readings of closed days were computed from. */
    SortedSet<LocalDate> countedAnew() {
        SortedSet<LocalDate> days = new TreeSet<>(unread);
        days.addAll(changed);
        return days;
    }

    /**
     * The series after a close.
     *
     * @param first first day that was judged, or judged again
     * @param last last closed day
     * @param oldest no day that may still be judged again reads a day before this one
     */
    SeriesBook closed(LocalDate first, LocalDate last, LocalDate oldest) {
        SortedSet<LocalDate> left = countedAnew();
        left.removeIf(day -> !day.isBefore(first) || day.isBefore(oldest));
        return new SeriesBook(hash, begins, learnsFrom, last, null, new TreeSet<>(), left, withoutEffect);
    }

    /** The first day that the next close judges. */
    LocalDate firstToJudge() {
        return dirtyFrom == null ? nextDay() : dirtyFrom;
    }

    SeriesBook oneMoreWithoutEffect() {
        return new SeriesBook(hash, begins, learnsFrom, lastClosed, dirtyFrom, changed, unread, withoutEffect + 1);
    }

    /** Learning starts afresh with the next day, under another plan; what is counted stays. */
    SeriesBook relearning(String newHash) {
        return new SeriesBook(newHash, begins, nextDay(), lastClosed, null, changed, unread, withoutEffect);
    }
}
