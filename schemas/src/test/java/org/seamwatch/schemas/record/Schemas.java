package org.seamwatch.schemas.record;

import com.fasterxml.jackson.databind.JsonNode;
import com.networknt.schema.Error;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Objects;

/** The schema files, with format assertions switched on. */
final class Schemas {

    private static final SchemaRegistry REGISTRY =
            SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12);

    private Schemas() {}

    static JsonNode tree(String name) {
        String file = "/schemas/" + name + "-1.schema.json";
        try (InputStream in = Objects.requireNonNull(Schemas.class.getResourceAsStream(file), file)) {
            return Reports.tree(new String(in.readAllBytes(), StandardCharsets.UTF_8));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    static Schema schema(String name) {
        return REGISTRY.getSchema(tree(name));
    }

    static List<Error> errors(Schema schema, JsonNode document) {
        return schema.validate(
                document, context -> context.executionConfig(config -> config.formatAssertionsEnabled(true)));
    }
}
