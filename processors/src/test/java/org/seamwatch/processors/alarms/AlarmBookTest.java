package org.seamwatch.processors.alarms;

import static org.assertj.core.api.Assertions.assertThat;
import static org.seamwatch.schemas.record.Change.ENDED;
import static org.seamwatch.schemas.record.Change.OVERDUE;
import static org.seamwatch.schemas.record.Change.RAISED;
import static org.seamwatch.schemas.record.Change.STRENGTHENED;
import static org.seamwatch.schemas.record.Change.WITHDRAWN;

import java.time.Instant;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.seamwatch.schemas.record.AlarmResponse;
import org.seamwatch.schemas.record.Verdict;

class AlarmBookTest {

    private static final LocalDate FIRST = LocalDate.of(2024, 2, 1);

    private final AlarmBook book = new AlarmBook("g/c");
    private final SortedMap<String, AlarmState> alarms = new TreeMap<>();
    private final List<String> said = new ArrayList<>();

    private static LocalDate day(int n) {
        return FIRST.plusDays(n - 1L);
    }

    private static Episode open(int start, int lastSignal, String... statistics) {
        return episode(start, lastSignal, null, statistics);
    }

    private static Episode ended(int start, int lastSignal, int end, String... statistics) {
        return episode(start, lastSignal, end, statistics);
    }

    private static Episode episode(int start, int lastSignal, @Nullable Integer end, String... statistics) {
        return new Episode(
                day(start),
                day(lastSignal),
                end == null ? null : day(end),
                statistics.length == 0 ? List.of("moran") : List.of(statistics));
    }

    /** Reconciles, keeps the states, and notes each change as {@code change id sequence day}. */
    private void close(int from, int closed, Episode... episodes) {
        Collection<AlarmState> known = List.copyOf(alarms.values());
        for (AlarmMove move : book.reconcile(known, List.of(episodes), day(from), day(closed))) {
            alarms.put(move.alarm().id(), move.alarm());
            if (move.change() != null) {
                said.add(move.change() + " " + move.alarm().id().substring(4) + " "
                        + move.alarm().sequence() + " " + move.day());
            }
        }
    }

    private AlarmState alarm(String id) {
        AlarmState state = alarms.get("g/c/" + id);
        if (state == null) {
            throw new AssertionError("no alarm " + id + " among " + alarms.keySet());
        }
        return state;
    }

    @Test
    void shouldRaiseStrengthenAndEnd() {
        close(3, 3, open(3, 3));
        close(4, 4, open(3, 4));
        close(5, 5, open(3, 5, "moran", "total"));
        close(12, 12, ended(3, 5, 12, "moran", "total"));
        close(13, 13);

        assertThat(said)
                .containsExactly(
                        RAISED + " 2024-02-03 1 2024-02-03",
                        STRENGTHENED + " 2024-02-03 2 2024-02-05",
                        ENDED + " 2024-02-03 3 2024-02-12");
        assertThat(alarm("2024-02-03").statistics()).containsExactly("moran", "total");
        assertThat(alarm("2024-02-03").isOpen()).isFalse();
    }

    @Test
    void shouldFollowASignalWithoutSayingSo() {
        close(3, 3, open(3, 3));
        close(4, 4, open(3, 4));

        assertThat(said).hasSize(1);
        assertThat(alarm("2024-02-03").lastSignal()).isEqualTo(day(4));
        assertThat(alarm("2024-02-03").sequence()).isEqualTo(1);
    }

    @Test
    void shouldRaiseAndEndInOneCloseWhenDaysAreCaughtUp() {
        close(1, 20, ended(3, 4, 11));

        assertThat(said).containsExactly(RAISED + " 2024-02-03 1 2024-02-04", ENDED + " 2024-02-03 2 2024-02-11");
    }

    @Test
    void shouldBeOverdueOnceAfterFiftySixDaysOpen() {
        close(3, 3, open(3, 3));
        close(58, 58, open(3, 58));
        assertThat(said).hasSize(1);
        close(59, 59, open(3, 59));
        close(60, 60, open(3, 60));

        assertThat(said).hasSize(2).last().isEqualTo(OVERDUE + " 2024-02-03 2 " + day(59));
    }

    @Test
    void shouldNotBeOverdueWhenAVerdictWasGiven() {
        close(3, 3, open(3, 3));
        AlarmState answered = alarm("2024-02-03").answered(response(Verdict.OUTBREAK));
        alarms.put(answered.id(), answered);
        close(70, 70, open(3, 70));

        assertThat(said).hasSize(1);
    }

    @Test
    void shouldBeOverdueWhenSomeoneOnlyLooksAtIt() {
        close(3, 3, open(3, 3));
        AlarmState answered = alarm("2024-02-03").answered(response(Verdict.UNDER_INVESTIGATION));
        alarms.put(answered.id(), answered);
        close(70, 70, open(3, 70));

        assertThat(said).hasSize(2).last().isEqualTo(OVERDUE + " 2024-02-03 3 " + day(70));
    }

