package org.seamwatch.schemas.record;

import com.fasterxml.jackson.annotation.JsonProperty;
import java.time.Instant;
import java.time.LocalDate;
import java.util.LinkedHashMap;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/** Converts the fields of one object, checking each; the first fault found is thrown. */
final class FieldReader {

    private final RawObject object;
    private final String prefix;

    FieldReader(RawObject object) {
        this(object, "");
    }

    private FieldReader(RawObject object, String prefix) {
        this.object = object;
        this.prefix = prefix;
    }

    boolean has(String name) {
        return object.get(name) != null;
    }

    /** Refuses any version but 1; absent means 1. */
    void version() throws Refused {
        RawValue value = object.get("version");
        if (value != null && integer("version", value, Long.MIN_VALUE, Long.MAX_VALUE) != 1) {
            throw refused(RejectReason.UNSUPPORTED_VERSION, "version", "must be 1", value);
        }
    }

    /** A non-empty id of at most 200 characters, without control characters. */
    String id(String name) throws Refused {
        return id(name, required(name));
    }

    /** An id without {@code /} and {@code |}, which join ids. */
    String plainId(String name) throws Refused {
        RawValue value = required(name);
        String id = id(name, value);
        if (id.indexOf('/') >= 0 || id.indexOf('|') >= 0) {
            throw refused(RejectReason.BAD_VALUE, name, "must not contain / or |", value);
        }
        return id;
    }

    private String id(String name, RawValue value) throws Refused {
        String text = text(name, value, TextRules.MAX_ID);
        if (text.isEmpty()) {
            throw refused(RejectReason.BAD_VALUE, name, "must not be empty", value);
        }
        if (TextRules.hasControl(text)) {
            throw refused(RejectReason.BAD_VALUE, name, "must have no control characters", value);
        }
        return text;
    }

    /** A free text, or null where there is none. */
    @Nullable
    String note(String name) throws Refused {
        RawValue value = object.get(name);
        return value == null ? null : text(name, value, TextRules.MAX_NOTE);
    }

    private String text(String name, RawValue value, int longest) throws Refused {
        type(name, value, RawValue.Kind.TEXT);
        if (TextRules.length(value.text()) > longest) {
            throw refused(RejectReason.BAD_VALUE, name, "must have at most " + longest + " characters", value);
        }
        if (TextRules.hasBrokenPair(value.text())) {
            throw refused(RejectReason.BAD_VALUE, name, "must have whole surrogate pairs", value);
        }
        return value.text();
    }

    /** One word of an enum. */
    <E extends Enum<E>> E word(String name, Words<E> words) throws Refused {
        RawValue value = required(name);
        type(name, value, RawValue.Kind.TEXT);
        E constant = words.get(value.text());
        if (constant == null) {
            throw refused(RejectReason.BAD_VALUE, name, "must be one of " + words, value);
        }
        return constant;
    }

    LocalDate date(String name) throws Refused {
        return date(name, required(name));
    }

    @Nullable
    LocalDate optionalDate(String name) throws Refused {
        RawValue value = object.get(name);
        return value == null ? null : date(name, value);
    }

    private LocalDate date(String name, RawValue value) throws Refused {
        type(name, value, RawValue.Kind.TEXT);
        LocalDate date = IsoText.date(value.text());
        if (date == null) {
            throw refused(RejectReason.BAD_VALUE, name, "must be a date like 2024-02-03", value);
        }
        year(name, date.getYear(), value);
        return date;
    }

    Instant instant(String name) throws Refused {
        RawValue value = required(name);
        type(name, value, RawValue.Kind.TEXT);
        Instant instant = IsoText.instant(value.text());
        if (instant == null) {
            throw refused(RejectReason.BAD_VALUE, name, "must be a time like 2024-02-03T08:30:00+01:00", value);
        }
        year(name, IsoText.year(value.text()), value);
        return instant;
    }

    private void year(String name, int year, RawValue value) throws Refused {
        if (year < IsoText.FIRST_YEAR || year > IsoText.LAST_YEAR) {
            throw refused(
                    RejectReason.OUT_OF_RANGE,
                    name,
                    "must lie in the years " + IsoText.FIRST_YEAR + " to " + IsoText.LAST_YEAR,
                    value);
        }
    }

    /** A whole number in a range, or the default where there is none. */
    long integer(String name, long lowest, long highest, long otherwise) throws Refused {
        RawValue value = object.get(name);
        return value == null ? otherwise : integer(name, value, lowest, highest);
    }

    private long integer(String name, RawValue value, long lowest, long highest) throws Refused {
        type(name, value, RawValue.Kind.NUMBER);
        NumberText number = NumberText.of(value.text());
        if (number.isFraction()) {
            throw refused(RejectReason.WRONG_TYPE, name, "must be a whole number", value);
        }
        if (number.isHuge() || number.whole() < lowest || number.whole() > highest) {
            throw refused(RejectReason.OUT_OF_RANGE, name, "must be in " + lowest + " to " + highest, value);
        }
        return number.whole();
    }

    /** A number in [-limit, limit]. */
    double degrees(String name, double limit) throws Refused {
        RawValue value = required(name);
        type(name, value, RawValue.Kind.NUMBER);
        double degrees = NumberText.decimal(value.text());
        if (!(Math.abs(degrees) <= limit)) {
            String rule = "must be in -" + (int) limit + " to " + (int) limit;
            throw refused(RejectReason.OUT_OF_RANGE, name, rule, value);
        }
        return degrees;
    }

    /** A reader of the members of an object; their names come with the object's. */
    FieldReader object(String name) throws Refused {
        RawValue value = required(name);
        if (value.object() == null) {
            throw refused(RejectReason.WRONG_TYPE, name, "must be an object", value);
        }
        return new FieldReader(value.object(), prefix + name + ".");
    }

    private RawValue required(String name) throws Refused {
        RawValue value = object.get(name);
        if (value == null) {
            throw new Refused(RejectReason.MISSING_FIELD, prefix + name, prefix + name + " must be there, was missing");
        }
        return value;
    }

    private void type(String name, RawValue value, RawValue.Kind kind) throws Refused {
        if (value.kind() != kind) {
            throw refused(RejectReason.WRONG_TYPE, name, "must be " + kind.words(), value);
        }
    }

    private Refused refused(RejectReason reason, String name, String rule, RawValue value) {
        return new Refused(reason, prefix + name, prefix + name + " " + rule + ", was " + value.quoted());
    }

    /** The words of an enum, as {@link JsonProperty} gives them. */
    static final class Words<E extends Enum<E>> {

        private final Map<String, E> constants = new LinkedHashMap<>();

        Words(Class<E> type) {
            for (E constant : type.getEnumConstants()) {
                constants.put(wordOf(type, constant), constant);
            }
        }

        private static <E extends Enum<E>> String wordOf(Class<E> type, E constant) {
            try {
                JsonProperty word = type.getField(constant.name()).getAnnotation(JsonProperty.class);
                return word == null ? constant.name() : word.value();
            } catch (NoSuchFieldException e) {
                throw new IllegalStateException(type + " has no field " + constant.name(), e);
            }
        }

        @Nullable
        E get(String word) {
            return constants.get(word);
        }

        @Override
        public String toString() {
            return String.join(", ", constants.keySet());
        }
    }
}
