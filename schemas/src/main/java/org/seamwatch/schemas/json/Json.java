package org.seamwatch.schemas.json;

import com.fasterxml.jackson.core.JacksonException;
import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.StreamReadFeature;
import com.fasterxml.jackson.core.StreamWriteFeature;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.JsonMappingException;
import com.fasterxml.jackson.databind.MapperFeature;
import com.fasterxml.jackson.databind.SerializationFeature;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.databind.module.SimpleModule;
import com.fasterxml.jackson.datatype.jsr310.JavaTimeModule;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;

/**
 * Writes records as one compact line of JSON and reads them back. The same record gives the same bytes: fields in the
 * order of the record, ISO dates, instants in UTC, the shortest digits that give a double back exactly. For records of
 * our own only; what others send goes through {@code CaseReportReader} and {@code AlarmResponseReader}.
 */
public final class Json {

    private static final JsonMapper MAPPER = JsonMapper.builder(JsonFactory.builder()
                    // The shortest digits, the same on every Java version.
                    .enable(StreamWriteFeature.USE_FAST_DOUBLE_WRITER)
                    .enable(StreamReadFeature.STRICT_DUPLICATE_DETECTION)
                    .disable(StreamReadFeature.INCLUDE_SOURCE_IN_LOCATION)
                    .build())
            .addModule(new JavaTimeModule())
            .addModule(finiteNumbers())
            .disable(MapperFeature.SORT_PROPERTIES_ALPHABETICALLY)
            .disable(MapperFeature.ALLOW_COERCION_OF_SCALARS)
            .disable(SerializationFeature.WRITE_DATES_AS_TIMESTAMPS)
            .disable(DeserializationFeature.FAIL_ON_UNKNOWN_PROPERTIES)
            .disable(DeserializationFeature.ACCEPT_FLOAT_AS_INT)
            .enable(DeserializationFeature.FAIL_ON_TRAILING_TOKENS)
            .enable(DeserializationFeature.FAIL_ON_NULL_FOR_PRIMITIVES)
            .enable(DeserializationFeature.FAIL_ON_NUMBERS_FOR_ENUMS)
            .build();

    private Json() {}

    /**
     * The record as UTF-8.
     *
     * @throws IllegalArgumentException where a number is not finite
     */
    public static byte[] bytes(Object value) {
        try {
            return MAPPER.writeValueAsBytes(value);
        } catch (JacksonException e) {
            throw unwritable(value, e);
        }
    }

    /**
     * The record as one line, without its end.
     *
     * @throws IllegalArgumentException where a number is not finite
     */
    public static String line(Object value) {
        return new String(bytes(value), StandardCharsets.UTF_8);
    }

    /**
     * A record of our own; unknown fields are ignored.
     *
     * @throws IllegalArgumentException where the bytes are not such a record
     */
    public static <T> T read(byte[] value, Class<T> type) {
        try (JsonParser parser = MAPPER.createParser(value)) {
            T read = parser.readValueAs(type);
            if (read == null || parser.nextToken() != null) {
                throw new IllegalArgumentException(type.getSimpleName() + " cannot be read: not one JSON object");
            }
            return read;
        } catch (JacksonException e) {
            throw new IllegalArgumentException(
                    type.getSimpleName() + " cannot be read: " + e.getOriginalMessage() + " at " + path(e), e);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static IllegalArgumentException unwritable(Object value, JacksonException e) {
        return new IllegalArgumentException(
                value.getClass().getSimpleName() + " cannot be written: " + path(e) + ": " + e.getOriginalMessage(), e);
    }

    private static String path(JacksonException e) {
        if (!(e instanceof JsonMappingException mapping) || mapping.getPath().isEmpty()) {
            return "its start";
        }
        StringBuilder path = new StringBuilder();
        for (JsonMappingException.Reference step : mapping.getPath()) {
            if (step.getFieldName() == null) {
                path.append('[').append(step.getIndex()).append(']');
            } else {
                path.append(path.isEmpty() ? "" : ".").append(step.getFieldName());
            }
        }
        return path.toString();
    }

    private static SimpleModule finiteNumbers() {
        FiniteDoubleSerializer serializer = new FiniteDoubleSerializer();
        return new SimpleModule("finite-numbers")
                .addSerializer(Double.class, serializer)
                .addSerializer(Double.TYPE, serializer);
    }
}