    private static AlarmResponse response(Verdict verdict) {
        return new AlarmResponse(1, "g/c/2024-02-03", verdict, null, null, "M. Holm", Instant.EPOCH, null);
    }

    @Test
    void shouldWithdrawWhenRevisedDaysHaveNoSignalLeft() {
        close(3, 3, open(3, 3));
        close(2, 5);

        assertThat(said).last().isEqualTo(WITHDRAWN + " 2024-02-03 2 2024-02-05");
        assertThat(alarm("2024-02-03").withdrawn()).isTrue();
        close(6, 6);
        assertThat(said).hasSize(2);
    }

    @Test
    void shouldWithdrawAnEndedAlarmWhoseEpisodeIsGone() {
        close(1, 10, ended(3, 3, 10));
        close(2, 12);

        assertThat(said).last().isEqualTo(WITHDRAWN + " 2024-02-03 3 2024-02-12");
    }

    @Test
    void shouldLeaveAloneWhatEndedBeforeTheFirstDayJudgedAgain() {
        close(1, 10, ended(3, 3, 10));
        close(11, 12);

        assertThat(said).hasSize(2);
        assertThat(alarm("2024-02-03").withdrawn()).isFalse();
    }

    @Test
    void shouldGoOnWithItsSequenceWhenRaisedAgain() {
        close(3, 3, open(3, 3));
        close(2, 5);
        close(2, 6, open(3, 4));

        assertThat(said)
                .containsExactly(
                        RAISED + " 2024-02-03 1 2024-02-03",
                        WITHDRAWN + " 2024-02-03 2 2024-02-05",
                        RAISED + " 2024-02-03 3 2024-02-04");
        assertThat(alarms).hasSize(1);
        assertThat(alarm("2024-02-03").isOpen()).isTrue();
    }

    @Test
    void shouldRaiseAgainWhenRevisedDaysTakeItsEndAway() {
        close(1, 10, ended(3, 3, 10));
        close(5, 11, open(3, 6));

        assertThat(said).last().isEqualTo(RAISED + " 2024-02-03 3 2024-02-06");
    }

    @Test
    void shouldKeepTheEarliestIdWhenTwoBecomeOne() {
        close(1, 10, ended(3, 3, 10));
        close(11, 12, open(12, 12));
        close(5, 13, open(3, 12));

        assertThat(said)
                .containsExactly(
                        RAISED + " 2024-02-03 1 2024-02-03",
                        ENDED + " 2024-02-03 2 2024-02-10",
                        RAISED + " 2024-02-12 1 2024-02-12",
                        RAISED + " 2024-02-03 3 2024-02-12",
                        WITHDRAWN + " 2024-02-12 2 2024-02-13");
    }

    @Test
    void shouldRaiseASecondAlarmWhenOneFallsInTwo() {
        close(1, 14, open(3, 12));
        close(2, 15, ended(3, 3, 10), open(12, 12));

        assertThat(said)
                .containsExactly(
                        RAISED + " 2024-02-03 1 2024-02-12",
                        ENDED + " 2024-02-03 2 2024-02-10",
                        RAISED + " 2024-02-12 1 2024-02-12");
    }

    @Test
    void shouldKeepItsIdWhenItsStartMoves() {
        close(5, 5, open(5, 5));
        close(2, 6, open(3, 5));
        assertThat(alarm("2024-02-05").start()).isEqualTo(day(3));
        close(2, 7, open(6, 6));
        assertThat(alarm("2024-02-05").start()).isEqualTo(day(6));

        assertThat(said).hasSize(1);
        assertThat(alarms).hasSize(1);
    }

    @Test
    void shouldGiveAnotherIdWhenTheFirstIsTakenByAnAlarmThatMovedOn() {
        close(5, 5, open(5, 5));
        close(2, 20, ended(3, 3, 10));
        assertThat(alarm("2024-02-05").start()).isEqualTo(day(3));
        close(2, 21, ended(3, 3, 4), open(5, 20));

        assertThat(alarms.keySet()).containsExactlyInAnyOrder("g/c/2024-02-05", "g/c/2024-02-05-2");
    }

    @Test
    void shouldNotDependOnTheOrderOfTheAlarmsKnown() {
        close(1, 10, ended(3, 3, 10));
        close(11, 12, open(12, 12));
        List<AlarmState> known = new ArrayList<>(alarms.values());
        List<AlarmMove> moves = book.reconcile(known, List.of(open(3, 12)), day(5), day(13));
        java.util.Collections.reverse(known);

        assertThat(book.reconcile(known, List.of(open(3, 12)), day(5), day(13))).isEqualTo(moves);
    }
}
