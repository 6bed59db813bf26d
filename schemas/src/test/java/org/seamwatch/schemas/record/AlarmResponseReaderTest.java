package org.seamwatch.schemas.record;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.time.Instant;
import java.time.LocalDate;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.seamwatch.schemas.json.Json;

class AlarmResponseReaderTest {

    @Test
    void shouldReadEveryField() {
        assertThat(AlarmResponseReader.read(Reports.utf8(Reports.RESPONSE)))
                .isEqualTo(new ReadResult.Parsed<>(new AlarmResponse(
                        1,
                        "northmarch/influenza/2024-02-03",
                        Verdict.KNOWN_EVENT,
                        LocalDate.of(2024, 2, 1),
                        LocalDate.of(2024, 2, 5),
                        "desk 2",
                        Instant.parse("2024-02-06T09:00:00Z"),
                        "school fair")));
    }

    @ParameterizedTest
    @EnumSource(Verdict.class)
    void shouldReadWhatWeWrite(Verdict verdict) {
        AlarmResponse response = new AlarmResponse(
                1, "g/c/2024-02-03", verdict, null, null, "b", Instant.parse("2024-02-06T09:00:00.123456789Z"), null);
        assertThat(AlarmResponseReader.read(Json.bytes(response))).isEqualTo(new ReadResult.Parsed<>(response));
    }

    @ParameterizedTest
    @ValueSource(strings = {"alarm", "verdict", "by", "at"})
    void shouldNameTheMissingField(String field) {
        ObjectNode response = Reports.response();
        response.remove(field);
        assertUnusable(response.toString(), RejectReason.MISSING_FIELD, field, field + " must be there, was missing");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "verdict | outbrake | verdict must be one of acknowledged, under-investigation, outbreak, known-event, no-outbreak, data-fault, baseline-changed, was \"outbrake\"",
                "to | 2024-01-31 | to must not be before from 2024-02-01, was 2024-01-31",
                "from | today | from must be a date like 2024-02-03, was \"today\"",
                "by | '' | by must not be empty, was \"\"",
                "at | 2024-02-06T24:00:00Z | at must be a time like 2024-02-03T08:30:00+01:00, was \"2024-02-06T24:00:00Z\"",
            })
    void shouldNameFieldRuleAndValue(String field, String value, String detail) {
        assertUnusable(Reports.response().put(field, value).toString(), RejectReason.BAD_VALUE, field, detail);
    }

    @Test
    void shouldLimitTheNote() {
        assertUnusable(
                Reports.response().put("note", "n".repeat(2001)).toString(),
                RejectReason.BAD_VALUE,
                "note",
                "note must have at most 2000 characters, was \"" + "n".repeat(80) + "...\"");
    }

    private static void assertUnusable(String text, RejectReason reason, String field, String detail) {
        assertThat(AlarmResponseReader.read(Reports.utf8(text)))
                .isEqualTo(new ReadResult.Unusable<AlarmResponse>(reason, field, detail));
    }
}
