package org.seamwatch.processors.series;

import java.time.Instant;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.alarms.AlarmMove;
import org.seamwatch.processors.alarms.AlarmState;
import org.seamwatch.processors.flow.Hours;
import org.seamwatch.processors.flow.SeriesMessage.DayChange;
import org.seamwatch.processors.flow.SeriesMessage.Response;
import org.seamwatch.processors.state.Shelf;
import org.seamwatch.processors.state.VersionedJson;
import org.seamwatch.processors.watch.SeriesSpec;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.schemas.record.AlarmChange;
import org.seamwatch.schemas.record.Change;
import org.seamwatch.schemas.record.Evidence;

/** Keeps one series: applies an hour's changes, then closes the days that are due. */
final class SeriesKeeper {

    private static final int VERSION = 1;

    /** An alarm that is over can be answered for so many days. */
    private static final int ANSWERABLE_DAYS = 400;

    private final SeriesSpec spec;
    private final Shelf books;
    private final SeriesOutput out;
    private final CountBook counts;
    private final DayBook days;
    private final AlarmShelf alarms;
    private final Closing closing;
    private SeriesBook book;
    private long nextClose;

    private SeriesKeeper(Watch watch, SeriesSpec spec, SeriesShelves shelves, SeriesOutput out, SeriesBook book) {
        this.spec = spec;
        this.books = shelves.books();
        this.out = out;
        this.counts = new CountBook(spec, shelves.counts());
        this.days = new DayBook(spec.id(), shelves.days());
        this.alarms = new AlarmShelf(spec.id(), shelves.books());
        this.closing = new Closing(watch, spec, counts, days, out);
        this.book = book;
        this.nextClose = closesAt(book.nextDay());
    }

    /**
     * Takes a series up where it was left, or begins it.
     *
     * @param logStart the first timestamp of the log
     */
    static SeriesKeeper open(Watch watch, SeriesSpec spec, SeriesShelves shelves, SeriesOutput out, Instant logStart) {
        byte @Nullable [] row = shelves.books().get(bookKey(spec));
        SeriesBook book;
        if (row == null) {
            LocalDate from = spec.plan().from();
            LocalDate start = logStart.atZone(spec.zone())
                    .toLocalDate()
                    .minusDays(spec.plan().reviseForDays());
            book = SeriesBook.start(spec.hash(), from == null ? start : from);
        } else {
            book = VersionedJson.read(row, VERSION, SeriesBook.class);
            if (!book.hash().equals(spec.hash())) {
                book = book.relearning(spec.hash());
            }
        }
        return new SeriesKeeper(watch, spec, shelves, out, book);
    }

    private static String bookKey(SeriesSpec spec) {
        return spec.id() + "|book";
    }

    void apply(DayChange change) {
        LocalDate day = change.day();
        boolean past = book.isPast(day);
        boolean changed = counts.add(day, change.cells(), past);
        if (past && changed) {
            LocalDate today = Hours.end(change.hour() - 1).atZone(spec.zone()).toLocalDate();
            boolean young = !day.isBefore(today.minusDays(spec.plan().reviseForDays()));
            book = book.changed(day, young);
        }
    }

    void apply(Response response) {
        AlarmShelf.Kept kept = alarms.get(response.response().alarm());
        if (kept == null) {
            book = book.oneMoreWithoutEffect();
            return;
        }
        AlarmState answered = kept.state().answered(response.response());
        alarms.put(answered, kept.evidence());
        LocalDate day = book.lastClosed() == null ? answered.newestDay() : book.lastClosed();
        send(answered, Change.RESPONDED, day, kept.evidence(), response.hour());
    }

    /** Closes the days that are due at the end of an hour; whether there were any. */
    boolean close(long hour) {
        LocalDate last = lastDue(hour);
        if (last == null) {
            return false;
        }
        for (AlarmMove move : closing.close(book, last, hour, alarms.states())) {
            follow(move, hour);
        }
        forget(last);
        book = book.closed(book.firstToJudge(), last, last.minusDays(spec.keepDays()));
        nextClose = closesAt(book.nextDay());
        counts.rest();
        return true;
    }

    /** Writes down how far the series is. */
    void save() {
        books.put(bookKey(spec), VersionedJson.row(VERSION, book));
    }

    private @Nullable LocalDate lastDue(long hour) {
        if (nextClose > hour) {
            return null;
        }
        LocalDate last = book.nextDay();
        while (closesAt(last.plusDays(1)) <= hour) {
            last = last.plusDays(1);
        }
        return last;
    }

    private long closesAt(LocalDate day) {
        return Hours.endingAtOrAfter(day.plusDays(1L + spec.plan().closeAfterDays())
                .atStartOfDay(spec.zone())
                .toInstant());
    }

    private void follow(AlarmMove move, long hour) {
        Change change = move.change();
        AlarmShelf.Kept kept = alarms.get(move.alarm().id());
        if (change == null) {
            if (kept != null) {
                alarms.put(move.alarm(), kept.evidence());
            }
            return;
        }
        Evidence evidence = closing.evidence(move, book);
        alarms.put(move.alarm(), evidence);
        send(move.alarm(), change, move.day(), evidence, hour);
    }

    private void send(AlarmState alarm, Change change, LocalDate day, Evidence evidence, long hour) {
        out.alarm(
                new AlarmChange(
                        1,
                        alarm.id(),
                        spec.id(),
                        spec.geography().id(),
                        spec.condition(),
                        change,
                        alarm.sequence(),
                        day,
                        alarm.statistics(),
                        alarm.response(),
                        evidence),
                Hours.endMillis(hour));
    }

    private void forget(LocalDate closed) {
        for (LocalDate day = book.nextDay(); !day.isAfter(closed); day = day.plusDays(1)) {
            counts.remove(day.minusDays(spec.keepDays()));
            days.remove(day.minusDays(spec.keepDays()));
        }
        List<AlarmState> old = new ArrayList<>(alarms.states());
        old.removeIf(a -> a.isOpen() || !a.newestDay().isBefore(closed.minusDays(ANSWERABLE_DAYS)));
        old.forEach(a -> alarms.remove(a.id()));
    }
}
