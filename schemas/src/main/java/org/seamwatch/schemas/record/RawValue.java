package org.seamwatch.schemas.record;

import org.jspecify.annotations.Nullable;

/**
 * A field's value as it came, not yet converted.
 *
 * @param kind its JSON type
 * @param text the text of a string or the digits of a number; else empty
 * @param object the members of an object whose members are wanted; else null
 */
record RawValue(Kind kind, String text, @Nullable RawObject object) {

    private static final int QUOTED = 80;

    /** A JSON type, and how it reads in a sentence. */
    enum Kind {
        TEXT("a string"),
        NUMBER("a number"),
        BOOLEAN("true or false"),
        NULL("null"),
        OBJECT("an object"),
        ARRAY("an array");

        private final String words;

        Kind(String words) {
            this.words = words;
        }

        String words() {
            return words;
        }
    }

    static RawValue of(Kind kind) {
        return new RawValue(kind, "", null);
    }

    /** The value for a sentence, cut where it is long. */
    String quoted() {
        return switch (kind) {
            case TEXT -> '"' + cut() + '"';
            case NUMBER -> cut();
            case BOOLEAN, NULL, OBJECT, ARRAY -> kind.words();
        };
    }

    /** A broken surrogate pair would make the sentence unwritable as UTF-8, a line feed would break a log line. */
    private String cut() {
        StringBuilder cut = new StringBuilder();
        text.codePoints()
                .limit(QUOTED)
                .forEach(c -> cut.appendCodePoint(TextRules.isControl(c) || TextRules.isSurrogate(c) ? '?' : c));
        return cut.length() < text.length() ? cut + "..." : cut.toString();
    }
}
