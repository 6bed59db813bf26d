package org.seamwatch.processors.series;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.Duration;
import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneOffset;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.seamwatch.processors.watch.TestDesk;
import org.seamwatch.processors.watch.Watch;
import org.seamwatch.schemas.record.SeriesDay;

class CloseTimesTest {

    /**
     * A day closes with the first hour that ends at or after the start, in the geography's zone, of the day closeAfter
     * days after the next. Summer time begins in Berlin on 31 March 2024 (UTC+1 to +2) and ends on 27 October; in Sao
     * Paulo, 4 November 2018 began at one o'clock.
     */
    @ParameterizedTest
    @CsvSource({
        "Europe/Berlin,     1, 2024-02-03, 2024-02-04T23:00:00Z",
        "UTC,               1, 2024-02-03, 2024-02-05T00:00:00Z",
        "UTC,               0, 2024-02-03, 2024-02-04T00:00:00Z",
        "UTC,               3, 2024-02-03, 2024-02-07T00:00:00Z",
        "Europe/Berlin,     1, 2024-03-29, 2024-03-30T23:00:00Z",
        "Europe/Berlin,     1, 2024-03-30, 2024-03-31T22:00:00Z",
        "Europe/Berlin,     1, 2024-10-26, 2024-10-27T23:00:00Z",
        "Asia/Kolkata,      1, 2024-02-03, 2024-02-04T19:00:00Z",
        "Asia/Kathmandu,    1, 2024-02-03, 2024-02-04T19:00:00Z",
        "America/Sao_Paulo, 1, 2018-11-02, 2018-11-04T03:00:00Z",
        "America/New_York,  1, 2024-02-03, 2024-02-05T05:00:00Z",
    })
    void shouldCloseADayAtTheStartOfADayOfItsZone(String zone, int closeAfter, String day, Instant expected) {
        Watch watch =
                TestDesk.small().zone(zone).from(day).days(closeAfter, 28, 1).watch();
        Instant start = LocalDate.parse(day).atStartOfDay(ZoneOffset.UTC).toInstant();
        TestLog hourly = new TestLog(1);
        for (int hour = -24; hour < 150; hour++) {
            hourly.clock(start.plus(Duration.ofHours(hour)));
        }
        TestLog atOnce = new TestLog(1);
        atOnce.clock(start.plus(Duration.ofHours(-24))).clock(start.plus(Duration.ofHours(149)));

        StageBench bench = new StageBench(watch).takeAll(hourly.messages(watch));
        SeriesDay first = bench.seriesDays.get(0);
        assertThat(first.day()).isEqualTo(day);
        assertThat(first.closedAt()).isEqualTo(expected);
        assertThat(bench.lines.get(0)).startsWith("series-days " + expected + " ");
        assertThat(new StageBench(watch).takeAll(atOnce.messages(watch)).lines).isEqualTo(bench.lines);
    }

    @Test
    void shouldBeginAsManyDaysBeforeTheLogAsDaysAreRevised() {
        Watch watch = TestDesk.small().zone("Europe/Berlin").days(1, 10, 1).watch();
        TestLog log = new TestLog(1).clock("2024-02-03T23:30:00Z").clock("2024-02-04T01:00:00Z");

        StageBench bench = new StageBench(watch).takeAll(log.messages(watch));
        assertThat(bench.seriesDays.get(0).day()).isEqualTo("2024-01-25");
        assertThat(bench.seriesDays)
                .hasSize(9)
                .last()
                .extracting(SeriesDay::day)
                .hasToString("2024-02-02");
    }

    @Test
    void shouldBeginWithTheEarliestOfThePartitionsFirstTimestamps() {
        Watch watch = TestDesk.small().days(1, 10, 1).watch();
        TestLog log = new TestLog(1);
        log.respond("2024-02-01T12:00:00Z", "x", "{}");
        log.clock("2024-02-04T01:00:00Z");

        assertThat(new StageBench(watch)
                        .takeAll(log.messages(watch))
                        .seriesDays
                        .get(0)
                        .day())
                .isEqualTo("2024-01-22");
    }
}
