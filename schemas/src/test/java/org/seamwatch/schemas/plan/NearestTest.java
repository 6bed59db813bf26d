package org.seamwatch.schemas.plan;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;

class NearestTest {

    /** "kitten" and "sitting": the textbook example of the edit distance (from memory). */
    @Test
    void shouldCountEdits() {
        assertThat(Nearest.distance("kitten", "sitting")).isEqualTo(3);
        assertThat(Nearest.distance("", "abc")).isEqualTo(3);
        assertThat(Nearest.distance("abc", "")).isEqualTo(3);
        assertThat(Nearest.distance("same", "same")).isZero();
    }

    @Test
    void shouldTakeTheFirstOfTheNearest() {
        assertThat(Nearest.of("cat", List.of("dog", "bat", "hat"))).contains("bat");
        assertThat(Nearest.of("CLOSEAFTER", List.of("closeAfter"))).contains("closeAfter");
    }

    @Test
    void shouldSuggestNothingFarAway() {
        assertThat(Nearest.of("xyz", List.of("abc", "abcd"))).isEmpty();
        assertThat(Nearest.known("xyz", List.of("abc", "abcd"))).isEqualTo(", known: abc, abcd");
        assertThat(Nearest.known("abd", List.of("abc"))).isEqualTo(", known: abc; did you mean \"abc\"?");
    }
}
