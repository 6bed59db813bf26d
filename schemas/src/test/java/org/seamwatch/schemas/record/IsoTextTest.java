package org.seamwatch.schemas.record;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.Instant;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.OffsetDateTime;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class IsoTextTest {

    /** Section 4.3 of RFC 3339, and its examples in section 5.8 but for the leap seconds, which are refused. */
    @ParameterizedTest
    @CsvSource({
        "2024-02-03T08:30:00-00:00, 2024-02-03T08:30:00Z",
        "1985-04-12T23:20:50.52Z, 1985-04-12T23:20:50.520Z",
        "1996-12-19T16:39:57-08:00, 1996-12-20T00:39:57Z",
        "1937-01-01T12:00:27.87+00:20, 1937-01-01T11:40:27.870Z"
    })
    void shouldReadTheExamplesOfTheStandard(String text, Instant instant) {
        assertThat(IsoText.instant(text)).isEqualTo(instant);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "1990-12-31T23:59:60Z",
                "1990-12-31T15:59:60-08:00",
                "2024-02-03",
                "2024-02-03T08:30Z",
                "2024-02-03T08:30:00",
                "2024-02-03 08:30:00Z",
                "2024-02-03T08:30:00.Z",
                "2024-02-03T08:30:00.1234567890Z",
                "2024-02-03T08:30:00+0100",
                "2024-02-03T08:30:00+01",
                "2024-02-03T08:30:00+18:01",
                "2024-02-03T08:30:00+01:60",
                "2024-02-03T24:00:00Z",
                "2024-02-03T08:60:00Z",
                "2023-02-29T08:30:00Z",
                "2024-02-03T08:30:00ZZ",
                "2024-02-03T08:30:00Z[UTC]",
                "20240203T083000Z",
                "2024-02-03T-8:30:00Z",
                "\u0662024-02-03T08:30:00Z"
            })
    void shouldRefuseOtherForms(String text) {
        assertThat(IsoText.instant(text)).isNull();
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "",
                "2024-02-3",
                "2024-02-30",
                "2024-13-01",
                "2024-00-01",
                "2024-01-00",
                "24-01-01",
                "2024/02/03",
                "+2024-02-3",
                "2024-02-03T",
                "\u0662\u0660\u0662\u0664-02-03"
            })
    void shouldRefuseWhatIsNoDate(String text) {
        assertThat(IsoText.date(text)).isNull();
    }

    @Test
    void shouldAgreeWithTheFormatterOfTheLibrary() {
        SplittableRandom random = new SplittableRandom(3339);
        for (int i = 0; i < 5000; i++) {
            LocalDateTime local = LocalDateTime.ofEpochSecond(
                    random.nextLong(-2_000_000_000L, 7_000_000_000L), random.nextInt(1_000_000_000), ZoneOffset.UTC);
            OffsetDateTime time = local.atOffset(ZoneOffset.ofTotalSeconds(60 * random.nextInt(-18 * 60, 18 * 60 + 1)));
            String text = time.format(DateTimeFormatter.ofPattern("uuuu-MM-dd'T'HH:mm:ss.SSSSSSSSSxxx"));
            assertThat(IsoText.instant(text)).isEqualTo(time.toInstant());
            LocalDate date = local.toLocalDate();
            assertThat(IsoText.date(date.toString())).isEqualTo(date);
        }
    }
}
