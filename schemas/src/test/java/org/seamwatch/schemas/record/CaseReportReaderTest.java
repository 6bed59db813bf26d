package org.seamwatch.schemas.record;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.time.Instant;
import java.time.LocalDate;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class CaseReportReaderTest {

    @Test
    void shouldReadEveryField() {
        assertThat(parsed(Reports.REPORT))
                .isEqualTo(new CaseReport(
                        1,
                        "r-17",
                        "lab-east",
                        2,
                        ReportStatus.CORRECTED,
                        "influenza",
                        "NM-014",
                        null,
                        LocalDate.of(2024, 2, 1),
                        LocalDate.of(2024, 2, 3),
                        Instant.parse("2024-02-03T07:30:00Z"),
                        3));
    }

    @Test
    void shouldFillInDefaultsAndSkipUnknownFields() {
        CaseReport report = parsed("""
                {"patient": {"name": "N", "x": [[{}]]}, "reportId": "r", "source": "s", "status": "final", "condition": "c",
                 "position": {"alt": 3, "lon": -0.0, "lat": 9e1}, "eventDate": "2024-02-29",
                 "reportedAt": "2024-03-01t00:00:00.25z"}""");

        assertThat(report.version()).isEqualTo(1);
        assertThat(report.revision()).isZero();
        assertThat(report.count()).isEqualTo(1);
        assertThat(report.reportDate()).isNull();
        assertThat(report.region()).isNull();
        assertThat(report.position()).isEqualTo(new Position(0, 90));
        assertThat(report.reportedAt()).isEqualTo(Instant.parse("2024-03-01T00:00:00.250Z"));
    }

    @ParameterizedTest
    @CsvSource({"3.0, 3", "3e0, 3", "30e-1, 3", "-0, 0", "1E6, 1000000", "0.0e99999999, 0"})
    void shouldReadWholeNumbersHoweverTheyAreWritten(String written, int count) {
        assertThat(parsed(Reports.REPORT.replace("\"count\": 3", "\"count\": " + written))
                        .count())
                .isEqualTo(count);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = ';',
            value = {
                "reportId ; 7 ; wrong-type ; reportId must be a string, was 7",
                "reportId ; \"\" ; bad-value ; reportId must not be empty, was \"\"",
                "reportId ; \"a\\u0085b\" ; bad-value ; reportId must have no control characters, was \"a?b\"",
                "reportId ; \"\\ud800\" ; bad-value ; reportId must have whole surrogate pairs, was \"?\"",
                "source ; \"a/b\" ; bad-value ; source must not contain / or |, was \"a/b\"",
                "source ; null ; wrong-type ; source must be a string, was null",
                "status ; \"Final\" ; bad-value ; status must be one of preliminary, final, corrected, withdrawn, was \"Final\"",
                "region ; [\"NM\"] ; wrong-type ; region must be a string, was an array",
                "eventDate ; \"2024-2-3\" ; bad-value ; eventDate must be a date like 2024-02-03, was \"2024-2-3\"",
                "eventDate ; \"2023-02-29\" ; bad-value ; eventDate must be a date like 2024-02-03, was \"2023-02-29\"",
                "reportDate ; \"1899-12-31\" ; out-of-range ; reportDate must lie in the years 1900 to 2200, was \"1899-12-31\"",
                "reportedAt ; \"2024-02-03T08:30:00\" ; bad-value ; reportedAt must be a time like 2024-02-03T08:30:00+01:00, was \"2024-02-03T08:30:00\"",
                "revision ; -1 ; out-of-range ; revision must be in 0 to 9007199254740991, was -1",
                "revision ; 9007199254740992 ; out-of-range ; revision must be in 0 to 9007199254740991, was 9007199254740992",
                "count ; 1000001 ; out-of-range ; count must be in 0 to 1000000, was 1000001",
                "count ; 1.5 ; wrong-type ; count must be a whole number, was 1.5",
                "count ; 1e400 ; out-of-range ; count must be in 0 to 1000000, was 1e400",
                "count ; 1e999999999999 ; out-of-range ; count must be in 0 to 1000000, was 1e999999999999",
                "count ; true ; wrong-type ; count must be a number, was true or false",
                "version ; 2 ; unsupported-version ; version must be 1, was 2",
                "version ; \"1\" ; wrong-type ; version must be a number, was \"1\"",
            })
    void shouldNameFieldRuleAndValue(String field, String json, String reason, String detail) {
        assertUnusable(changed(field, json), reason, field, detail);
    }

    @ParameterizedTest
    @ValueSource(strings = {"reportId", "source", "status", "condition", "eventDate", "reportedAt"})
    void shouldNameTheMissingField(String field) {
        ObjectNode report = Reports.report();
        report.remove(field);
        assertUnusable(report.toString(), "missing-field", field, field + " must be there, was missing");
    }

    @Test
    void shouldWantExactlyOnePlace() {
        ObjectNode both = Reports.report();
        both.putObject("position").put("lon", 1).put("lat", 2);
        ObjectNode neither = Reports.report();
        neither.remove("region");

        assertUnusable(
                both.toString(),
                "region-and-position",
                "region",
                "exactly one of region and position must be there, were both");
        assertUnusable(
                neither.toString(), "no-place", "region", "one of region and position must be there, was neither");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "{\"lon\":180.1,\"lat\":1} | out-of-range | position.lon | position.lon must be in -180 to 180, was 180.1",
                "{\"lon\":1,\"lat\":-1e999} | out-of-range | position.lat | position.lat must be in -90 to 90, was -1e999",
                "{\"lon\":1} | missing-field | position.lat | position.lat must be there, was missing",
                "{\"lon\":\"1\",\"lat\":1} | wrong-type | position.lon | position.lon must be a number, was \"1\"",
                "[1,2] | wrong-type | position | position must be an object, was an array",
                "{\"lon\":1,\"lon\":2,\"lat\":1} | duplicate-field | position.lon | position.lon must be there once, was there twice",
            })
    void shouldCheckPositions(String position, String reason, String field, String detail) {
        String text = Reports.REPORT.replace("\"region\": \"NM-014\"", "\"position\": " + position);
        assertUnusable(text, reason, field, detail);
    }

    @Test
    void shouldCountCharactersNotSurrogates() {
        String longest = "\ud83d\ude37".repeat(200);
        assertThat(parsed(Reports.report().put("reportId", longest).toString()).reportId())
                .isEqualTo(longest);
        assertUnusable(
                Reports.report().put("reportId", "x".repeat(201)).toString(),
                "bad-value",
                "reportId",
                "reportId must have at most 200 characters, was \"" + "x".repeat(80) + "...\"");
    }

    private static String changed(String field, String json) {
        return Reports.report()
                .putNull(field)
                .toString()
                .replace("\"" + field + "\":null", "\"" + field + "\":" + json);
    }

    private static CaseReport parsed(String text) {
        ReadResult<CaseReport> result = CaseReportReader.read(Reports.utf8(text));
        assertThat(result).isInstanceOf(ReadResult.Parsed.class);
        return ((ReadResult.Parsed<CaseReport>) result).value();
    }

    static void assertUnusable(@Nullable String text, String reason, String field, String detail) {
        ReadResult<CaseReport> result = CaseReportReader.read(text == null ? null : Reports.utf8(text));
        assertThat(result).isInstanceOf(ReadResult.Unusable.class);
        ReadResult.Unusable<CaseReport> unusable = (ReadResult.Unusable<CaseReport>) result;
        assertThat(unusable.detail()).isEqualTo(detail);
        assertThat(unusable.reason().code()).isEqualTo(reason);
        assertThat(unusable.field()).isEqualTo(field);
    }
}
