package org.seamwatch.schemas.record;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import com.networknt.schema.Schema;
import java.util.function.Function;
import org.junit.jupiter.api.Test;

/**
 * Reader and schema agree on what is a record. What JSON Schema cannot say is refused by the readers alone: a field
 * twice, {@code to} before {@code from}, nesting beyond 32 levels, numbers of more than 100 characters. The offset -00:00,
 * which RFC 3339 allows and this validator does not, is taken.
 */
class SchemaAgreementTest {

    private static final int DOCUMENTS = 20_000;

    @Test
    void shouldAgreeOnReports() {
        ObjectNode byPosition = Reports.report();
        byPosition.remove("region");
        byPosition.putObject("position").put("lon", 1.5).put("lat", 2);
        assertAgreement("case-report", Reports.report(), CaseReportReader::read);
        assertAgreement("case-report", byPosition, CaseReportReader::read);
    }

    @Test
    void shouldAgreeOnResponses() {
        assertAgreement("alarm-response", Reports.response(), AlarmResponseReader::read);
    }

    @Test
    void shouldNameTheOneFieldThatIsWrong() {
        assertNamed("case-report", Reports.report(), CaseReportReader::read);
        assertNamed("alarm-response", Reports.response(), AlarmResponseReader::read);
    }

    private static <T> void assertAgreement(String name, ObjectNode good, Function<byte[], ReadResult<T>> reader) {
        Schema schema = Schemas.schema(name);
        Mutations mutations = new Mutations(2020_12, Schemas.tree(name));
        int valid = 0;
        for (int i = 0; i < DOCUMENTS; i++) {
            ObjectNode document = mutations.next(good);
            boolean satisfies = Schemas.errors(schema, document).isEmpty() && !isBackwards(document);
            assertThat(reader.apply(Reports.utf8(document.toString())) instanceof ReadResult.Parsed)
                    .as(document.toString())
                    .isEqualTo(satisfies);
            valid += satisfies ? 1 : 0;
        }
        assertThat(valid).isBetween(DOCUMENTS / 20, DOCUMENTS * 19 / 20);
    }

    private static <T> void assertNamed(String name, ObjectNode good, Function<byte[], ReadResult<T>> reader) {
        Schema schema = Schemas.schema(name);
        Mutations mutations = new Mutations(1, Schemas.tree(name));
        int wrong = 0;
        for (String field : mutations.fields()) {
            for (JsonNode value : mutations.values()) {
                ObjectNode document = good.deepCopy();
                if (field.equals("position")) {
                    document.remove("region");
                }
                document.set(field, value);
                if (!Schemas.errors(schema, document).isEmpty()) {
                    ReadResult<T> result = reader.apply(Reports.utf8(document.toString()));
                    assertThat(result).as(document.toString()).isInstanceOf(ReadResult.Unusable.class);
                    assertThat(((ReadResult.Unusable<T>) result).field()).startsWith(field);
                    wrong++;
                }
            }
        }
        assertThat(wrong).isGreaterThan(200);
    }

    private static boolean isBackwards(ObjectNode document) {
        return document.has("from")
                && document.has("to")
                && document.path("from").asText().compareTo(document.path("to").asText()) > 0;
    }
}
