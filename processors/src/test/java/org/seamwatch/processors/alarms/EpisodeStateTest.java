package org.seamwatch.processors.alarms;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

class EpisodeStateTest {

    private static final LocalDate FIRST = LocalDate.of(2024, 2, 1);

    /**
     * The states of consecutive days. A letter for each statistic: S beyond a limit, i inside, u unusable. One word a
     * day.
     */
    private static List<EpisodeState> states(String... days) {
        List<EpisodeState> states = new ArrayList<>();
        EpisodeState state = EpisodeState.NONE;
        LocalDate day = FIRST;
        for (String word : days) {
            List<Signal> signals = new ArrayList<>();
            for (int i = 0; i < word.length(); i++) {
                char c = word.charAt(i);
                signals.add(new Signal("s" + (i + 1), c != 'u', c == 'S'));
            }
            state = state.next(day, signals);
            states.add(state);
            day = day.plusDays(1);
        }
        return states;
    }

    private static List<Episode> episodes(String... days) {
        return Episodes.of(states(days));
    }

    private static LocalDate day(int ofFebruary) {
        return LocalDate.of(2024, 2, ofFebruary);
    }

    @Test
    void shouldBeginWithASignalAndEndOnTheSeventhDayInside() {
        assertThat(episodes("i", "S", "i", "i", "i", "i", "i", "i", "i", "i"))
                .containsExactly(new Episode(day(2), day(2), day(9), List.of("s1")));
    }

    @Test
    void shouldBeOpenAfterSixDaysInside() {
        assertThat(episodes("S", "i", "i", "i", "i", "i", "i"))
                .containsExactly(new Episode(day(1), day(1), null, List.of("s1")));
    }

    @Test
    void shouldCountDaysInsideAfreshAfterASignal() {
        assertThat(episodes("S", "i", "i", "i", "i", "i", "i", "S", "i", "i", "i", "i", "i", "i"))
                .containsExactly(new Episode(day(1), day(8), null, List.of("s1")));
    }

    @Test
    void shouldNeitherCountNorEndOnUnjudgedDays() {
        assertThat(episodes("S", "u", "u", "u", "u", "u", "u", "u", "u", "u"))
                .containsExactly(new Episode(day(1), day(1), null, List.of("s1")));
        assertThat(episodes("S", "i", "i", "i", "u", "u", "i", "i", "i", "u", "i"))
                .containsExactly(new Episode(day(1), day(1), day(11), List.of("s1")));
    }

    @Test
    void shouldWaitForAllStatisticsOfTheEpisodeAndForNoOther() {
        assertThat(episodes("Si", "SS", "iu", "iu", "iu", "iu", "iu", "iu", "iu", "iu"))
                .containsExactly(new Episode(day(1), day(2), null, List.of("s1", "s2")));
        assertThat(episodes("Si", "iu", "iu", "iu", "iu", "iu", "iu", "iu"))
                .containsExactly(new Episode(day(1), day(1), day(8), List.of("s1")));
    }

    @Test
    void shouldNameStatisticsInTheOrderOfThePlan() {
        assertThat(episodes("iS", "Si")).containsExactly(new Episode(day(1), day(2), null, List.of("s1", "s2")));
    }

    @Test
    void shouldBeginAnotherEpisodeTheDayAfterOneHasEnded() {
        assertThat(episodes("S", "i", "i", "i", "i", "i", "i", "i", "S"))
                .containsExactly(
                        new Episode(day(1), day(1), day(8), List.of("s1")),
                        new Episode(day(9), day(9), null, List.of("s1")));
    }

    @Test
    void shouldSayOnlyOnTheDayItselfThatAnEpisodeHasEnded() {
        List<EpisodeState> states = states("S", "i", "i", "i", "i", "i", "i", "i", "i");
        assertThat(states.get(7).hasEnded()).isTrue();
        assertThat(states.get(7).isOpen()).isFalse();
        assertThat(states.get(8)).isEqualTo(EpisodeState.NONE);
    }
}
