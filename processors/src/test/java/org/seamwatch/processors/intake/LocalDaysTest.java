package org.seamwatch.processors.intake;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneId;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class LocalDaysTest {

    /**
     * Zones whose clocks change at midnight, a minute after it (and so give a date twice), at other hours, by half an
     * hour, and one that left out a whole day (2011).
     */
    @ParameterizedTest
    @ValueSource(
            strings = {
                "UTC",
                "Europe/Berlin",
                "America/Sao_Paulo",
                "Australia/Lord_Howe",
                "Pacific/Apia",
                "America/St_Johns",
                "Asia/Beirut"
            })
    void shouldGiveTheDateThatTheZoneGives(String id) {
        ZoneId zone = ZoneId.of(id);
        LocalDays days = new LocalDays();
        Random random = new Random(7);
        long millis = Instant.parse("2010-10-01T00:00:00Z").toEpochMilli();
        for (int i = 0; i < 20_000; i++) {
            millis += random.nextInt(6_000_000) - 1_000_000;
            assertThat(days.at(millis, zone))
                    .as("%d in %s", millis, id)
                    .isEqualTo(Instant.ofEpochMilli(millis).atZone(zone).toLocalDate());
        }
    }

    /** Newfoundland put its clocks back at a minute past midnight until 2011 (tz database, America/St_Johns). */
    @Test
    void shouldGoBackToADateThatComesTwice() {
        ZoneId zone = ZoneId.of("America/St_Johns");
        LocalDays days = new LocalDays();
        assertThat(days.at(Instant.parse("2010-11-07T02:30:30Z").toEpochMilli(), zone))
                .isEqualTo(LocalDate.of(2010, 11, 7));
        assertThat(days.at(Instant.parse("2010-11-07T02:31:30Z").toEpochMilli(), zone))
                .isEqualTo(LocalDate.of(2010, 11, 6));
    }

    @Test
    void shouldKeepZonesApart() {
        LocalDays days = new LocalDays();
        long millis = Instant.parse("2024-02-03T23:30:00Z").toEpochMilli();
        assertThat(days.at(millis, ZoneId.of("UTC"))).isEqualTo(LocalDate.of(2024, 2, 3));
        assertThat(days.at(millis, ZoneId.of("Europe/Berlin"))).isEqualTo(LocalDate.of(2024, 2, 4));
        assertThat(days.at(millis, ZoneId.of("UTC"))).isEqualTo(LocalDate.of(2024, 2, 3));
    }
}
