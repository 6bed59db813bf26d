package org.seamwatch.schemas.record;

import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.core.exc.StreamConstraintsException;
import java.io.IOException;
import java.util.HashMap;
import java.util.HashSet;
import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;

/** The members of a JSON object that a contract knows. The others are skipped and never held: they may be personal data. */
final class RawObject {

    private final Map<String, RawValue> members;

    private RawObject(Map<String, RawValue> members) {
        this.members = members;
    }

    @Nullable
    RawValue get(String name) {
        return members.get(name);
    }

    /** Reads the object whose start the parser stands on, to its end. */
    static RawObject read(JsonParser parser, KnownFields known) throws IOException, Refused {
        Map<String, RawValue> members = new HashMap<>(2 * known.size());
        Set<String> unknown = new HashSet<>(0);
        while (parser.nextToken() == JsonToken.FIELD_NAME) {
            String name = parser.currentName();
            parser.nextToken();
            if (known.contains(name)) {
                if (members.put(name, value(parser, name, known)) != null) {
                    String path = known.path(name);
                    throw new Refused(
                            RejectReason.DUPLICATE_FIELD, path, path + " must be there once, was there twice");
                }
            } else {
                parser.skipChildren();
                if (!unknown.add(name)) {
                    throw new Refused(
                            RejectReason.DUPLICATE_FIELD,
                            "",
                            "each field must be there once, an unknown one was twice");
                }
            }
        }
        return new RawObject(members);
    }

    private static RawValue value(JsonParser parser, String name, KnownFields known) throws IOException, Refused {
        return switch (parser.currentToken()) {
            case VALUE_STRING -> new RawValue(RawValue.Kind.TEXT, text(parser, known.path(name)), null);
            case VALUE_NUMBER_INT, VALUE_NUMBER_FLOAT ->
                new RawValue(RawValue.Kind.NUMBER, text(parser, known.path(name)), null);
            case VALUE_TRUE, VALUE_FALSE -> RawValue.of(RawValue.Kind.BOOLEAN);
            case START_ARRAY -> skipped(parser, RawValue.Kind.ARRAY);
            case START_OBJECT -> object(parser, known.membersOf(name));
            default -> RawValue.of(RawValue.Kind.NULL);
        };
    }

    private static String text(JsonParser parser, String path) throws IOException, Refused {
        try {
            return parser.getText();
        } catch (StreamConstraintsException e) {
            throw new Refused(
                    RejectReason.TOO_LARGE,
                    path,
                    path + " must have at most " + UntrustedJson.MAX_TEXT + " characters, has more");
        }
    }

    private static RawValue object(JsonParser parser, @Nullable KnownFields wanted) throws IOException, Refused {
        return wanted == null
                ? skipped(parser, RawValue.Kind.OBJECT)
                : new RawValue(RawValue.Kind.OBJECT, "", read(parser, wanted));
    }

    private static RawValue skipped(JsonParser parser, RawValue.Kind kind) throws IOException {
        parser.skipChildren();
        return RawValue.of(kind);
    }
}
