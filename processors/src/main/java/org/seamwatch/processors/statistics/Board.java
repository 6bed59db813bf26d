package org.seamwatch.processors.statistics;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.seamwatch.processors.charts.Chart;
import org.seamwatch.processors.learning.Learner;
import org.seamwatch.processors.learning.LearningState;
import org.seamwatch.schemas.record.ChartDay;
import org.seamwatch.schemas.record.Grade;
import org.seamwatch.schemas.record.LearningDay;

/** Learning and charts of one statistic. First a value is judged, then, once the alarm is known, it teaches or waits. */
public final class Board {

    /** What becomes of a day's value after it was judged. */
    public enum Lesson {
        /** It teaches. */
        TEACH,
        /** It waits: an alarm is open. */
        WAIT,
        /** It waits, and as the alarm ends on this day, what waited teaches or stays out. */
        WAIT_AND_RELEASE
    }

    private final Learner learner;
    private final List<Chart> charts;
    private final int warmUpDays;

    /**
     * A board.
     *
     * @param warmUpDays days that must have taught before a chart is judged
     */
    public Board(Learner learner, List<Chart> charts, int warmUpDays) {
        this.learner = learner;
        this.charts = List.copyOf(charts);
        this.warmUpDays = warmUpDays;
    }

    public List<Chart> charts() {
        return charts;
    }

    /** The state before the first day. */
    public BoardState start() {
        return new BoardState(
                learner.start(),
                charts.stream().map(c -> new ChartPlace(c.start(), null)).toList());
    }

    /** Scores a usable value and moves the charts on. Without a score yet, the charts stay where they are. */
    public Judgement judge(BoardState before, LocalDate day, double value) {
        OptionalDouble score = learner.score(before.learning(), value);
        int days = before.learning().days();
        if (score.isEmpty()) {
            return new Judgement(new LearningDay(days, null), places(before.charts(), false), before);
        }
        List<ChartPlace> moved = new ArrayList<>(charts.size());
        for (int i = 0; i < charts.size(); i++) {
            ChartPlace place = before.charts().get(i);
            moved.add(place.moved(charts.get(i).next(place.state(), score.getAsDouble()), day));
        }
        return new Judgement(
                new LearningDay(days, score.getAsDouble()),
                places(moved, days >= warmUpDays),
                new BoardState(before.learning(), moved));
    }

    private List<ChartDay> places(List<ChartPlace> places, boolean judged) {
        List<ChartDay> days = new ArrayList<>(charts.size());
        for (int i = 0; i < charts.size(); i++) {
            Chart chart = charts.get(i);
            var state = places.get(i).state();
            Grade grade = judged ? chart.grade(state) : Grade.LEARNING;
            days.add(new ChartDay(chart.name(), chart.value(state), chart.warning(), chart.action(), grade));
        }
        return days;
    }

    /** Lets a judged value teach, or wait. */
    public BoardState settle(Judgement judgement, LocalDate day, double value, Lesson lesson) {
        LearningState learning = judgement.moved().learning();
        LearningState next =
                lesson == Lesson.TEACH ? learner.teach(learning, day, value) : learner.hold(learning, day, value);
        return new BoardState(released(next, lesson), judgement.moved().charts());
    }

    /** The same for a day without a usable value: only the end of an alarm changes anything. */
    public BoardState settle(BoardState before, Lesson lesson) {
        return new BoardState(released(before.learning(), lesson), before.charts());
    }

    private LearningState released(LearningState state, Lesson lesson) {
        return lesson == Lesson.WAIT_AND_RELEASE ? learner.release(state) : state;
    }
}
