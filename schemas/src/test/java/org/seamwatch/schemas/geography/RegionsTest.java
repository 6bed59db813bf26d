package org.seamwatch.schemas.geography;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class RegionsTest {

    @ParameterizedTest
    @CsvSource(
            delimiter = ';',
            value = {
                "*; 05754; true",
                "05*; 05754; true",
                "05*; 15754; false",
                "05*; 05; true",
                "05; 05754; false",
                "*54; 05754; true",
                "0*7*4; 05754; true",
                "0*7*4; 05755; false",
                "**; x; true",
                "09*, 05*; 05754; true",
                "09*,01*; 05754; false",
                "NM.1; NM-1; false",
                "NM.*; NM.1; true",
                "a\\E*; a\\Eb; true",
                "(; (; true",
                "','; x; false",
            })
    void shouldMatchWholeIds(String patterns, String id, boolean matches) {
        assertThat(Regions.pattern(patterns).test(id)).isEqualTo(matches);
    }
}
