package org.seamwatch.schemas.record;

import java.math.BigDecimal;

/**
 * A JSON number as a whole number, without ever building a value that its exponent blows up. As in JSON Schema, 3.0 and
 * 30e-1 are the whole number 3.
 *
 * @param whole the value, where it is neither a fraction nor huge
 * @param isFraction whether it is no whole number
 * @param isHuge whether it does not fit a long, or has more than 100 characters
 */
record NumberText(long whole, boolean isFraction, boolean isHuge) {

    private static final int MAX_CHARS = 100;
    private static final int SAFE_DIGITS = 18;

    static NumberText of(String text) {
        if (isPlain(text)) {
            return new NumberText(Long.parseLong(text), false, false);
        }
        if (text.length() > MAX_CHARS) {
            return new NumberText(0, false, true);
        }
        try {
            return of(new BigDecimal(text));
        } catch (NumberFormatException e) {
            // An exponent beyond an int.
            return new NumberText(0, false, true);
        }
    }

    private static NumberText of(BigDecimal value) {
        if (value.signum() == 0) {
            return new NumberText(0, false, false);
        }
        if ((long) value.precision() - value.scale() > SAFE_DIGITS + 1) {
            return new NumberText(0, false, true);
        }
        // At most 100 digits are left to strip, whatever the exponent.
        BigDecimal shortest = value.stripTrailingZeros();
        if (shortest.scale() > 0) {
            return new NumberText(0, true, false);
        }
        return shortest.compareTo(BigDecimal.valueOf(Long.MAX_VALUE)) > 0
                        || shortest.compareTo(BigDecimal.valueOf(Long.MIN_VALUE)) < 0
                ? new NumberText(0, false, true)
                : new NumberText(shortest.longValueExact(), false, false);
    }

    private static boolean isPlain(String text) {
        int start = text.startsWith("-") ? 1 : 0;
        if (text.length() == start || text.length() > start + SAFE_DIGITS) {
            return false;
        }
        for (int i = start; i < text.length(); i++) {
            if (text.charAt(i) < '0' || text.charAt(i) > '9') {
                return false;
            }
        }
        return true;
    }

    /** The number as a double; NaN where it has more than 100 characters. Minus zero is zero. */
    static double decimal(String text) {
        return text.length() > MAX_CHARS ? Double.NaN : Double.parseDouble(text) + 0.0;
    }
}
