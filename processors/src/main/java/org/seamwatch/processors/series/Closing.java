package org.seamwatch.processors.series;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.alarms.AlarmBook;
import org.seamwatch.processors.alarms.AlarmMove;
import org.seamwatch.processors.alarms.AlarmState;
import org.seamwatch.processors.alarms.EpisodeState;
import org.seamwatch.processors.alarms.Episodes;
import org.seamwatch.processors.evidence.EvidenceInput;
import org.seamwatch.processors.evidence.EvidenceMaker;
import org.seamwatch.processors.evidence.HistoryRow;
import org.seamwatch.processors.flow.Hours;
import org.seamwatch.processors.watch.SeriesSpec;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.schemas.record.Change;
import org.seamwatch.schemas.record.Evidence;
import org.seamwatch.schemas.record.RegionDay;
import org.seamwatch.schemas.record.SeriesDay;

/** One close of a series: days that late reports changed are judged again, then the due ones for the first time. */
final class Closing {

    private final SeriesSpec spec;
    private final CountBook counts;
    private final DayBook days;
    private final SeriesOutput out;
    private final DayJudge judge;
    private final AlarmBook alarmBook;
    private final EvidenceMaker evidence;

    Closing(Watch watch, SeriesSpec spec, CountBook counts, DayBook days, SeriesOutput out) {
        this.spec = spec;
        this.counts = counts;
        this.days = days;
        this.out = out;
        this.judge = new DayJudge(spec);
        this.alarmBook = new AlarmBook(spec.id());
        this.evidence = new EvidenceMaker(watch, spec);
    }

    /**
     * Closes all days up to one, emits what changed, and says what that does to the alarms.
     *
     * @param book the series before the close
     * @param last the last day that is due
     * @param hour the hour applied
     * @param alarms every alarm of the series
     */
    List<AlarmMove> close(SeriesBook book, LocalDate last, long hour, Collection<AlarmState> alarms) {
        LocalDate first = book.firstToJudge();
        emitLateChanges(book, first, hour);
        List<EpisodeState> episodes = new ArrayList<>();
        DayState before = first.isAfter(book.learnsFrom()) ? days.get(first.minusDays(1)) : null;
        for (LocalDate day = first; !day.isAfter(last); day = day.plusDays(1)) {
            before = judge(book, day, before, hour);
            episodes.add(before.episode());
        }
        return alarmBook.reconcile(alarms, Episodes.of(episodes), first, last);
    }

    private DayState judge(SeriesBook book, LocalDate day, @Nullable DayState before, long hour) {
        DayState known = days.get(day);
        DayState now = judge.judge(
                day, counts.total(day), () -> counts.input(day, book.begins()), before, known, book.countedAnew());
        DayCounts dayCounts = counts.get(day);
        boolean recounted = !dayCounts.stale().isEmpty();
        SeriesDay said = now.day();
        if (known == null) {
            said = said.at(0, Hours.end(hour));
        } else if (recounted || !sameDay(known.day(), said)) {
            said = said.at(known.day().revision() + 1, Hours.end(hour));
        } else {
            said = known.day();
        }
        DayState kept = new DayState(said, now.boards(), now.episode());
        days.put(day, kept);
        if (recounted) {
            emitRegions(day, dayCounts, said.revision(), hour);
        }
        if (known == null || said.revision() != known.day().revision()) {
            out.seriesDay(said, Hours.endMillis(hour));
        }
        return kept;
    }

    private static boolean sameDay(SeriesDay known, SeriesDay now) {
        return now.at(known.revision(), known.closedAt()).equals(known);
    }

    /** Days that are too old to be judged again, or were never judged: only their counts are said. */
    private void emitLateChanges(SeriesBook book, LocalDate first, long hour) {
        for (LocalDate day : book.changed()) {
            if (day.isBefore(first)) {
                DayCounts dayCounts = counts.get(day);
                if (!dayCounts.stale().isEmpty()) {
                    DayState said = days.get(day);
                    int revision = Math.max(
                            dayCounts.revision(), said == null ? -1 : said.day().revision());
                    emitRegions(day, dayCounts, revision + 1, hour);
                }
            }
        }
    }

    private void emitRegions(LocalDate day, DayCounts dayCounts, int revision, long hour) {
        for (String region : dayCounts.stale()) {
            long count = dayCounts.count(region);
            out.regionDay(new RegionDay(1, spec.id(), region, day, count, revision), Hours.endMillis(hour));
        }
        dayCounts.emitted(revision);
        counts.put(day, dayCounts);
    }

    /** The evidence of a change, from the days as they now are. */
    Evidence evidence(AlarmMove move, SeriesBook book) {
        LocalDate day = move.change() == Change.WITHDRAWN ? move.alarm().lastSignal() : move.day();
        LocalDate from = day.minusDays(EvidenceMaker.PERIOD_DAYS - 1L);
        long preliminary = 0;
        long late = 0;
        for (LocalDate d = from; !d.isAfter(day); d = d.plusDays(1)) {
            DayCounts dayCounts = counts.get(d);
            preliminary += dayCounts.preliminary();
            late += dayCounts.late();
        }
        return evidence.make(
                move,
                new EvidenceInput(
                        day,
                        counts.over(from, day),
                        counts.history(day, book.begins()),
                        preliminary,
                        late,
                        move.alarm().lastSignal().isBefore(book.learnsFrom()),
                        history(day)));
    }

    private List<HistoryRow> history(LocalDate day) {
        List<HistoryRow> rows = new ArrayList<>();
        for (LocalDate d = day.minusDays(EvidenceMaker.HISTORY_DAYS - 1L); !d.isAfter(day); d = d.plusDays(1)) {
            DayState state = days.get(d);
            if (state != null) {
                rows.add(new HistoryRow(state.day(), state.boards()));
            }
        }
        return rows;
    }
}
