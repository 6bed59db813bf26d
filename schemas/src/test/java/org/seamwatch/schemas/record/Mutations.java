package org.seamwatch.schemas.record;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;

/** Seeded changes to a good document: fields dropped, added, or given values good and bad. */
final class Mutations {

    private static final List<String> VALUES = List.of(
            "null",
            "true",
            "[]",
            "{}",
            "[1]",
            "{\"lon\": 1, \"lat\": 2}",
            "{\"lon\": 1.5, \"lat\": 90}",
            "{\"lon\": 181, \"lat\": 2}",
            "{\"lon\": 1, \"lat\": \"2\"}",
            "{\"lat\": 1}",
            "0",
            "1",
            "1.0",
            "2",
            "-1",
            "0.5",
            "1000000",
            "1000001",
            "9007199254740991",
            "9007199254740992",
            "1e18",
            "\"\"",
            "\"x\"",
            "\" \"",
            "\"a/b\"",
            "\"a|b\"",
            "\"a\\nb\"",
            "\"a\\n\"",
            "\"\\u0000\"",
            "\"\\u007f\"",
            "\"\\u0085\"",
            "\"\\ud83d\\ude37\"",
            "\"final\"",
            "\"FINAL\"",
            "\"withdrawn\"",
            "\"outbreak\"",
            "\"no-outbreak\"",
            "\"2024-02-29\"",
            "\"2023-02-29\"",
            "\"2024-02-03\\n\"",
            "\"1899-12-31\"",
            "\"1900-01-01\"",
            "\"2200-12-31\"",
            "\"2201-01-01\"",
            "\"2024-2-3\"",
            "\"20240203\"",
            "\"2024-02-03T08:30:00Z\"",
            "\"2024-02-03t08:30:00.123z\"",
            "\"2024-02-03T08:30:00.123456789+18:00\"",
            "\"2024-02-03T08:30:00-18:01\"",
            "\"2024-02-03T08:30:00-17:59\"",
            "\"2024-02-03T08:30:00+00:00\"",
            "\"2024-02-03T08:30:00.1234567890Z\"",
            "\"2024-02-03T08:30:60Z\"",
            "\"2024-02-03T23:59:60Z\"",
            "\"2024-02-03T24:00:00Z\"",
            "\"2024-02-30T08:30:00Z\"",
            "\"2024-02-03T08:30Z\"",
            "\"2024-02-03T08:30:00\"",
            "\"1899-02-03T08:30:00Z\"",
            "\"" + "x".repeat(200) + "\"",
            "\"" + "x".repeat(201) + "\"",
            "\"" + "n".repeat(2000) + "\"",
            "\"" + "n".repeat(2001) + "\"");

    private final SplittableRandom random;
    private final List<String> fields = new ArrayList<>();
    private final List<JsonNode> values = new ArrayList<>();

    Mutations(long seed, JsonNode schema) {
        random = new SplittableRandom(seed);
        schema.path("properties").fieldNames().forEachRemaining(fields::add);
        fields.add("unknown");
        VALUES.forEach(value -> values.add(Reports.tree(value)));
    }

    List<String> fields() {
        return fields;
    }

    List<JsonNode> values() {
        return values;
    }

    /** One to three changes. */
    ObjectNode next(ObjectNode good) {
        ObjectNode document = good.deepCopy();
        for (int i = random.nextInt(3); i >= 0; i--) {
            String field = fields.get(random.nextInt(fields.size()));
            if (random.nextInt(6) == 0) {
                document.remove(field);
            } else {
                document.set(field, values.get(random.nextInt(values.size())));
            }
        }
        return document;
    }
}
