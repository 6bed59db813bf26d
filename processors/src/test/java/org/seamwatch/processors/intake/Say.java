package org.seamwatch.processors.intake;

import java.nio.charset.StandardCharsets;
import java.time.Instant;
import java.time.LocalDate;
import java.util.Map;
import java.util.TreeMap;

/** What a source says, for tests: a case report as JSON, written field by field. */
public record Say(String id, Map<String, Object> fields) {

    public Say {
        fields = new TreeMap<>(fields);
    }

    /** One final case of influenza, reported at noon of its day. */
    public static Say of(String id, String region, String day) {
        return new Say(
                id,
                Map.of(
                        "reportId",
                        id,
                        "source",
                        "lab-1",
                        "status",
                        "final",
                        "condition",
                        "influenza",
                        "region",
                        region,
                        "eventDate",
                        day,
                        "reportedAt",
                        day + "T12:00:00Z"));
    }

    public Say with(String field, Object value) {
        Map<String, Object> changed = new TreeMap<>(fields);
        changed.put(field, value);
        return new Say(id, changed);
    }

    public Say without(String field) {
        Map<String, Object> changed = new TreeMap<>(fields);
        changed.remove(field);
        return new Say(id, changed);
    }

    public Say revision(int revision) {
        return with("revision", revision);
    }

    public Say count(int count) {
        return with("count", count);
    }

    public Say status(String status) {
        return with("status", status);
    }

    public Say day(LocalDate day) {
        return with("eventDate", day.toString());
    }

    public Say at(Instant instant) {
        return with("reportedAt", instant.toString());
    }

    public byte[] key() {
        return id.getBytes(StandardCharsets.UTF_8);
    }

    public byte[] value() {
        StringBuilder json = new StringBuilder("{");
        fields.forEach((name, value) -> json.append(json.length() == 1 ? "" : ",")
                .append('"')
                .append(name)
                .append("\":")
                .append(value instanceof String text && !text.startsWith("{") ? '"' + text + '"' : value));
        return json.append('}').toString().getBytes(StandardCharsets.UTF_8);
    }
}
