package org.seamwatch.schemas.record;

import java.time.DateTimeException;
import java.time.Instant;
import java.time.LocalDate;
import org.jspecify.annotations.Nullable;

/**
 * Dates and times as RFC 3339 writes them, read by position: strict, and without a formatter on the hot path. Nothing of
 * local habit is taken: four digits of year, ASCII digits only, seconds always there, no leap second (its clock time is
 * read by no calendar here), at most nine digits of fraction, offsets up to 18 hours.
 */
final class IsoText {

    static final int FIRST_YEAR = 1900;
    static final int LAST_YEAR = 2200;

    private static final int DATE_LENGTH = 10;
    private static final int TIME_LENGTH = 19;
    private static final int MAX_FRACTION = 9;
    private static final int OFFSET_LENGTH = 6;
    private static final int MAX_OFFSET_SECONDS = 18 * 3600;

    private IsoText() {}

    /** The date, or null where the text is none. */
    static @Nullable LocalDate date(String text) {
        return text.length() == DATE_LENGTH ? datePart(text) : null;
    }

    /** The year a date or time begins with. */
    static int year(String text) {
        return digits(text, 0, 4);
    }

    private static @Nullable LocalDate datePart(String text) {
        int year = digits(text, 0, 4);
        int month = digits(text, 5, 7);
        int day = digits(text, 8, 10);
        if (year < 0 || month < 1 || month > 12 || day < 1 || text.charAt(4) != '-' || text.charAt(7) != '-') {
            return null;
        }
        try {
            return LocalDate.of(year, month, day);
        } catch (DateTimeException e) {
            return null;
        }
    }

    /** The instant, or null where the text is not a time with its offset. */
    static @Nullable Instant instant(String text) {
        if (text.length() <= TIME_LENGTH || (text.charAt(10) != 'T' && text.charAt(10) != 't')) {
            return null;
        }
        LocalDate date = datePart(text);
        int second = secondOfDay(text);
        int offsetAt = text.charAt(TIME_LENGTH) == '.' ? fractionEnd(text) : TIME_LENGTH;
        if (date == null || second < 0 || offsetAt < 0) {
            return null;
        }
        int offset = offset(text, offsetAt);
        if (offset == Integer.MIN_VALUE) {
            return null;
        }
        return Instant.ofEpochSecond(date.toEpochDay() * 86_400L + second - offset, nanos(text, offsetAt));
    }

    private static int secondOfDay(String text) {
        int hour = digits(text, 11, 13);
        int minute = digits(text, 14, 16);
        int second = digits(text, 17, 19);
        boolean inRange = hour >= 0 && hour < 24 && minute >= 0 && minute < 60 && second >= 0 && second < 60;
        return inRange && text.charAt(13) == ':' && text.charAt(16) == ':' ? hour * 3600 + minute * 60 + second : -1;
    }

    private static int fractionEnd(String text) {
        int end = TIME_LENGTH + 1;
        while (end < text.length() && isDigit(text.charAt(end))) {
            end++;
        }
        int length = end - TIME_LENGTH - 1;
        return length >= 1 && length <= MAX_FRACTION ? end : -1;
    }

    private static int nanos(String text, int end) {
        int nanos = 0;
        for (int i = 0; i < MAX_FRACTION; i++) {
            int at = TIME_LENGTH + 1 + i;
            nanos = nanos * 10 + (at < end ? text.charAt(at) - '0' : 0);
        }
        return nanos;
    }

    /** Seconds east of UTC, or {@link Integer#MIN_VALUE} where there is no offset to the end of the text. */
    private static int offset(String text, int at) {
        int length = text.length() - at;
        if (length == 1 && (text.charAt(at) == 'Z' || text.charAt(at) == 'z')) {
            return 0;
        }
        if (length != OFFSET_LENGTH || text.charAt(at + 3) != ':') {
            return Integer.MIN_VALUE;
        }
        int hours = digits(text, at + 1, at + 3);
        int minutes = digits(text, at + 4, at + 6);
        int seconds = hours * 3600 + minutes * 60;
        if (hours < 0 || minutes < 0 || minutes >= 60 || seconds > MAX_OFFSET_SECONDS) {
            return Integer.MIN_VALUE;
        }
        return switch (text.charAt(at)) {
            case '+' -> seconds;
            case '-' -> -seconds;
            default -> Integer.MIN_VALUE;
        };
    }

    /** The digits of [from, to) as a number, or -1 where one is no ASCII digit. */
    private static int digits(String text, int from, int to) {
        int number = 0;
        for (int i = from; i < to; i++) {
            char c = text.charAt(i);
            if (!isDigit(c)) {
                return -1;
            }
            number = number * 10 + (c - '0');
        }
        return number;
    }

    private static boolean isDigit(char c) {
        return c >= '0' && c <= '9';
    }
}
