package org.seamwatch.processors.evidence;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class WordingTest {

    @ParameterizedTest
    @CsvSource({
        "hand-foot-mouth, Hand foot mouth",
        "covid-19, Covid-19",
        "e_coli, E coli",
        "x, X",
        "\u00fcbel, \u00dcbel"
    })
    void shouldReadIdsAsTitles(String id, String title) {
        assertThat(Wording.title(id)).isEqualTo(title);
    }

    @ParameterizedTest
    @CsvSource({
        "0, 0",
        "0.5, 0.5",
        "2.72, 2.72",
        "9.999, 10",
        "9.5, 9.5",
        "10.4, 10",
        "117, 117",
        "1, 1",
        "-0.25, -0.25"
    })
    void shouldGiveNumbersAtMostTwoDecimals(double number, String text) {
        assertThat(Wording.number(number)).isEqualTo(text);
    }

    @Test
    void shouldListNames() {
        assertThat(Wording.list(List.of("A"), 0)).isEqualTo("A");
        assertThat(Wording.list(List.of("A", "B", "C"), 0)).isEqualTo("A, B and C");
        assertThat(Wording.list(List.of("A", "B", "C"), 4)).isEqualTo("A, B, C and 4 more");
    }

    @Test
    void shouldCutNamesBetweenWholeCharacters() {
        assertThat(Wording.cut("\ud83e\udda0".repeat(120))).hasSize(240);
        assertThat(Wording.cut("\ud83e\udda0".repeat(121))).hasSize(239).endsWith("\u2026");
    }

    @Test
    void shouldCountInWords() {
        assertThat(Wording.count(1, "case")).isEqualTo("1 case");
        assertThat(Wording.count(0, "case")).isEqualTo("0 cases");
        assertThat(Wording.times(1)).isEqualTo("once");
        assertThat(Wording.times(2)).isEqualTo("2 times");
    }
}
