package org.seamwatch.processors.series;

import java.time.Instant;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.function.Supplier;
import org.jspecify.annotations.Nullable;
import org.seamwatch.processors.alarms.EpisodeState;
import org.seamwatch.processors.alarms.Signal;
import org.seamwatch.processors.statistics.Board;
import org.seamwatch.processors.statistics.Board.Lesson;
import org.seamwatch.processors.statistics.BoardState;
import org.seamwatch.processors.statistics.DayInput;
import org.seamwatch.processors.statistics.Judgement;
import org.seamwatch.processors.statistics.Reading;
import org.seamwatch.processors.statistics.Statistic;
import org.seamwatch.processors.watch.SeriesSpec;
import org.seamwatch.schemas.record.SeriesDay;

/** Judges one day of a series from the state of the day before. A pure function. */
final class DayJudge {

    private final SeriesSpec spec;

    DayJudge(SeriesSpec spec) {
        this.spec = spec;
    }

    private record Judged(
            Statistic statistic,
            Reading reading,
            BoardState before,
            @Nullable Judgement judgement) {

        Signal signal() {
            return new Signal(statistic.name(), judgement != null, judgement != null && judgement.signals());
        }
    }

    /**
     * The day as it is to be said and remembered, as revision 0 at the epoch.
     *
     * @param cases cases in the geography
     * @param input what statistics are computed from; asked for only where a reading is not known
     * @param before the day before, or null for the first day
     * @param known the day as judged earlier, or null
     * @param changed days whose counts have changed since then
     */
    DayState judge(
            LocalDate day,
            long cases,
            Supplier<DayInput> input,
            @Nullable DayState before,
            @Nullable DayState known,
            Collection<LocalDate> changed) {
        List<Judged> judged = new ArrayList<>();
        for (Statistic statistic : spec.statistics()) {
            Reading reading = recalled(statistic, day, known, changed);
            judged.add(judge(statistic, day, reading != null ? reading : statistic.read(input.get()), before));
        }
        EpisodeState episode = (before == null ? EpisodeState.NONE : before.episode())
                .next(day, judged.stream().map(Judged::signal).toList());
        SeriesDay record = blank(day, cases);
        SortedMap<String, BoardState> boards = new TreeMap<>();
        for (Judged each : judged) {
            record = each.statistic().on(record, each.reading(), each.judgement());
            boards.put(each.statistic().name(), settle(each, day, lesson(episode)));
        }
        return new DayState(record, boards, episode);
    }

    private static @Nullable Reading recalled(
            Statistic statistic, LocalDate day, @Nullable DayState known, Collection<LocalDate> changed) {
        if (known == null || changed.stream().anyMatch(other -> statistic.reads(day, other))) {
            return null;
        }
        return statistic.recall(known.day());
    }

    private static Judged judge(Statistic statistic, LocalDate day, Reading reading, @Nullable DayState before) {
        Board board = statistic.board();
        BoardState last = before == null ? null : before.boards().get(statistic.name());
        BoardState state = last == null ? board.start() : last;
        Judgement judgement = reading.usable() ? board.judge(state, day, reading.value()) : null;
        return new Judged(statistic, reading, state, judgement);
    }

    private static Lesson lesson(EpisodeState episode) {
        if (episode.isOpen()) {
            return Lesson.WAIT;
        }
        return episode.hasEnded() ? Lesson.WAIT_AND_RELEASE : Lesson.TEACH;
    }

    private static BoardState settle(Judged each, LocalDate day, Lesson lesson) {
        Board board = each.statistic().board();
        Judgement judgement = each.judgement();
        return judgement == null
                ? board.settle(each.before(), lesson)
                : board.settle(judgement, day, each.reading().value(), lesson);
    }

    private SeriesDay blank(LocalDate day, long cases) {
        boolean[] flags = spec.unjudged(day);
        List<String> unjudged = new ArrayList<>();
        for (int i = 0; i < flags.length; i++) {
            if (flags[i]) {
                unjudged.add(spec.regions().get(i).id());
            }
        }
        return new SeriesDay(
                1,
                spec.id(),
                day,
                0,
                Instant.EPOCH,
                cases,
                flags.length,
                spec.ground().weights().isolatedCount(),
                unjudged,
                null);
    }
}
