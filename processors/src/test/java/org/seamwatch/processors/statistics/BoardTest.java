package org.seamwatch.processors.statistics;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.seamwatch.processors.charts.EwmaChart;
import org.seamwatch.processors.charts.IndividualsChart;
import org.seamwatch.processors.learning.Learner;
import org.seamwatch.processors.statistics.Board.Lesson;
import org.seamwatch.schemas.plan.Sides;
import org.seamwatch.schemas.record.ChartDay;
import org.seamwatch.schemas.record.Grade;

class BoardTest {

    private static final LocalDate FIRST = LocalDate.of(2024, 2, 1);

    private final Board board = new Board(
            Learner.of(1), List.of(new EwmaChart(0.2, Sides.UPPER, 0.9), IndividualsChart.of(Sides.UPPER, 1.5)), 8);

    private static double value(int n) {
        return Math.floorMod(n * 7, 5) + 0.1 * Math.floorMod(n * 3, 7);
    }

    private BoardState taught(int days) {
        BoardState state = board.start();
        for (int n = 0; n < days; n++) {
            LocalDate day = FIRST.plusDays(n);
            state = board.settle(board.judge(state, day, value(n)), day, value(n), Lesson.TEACH);
        }
        return state;
    }

    @Test
    void shouldGradeLearningUntilEnoughDaysHaveTaught() {
        for (int n = 0; n < 12; n++) {
            Judgement judgement = board.judge(taught(n), FIRST.plusDays(n), 400);
            assertThat(judgement.learning().days()).isEqualTo(n);
            assertThat(judgement.grade() == Grade.LEARNING).isEqualTo(n < 8);
            assertThat(judgement.signals()).isEqualTo(n >= 8);
        }
    }

    @Test
    void shouldLeaveChartsWhereTheyAreWithoutAScore() {
        Judgement judgement = board.judge(taught(2), FIRST.plusDays(2), 400);

        assertThat(judgement.learning().score()).isNull();
        assertThat(judgement.charts()).extracting(ChartDay::value).containsExactly(0.0, 0.0);
        assertThat(judgement.moved().charts()).isEqualTo(board.start().charts());
    }

    @Test
    void shouldSayEachChartWithItsLimits() {
        Judgement judgement = board.judge(taught(20), FIRST.plusDays(20), value(20));

        assertThat(judgement.charts()).extracting(ChartDay::chart).containsExactly("ewma", "individuals");
        ChartDay ewma = judgement.charts().get(0);
        assertThat(ewma.action().upper()).isEqualTo(0.9);
        assertThat(ewma.warning().upper()).isEqualTo(0.9 * (2.0 / 3));
        assertThat(ewma.action().lower()).isNull();
    }

    @Test
    void shouldTellWhenAChangeBegan() {
        BoardState state = taught(20);
        LocalDate began = null;
        for (int n = 20; n < 23; n++) {
            LocalDate day = FIRST.plusDays(n);
            Judgement judgement = board.judge(state, day, 9);
            state = board.settle(judgement, day, 9, Lesson.WAIT);
            began = state.charts().get(0).began();
        }
        assertThat(began).isBetween(FIRST.plusDays(14), FIRST.plusDays(20));
        assertThat(state.charts().get(0).state().runDays())
                .isEqualTo((int) (FIRST.plusDays(22).toEpochDay() - (began == null ? 0 : began.toEpochDay()) + 1));
    }

    @Test
    void shouldTeachOnlyWhatDoesNotWait() {
        BoardState state = taught(10);
        LocalDate day = FIRST.plusDays(10);
        Judgement judgement = board.judge(state, day, 3);

        assertThat(board.settle(judgement, day, 3, Lesson.TEACH).learning().days())
                .isEqualTo(11);
        BoardState waits = board.settle(judgement, day, 3, Lesson.WAIT);
        assertThat(waits.learning().days()).isEqualTo(10);
        assertThat(waits.learning().waiting()).hasSize(1);
        BoardState released = board.settle(judgement, day, 3, Lesson.WAIT_AND_RELEASE);
        assertThat(released.learning().days()).isEqualTo(11);
        assertThat(released.learning().waiting()).isEmpty();
        assertThat(board.settle(waits, Lesson.WAIT)).isEqualTo(waits);
        assertThat(board.settle(waits, Lesson.WAIT_AND_RELEASE).learning().days())
                .isEqualTo(11);
    }
}
