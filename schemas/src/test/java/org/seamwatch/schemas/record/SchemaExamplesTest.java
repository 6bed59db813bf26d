package org.seamwatch.schemas.record;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import com.networknt.schema.Schema;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.seamwatch.schemas.json.Json;

/** What we write satisfies its schema and reads back as itself; with a required field less it would not. */
class SchemaExamplesTest {

    static Stream<Arguments> examples() {
        byte[] latin1 = {(byte) 0xe9};
        ReadResult.Unusable<CaseReport> why = new ReadResult.Unusable<>(RejectReason.TOO_OLD, "eventDate", "d");
        SeriesDay bare = new SeriesDay(1, "g/c", Examples.DAY, 1, Examples.AT, 0, 1, 0, List.of(), null);
        SeriesDay thin = new SeriesDay(1, "g/c", Examples.DAY, 1, Examples.AT, 0, 1, 0, List.of(), Examples.THIN);
        return Stream.of(
                Arguments.of("case-report", Examples.REPORT_BY_REGION),
                Arguments.of("case-report", Examples.REPORT_BY_POSITION),
                Arguments.of("alarm-response", Examples.RESPONSE),
                Arguments.of("region-day", Examples.REGION_DAY),
                Arguments.of("series-day", Examples.SERIES_DAY),
                Arguments.of("series-day", bare),
                Arguments.of("series-day", thin),
                Arguments.of("alarm", Examples.alarm()),
                Arguments.of("log-line", LogLine.of("case-reports", 0, 1, 2, latin1, latin1)),
                Arguments.of("log-line", LogLine.of("case-reports", 0, 1, 2, null, new byte[0])),
                Arguments.of("rejected-line", RejectedLine.of("case-reports", 0, 1, why, latin1, null, null, null)),
                Arguments.of(
                        "rejected-line",
                        RejectedLine.of("case-reports", 0, 1, why, null, latin1, 300_000L, "0f".repeat(32))));
    }

    @ParameterizedTest
    @MethodSource("examples")
    void shouldSatisfyTheSchemaAndReadBack(String name, Object record) {
        JsonNode written = Reports.tree(Json.line(record));

        assertThat(Schemas.errors(Schemas.schema(name), written)).isEmpty();
        assertThat((Object) Json.read(Json.bytes(record), record.getClass())).isEqualTo(record);
    }

    @ParameterizedTest
    @MethodSource("examples")
    void shouldNotSatisfyTheSchemaWithARequiredFieldLess(String name, Object record) {
        Schema schema = Schemas.schema(name);
        for (JsonNode field : Schemas.tree(name).path("required")) {
            ObjectNode less = Reports.object(Json.line(record));
            less.remove(field.asText());
            assertThat(Schemas.errors(schema, less)).as(field.asText()).isNotEmpty();
        }
    }

    static Stream<Arguments> arrays() {
        return Stream.of(
                Arguments.of("accounting", Json.line(List.of(Examples.accounting()))), Arguments.of("label", """
                        [{"id": "outbreak-1", "condition": "norovirus", "start": "2024-05-01", "end": "2024-06-01",
                          "regions": ["NM-014"], "centre": "NM-014", "cases": 71, "shape": "slow", "expectation": "found"}]"""));
    }

    @ParameterizedTest
    @MethodSource("arrays")
    void shouldCheckFilesThatAreArrays(String name, String text) {
        Schema schema = Schemas.schema(name);
        JsonNode array = Reports.tree(text);
        assertThat(Schemas.errors(schema, array)).isEmpty();

        for (JsonNode field : Schemas.tree(name).path("$defs").iterator().next().path("required")) {
            JsonNode less = array.deepCopy();
            ((ObjectNode) less.get(0)).remove(field.asText());
            assertThat(Schemas.errors(schema, less)).as(field.asText()).isNotEmpty();
        }
    }
}
