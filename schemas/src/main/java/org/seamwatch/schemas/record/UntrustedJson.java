package org.seamwatch.schemas.record;

import com.fasterxml.jackson.core.JacksonException;
import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.core.StreamReadConstraints;
import com.fasterxml.jackson.core.StreamReadFeature;
import com.fasterxml.jackson.core.exc.StreamConstraintsException;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import org.jspecify.annotations.Nullable;

/** Takes any bytes apart into the fields of a contract, without trust and without building a tree of what it skips. */
final class UntrustedJson {

    /** Deepest nesting of objects and arrays. */
    static final int MAX_DEPTH = 32;

    /** Longest name or text of a known field, in characters; the contracts' own limits are far below. */
    static final int MAX_TEXT = 64 * 1024;

    /** Longest record, in bytes; a report takes some hundreds. */
    static final int MAX_BYTES = 256 * 1024;

    private static final JsonFactory FACTORY = JsonFactory.builder()
            .streamReadConstraints(StreamReadConstraints.builder()
                    .maxNestingDepth(MAX_DEPTH)
                    .maxStringLength(MAX_TEXT)
                    .maxNameLength(MAX_TEXT)
                    // Numbers are kept as text and measured before they are converted.
                    .maxNumberLength(Integer.MAX_VALUE)
                    .build())
            // Names a sender invents must not stay in a table that outlives the record.
            .disable(JsonFactory.Feature.CANONICALIZE_FIELD_NAMES)
            .disable(JsonFactory.Feature.INTERN_FIELD_NAMES)
            .disable(StreamReadFeature.INCLUDE_SOURCE_IN_LOCATION)
            .build();

    private UntrustedJson() {}

    /** The known fields of the object that the bytes are. */
    static RawObject read(byte @Nullable [] value, KnownFields known) throws Refused {
        if (value == null) {
            throw new Refused(RejectReason.NULL_VALUE, "", "a record must have a value, had none");
        }
        if (value.length > MAX_BYTES) {
            throw new Refused(
                    RejectReason.TOO_LARGE,
                    "",
                    "a record must have at most " + MAX_BYTES + " bytes, had " + value.length);
        }
        try (JsonParser parser = FACTORY.createParser(text(value))) {
            return document(parser, known);
        } catch (StreamConstraintsException e) {
            throw tooMuch(e);
        } catch (JacksonException e) {
            throw notJson(e);
        } catch (IOException e) {
            throw new Refused(RejectReason.NOT_JSON, "", "the value must be one JSON object, could not be read");
        }
    }

    private static RawObject document(JsonParser parser, KnownFields known) throws IOException, Refused {
        JsonToken first = parser.nextToken();
        if (first == null) {
            throw new Refused(RejectReason.NOT_JSON, "", "the value must be one JSON object, was empty");
        }
        if (first != JsonToken.START_OBJECT) {
            // What does not even parse is "not JSON" rather than "not an object".
            parser.skipChildren();
            atEnd(parser);
            throw new Refused(RejectReason.NOT_AN_OBJECT, "", "the value must be a JSON object, was " + words(first));
        }
        RawObject object = RawObject.read(parser, known);
        atEnd(parser);
        return object;
    }

    private static void atEnd(JsonParser parser) throws IOException, Refused {
        if (parser.nextToken() != null) {
            throw new Refused(
                    RejectReason.NOT_JSON, "", "the value must be one JSON object, has more behind it" + at(parser));
        }
    }

    /** Decodes strictly; the slow check runs only where the fast decoder has put a replacement character. */
    private static String text(byte[] value) throws Refused {
        String text = new String(value, StandardCharsets.UTF_8);
        if (text.indexOf('\uFFFD') >= 0) {
            try {
                StandardCharsets.UTF_8.newDecoder().decode(ByteBuffer.wrap(value));
            } catch (CharacterCodingException e) {
                throw new Refused(RejectReason.NOT_UTF8, "", "the value must be UTF-8, has bytes that are not");
            }
        }
        return text;
    }

    private static Refused tooMuch(StreamConstraintsException e) {
        // The exception has no code for the kind of limit; its text for depth is pinned by a test.
        if (e.getOriginalMessage().contains("nesting depth")) {
            return new Refused(
                    RejectReason.TOO_DEEP, "", "objects and arrays must be nested at most " + MAX_DEPTH + " deep");
        }
        return new Refused(RejectReason.TOO_LARGE, "", "names of fields must have at most " + MAX_TEXT + " characters");
    }

    /** Jackson's own message quotes the input, so only the place is told. */
    private static Refused notJson(JacksonException e) {
        return new Refused(
                RejectReason.NOT_JSON,
                "",
                "the value must be one JSON object, breaks at line "
                        + e.getLocation().getLineNr() + ", column "
                        + e.getLocation().getColumnNr());
    }

    private static String at(JsonParser parser) {
        return " at line " + parser.currentTokenLocation().getLineNr() + ", column "
                + parser.currentTokenLocation().getColumnNr();
    }

    private static String words(JsonToken token) {
        return switch (token) {
            case START_ARRAY -> "an array";
            case VALUE_STRING -> "a string";
            case VALUE_NULL -> "null";
            case VALUE_TRUE, VALUE_FALSE -> "true or false";
            default -> "a number";
        };
    }
}
