package org.seamwatch.schemas.record;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.lang.reflect.RecordComponent;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.TreeSet;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Each record has the fields of its schema in the same order; required are those that are neither null nor defaulted. */
class SchemaMirrorTest {

    static Stream<Arguments> mirrors() {
        return Stream.of(
                Arguments.of(CaseReport.class, "case-report", ""),
                Arguments.of(Position.class, "case-report", "/properties/position"),
                Arguments.of(AlarmResponse.class, "alarm-response", ""),
                Arguments.of(RegionDay.class, "region-day", ""),
                Arguments.of(SeriesDay.class, "series-day", ""),
                Arguments.of(MoranDay.class, "series-day", "/$defs/moran"),
                Arguments.of(LearningDay.class, "series-day", "/$defs/learning"),
                Arguments.of(ChartDay.class, "series-day", "/$defs/chartDay"),
                Arguments.of(Limits.class, "series-day", "/$defs/limits"),
                Arguments.of(AlarmChange.class, "alarm", ""),
                Arguments.of(AlarmResponse.class, "alarm", "/$defs/response"),
                Arguments.of(Evidence.class, "alarm", "/$defs/evidence"),
                Arguments.of(Period.class, "alarm", "/$defs/period"),
                Arguments.of(EvidenceChart.class, "alarm", "/$defs/evidenceChart"),
                Arguments.of(Limits.class, "alarm", "/$defs/limits"),
                Arguments.of(EvidenceHistory.class, "alarm", "/$defs/evidenceHistory"),
                Arguments.of(HistoryDay.class, "alarm", "/$defs/historyDay"),
                Arguments.of(Cluster.class, "alarm", "/$defs/cluster"),
                Arguments.of(ClusterRegion.class, "alarm", "/$defs/clusterRegion"),
                Arguments.of(Quality.class, "alarm", "/$defs/quality"),
                Arguments.of(Method.class, "alarm", "/$defs/method"),
                Arguments.of(Repeat.class, "alarm", "/$defs/repeat"),
                Arguments.of(LogLine.class, "log-line", ""),
                Arguments.of(RejectedLine.class, "rejected-line", ""),
                Arguments.of(AccountingLine.class, "accounting", "/$defs/line"));
    }

    @ParameterizedTest
    @MethodSource("mirrors")
    void shouldHaveTheFieldsOfItsSchema(Class<?> record, String name, String pointer) {
        JsonNode schema = Schemas.tree(name).at(pointer);
        List<String> properties = new ArrayList<>();
        schema.path("properties").fieldNames().forEachRemaining(properties::add);
        assertThat(Arrays.stream(record.getRecordComponents()).map(RecordComponent::getName))
                .containsExactlyElementsOf(properties);
    }

    @ParameterizedTest
    @MethodSource("mirrors")
    void shouldRequireWhatIsNeitherNullNorDefaulted(Class<?> record, String name, String pointer) {
        JsonNode schema = Schemas.tree(name).at(pointer);
        List<String> required = new ArrayList<>();
        schema.path("required").forEach(field -> required.add(field.asText()));
        assertThat(Arrays.stream(record.getRecordComponents())
                        .filter(component -> !component.getAnnotatedType().isAnnotationPresent(Nullable.class))
                        .map(RecordComponent::getName)
                        .filter(field -> !schema.at("/properties/" + field).has("default")))
                .containsExactlyElementsOf(required);
    }

    @ParameterizedTest
    @MethodSource("mirrors")
    void shouldHaveTheTypesOfItsSchema(Class<?> record, String name, String pointer) {
        JsonNode root = Schemas.tree(name);
        for (RecordComponent component : record.getRecordComponents()) {
            JsonNode property = root.at(pointer).path("properties").path(component.getName());
            JsonNode target = property.has("$ref")
                    ? root.at(property.path("$ref").asText().substring(1))
                    : property;
            assertThat(target.path("type").asText()).as(component.getName()).isEqualTo(jsonType(component.getType()));
        }
    }

    private static String jsonType(Class<?> type) {
        if (type == int.class || type == long.class || type == Integer.class || type == Long.class) {
            return "integer";
        }
        if (type == double.class || type == Double.class) {
            return "number";
        }
        if (type == boolean.class) {
            return "boolean";
        }
        if (List.class.isAssignableFrom(type)) {
            return "array";
        }
        boolean object = type.isRecord() || java.util.Map.class.isAssignableFrom(type);
        return object ? "object" : "string";
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "case-report",
                "alarm-response",
                "region-day",
                "series-day",
                "alarm",
                "log-line",
                "rejected-line",
                "accounting",
                "label"
            })
    void shouldDescribeItselfWithoutReachingOut(String name) {
        JsonNode schema = Schemas.tree(name);
        assertThat(schema.path("$schema").asText()).isEqualTo("https://json-schema.org/draft/2020-12/schema");
        assertThat(schema.path("$id").asText()).isEqualTo("urn:seamwatch:schema:" + name + ":1");
        assertThat(schema.path("title").asText()).isNotEmpty();
        assertThat(schema.findValuesAsText("$ref")).allMatch(ref -> ref.startsWith("#/$defs/"));
        for (JsonNode properties : schema.findValues("properties")) {
            properties
                    .properties()
                    .forEach(property -> assertThat(property.getValue().has("description")
                                    || property.getValue().has("$ref"))
                            .as(property.getKey())
                            .isTrue());
        }
    }

    @Test
    void shouldListEveryReasonAndWord() {
        assertThat(words("rejected-line", "/properties/reason"))
                .containsExactlyElementsOf(Arrays.stream(RejectReason.values())
                        .map(RejectReason::code)
                        .toList());
        assertThat(new TreeSet<>(words("accounting", "/$defs/line/properties/reasons/propertyNames")))
                .isEqualTo(new TreeSet<>(words("rejected-line", "/properties/reason")));
        assertThat(words("case-report", "/properties/status")).containsExactlyElementsOf(words(ReportStatus.class));
        assertThat(words("alarm-response", "/properties/verdict")).containsExactlyElementsOf(words(Verdict.class));
        assertThat(words("alarm", "/$defs/response/properties/verdict"))
                .containsExactlyElementsOf(words(Verdict.class));
        assertThat(words("alarm", "/properties/change")).containsExactlyElementsOf(words(Change.class));
        assertThat(words("series-day", "/$defs/grade")).containsExactlyElementsOf(words(Grade.class));
        assertThat(words("alarm", "/$defs/status")).containsExactlyElementsOf(words(StatisticStatus.class));
    }

    @Test
    void shouldSayTheSameOfAResponseInsideAnAlarm() {
        JsonNode inside = Schemas.tree("alarm").at("/$defs/response/properties");
        JsonNode alone = Schemas.tree("alarm-response").path("properties");
        alone.properties().stream()
                .filter(property -> !property.getKey().equals("version"))
                .forEach(property -> assertThat(inside.path(property.getKey())).isEqualTo(property.getValue()));
    }

    private static List<String> words(String name, String pointer) {
        List<String> words = new ArrayList<>();
        Schemas.tree(name).at(pointer).path("enum").forEach(word -> words.add(word.asText()));
        assertThat(words).isNotEmpty();
        return words;
    }

    private static <E extends Enum<E>> List<String> words(Class<E> type) {
        return List.of(new FieldReader.Words<>(type).toString().split(", "));
    }
}
