package org.seamwatch.schemas.record;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.nio.charset.StandardCharsets;

/** Documents for the tests of the readers. */
final class Reports {

    static final String REPORT = """
            {"version": 1, "reportId": "r-17", "source": "lab-east", "revision": 2, "status": "corrected",
             "condition": "influenza", "region": "NM-014", "eventDate": "2024-02-01", "reportDate": "2024-02-03",
             "reportedAt": "2024-02-03T08:30:00+01:00", "count": 3}""";

    static final String RESPONSE = """
            {"version": 1, "alarm": "northmarch/influenza/2024-02-03", "verdict": "known-event", "from": "2024-02-01",
             "to": "2024-02-05", "by": "desk 2", "at": "2024-02-06T09:00:00Z", "note": "school fair"}""";

    private static final JsonMapper MAPPER = new JsonMapper();

    private Reports() {}

    static ObjectNode report() {
        return object(REPORT);
    }

    static ObjectNode response() {
        return object(RESPONSE);
    }

    static ObjectNode object(String text) {
        return (ObjectNode) tree(text);
    }

    static JsonNode tree(String text) {
        try {
            return MAPPER.readTree(text);
        } catch (JsonProcessingException e) {
            throw new IllegalArgumentException(e);
        }
    }

    static byte[] utf8(String text) {
        return text.getBytes(StandardCharsets.UTF_8);
    }
}
