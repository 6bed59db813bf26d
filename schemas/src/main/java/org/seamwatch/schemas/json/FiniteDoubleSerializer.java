package org.seamwatch.schemas.json;

import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.databind.JsonMappingException;
import com.fasterxml.jackson.databind.SerializerProvider;
import com.fasterxml.jackson.databind.ser.std.StdSerializer;
import java.io.IOException;

/** Writes doubles, and refuses those that JSON has no number for, so that they are never written as strings. */
final class FiniteDoubleSerializer extends StdSerializer<Double> {

    private static final long serialVersionUID = 1L;

    FiniteDoubleSerializer() {
        super(Double.class);
    }

    @Override
    public void serialize(Double value, JsonGenerator generator, SerializerProvider provider) throws IOException {
        if (!Double.isFinite(value)) {
            throw JsonMappingException.from(generator, "a number must be finite, was " + value);
        }
        generator.writeNumber(value.doubleValue());
    }
}
