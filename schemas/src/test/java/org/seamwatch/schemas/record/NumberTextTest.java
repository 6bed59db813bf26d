package org.seamwatch.schemas.record;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class NumberTextTest {

    @ParameterizedTest
    @CsvSource({
        "0, 0",
        "-0, 0",
        "-0.0, 0",
        "12, 12",
        "1.20e1, 12",
        "1200E-2, 12",
        "9223372036854775807, 9223372036854775807",
        "-9223372036854775808, -9223372036854775808",
        "0e-2147483647, 0"
    })
    void shouldReadWholeNumbers(String text, long value) {
        assertThat(NumberText.of(text)).isEqualTo(new NumberText(value, false, false));
    }

    @ParameterizedTest
    @ValueSource(strings = {"0.5", "-1.5", "1e-1", "1e-2147483000", "12345678901234567.5"})
    void shouldKnowFractions(String text) {
        assertThat(NumberText.of(text).isFraction()).isTrue();
    }

    @ParameterizedTest
    @ValueSource(
            strings = {"9223372036854775808", "-9223372036854775809", "1e19", "1e400", "-1e2147483000", "1e99999999999"
            })
    void shouldKnowHugeNumbersWithoutBuildingThem(String text) {
        assertThat(NumberText.of(text).isHuge()).isTrue();
    }

    @Test
    void shouldTakeMoreThanAHundredCharactersForHuge() {
        assertThat(NumberText.of("1".repeat(101)).isHuge()).isTrue();
        assertThat(NumberText.decimal("0." + "1".repeat(99))).isNaN();
    }
}
