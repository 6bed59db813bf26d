package org.seamwatch.schemas.record;

/** What texts of a contract may hold. */
final class TextRules {

    /** Longest id, in Unicode characters. */
    static final int MAX_ID = 200;

    /** Longest note, in Unicode characters. */
    static final int MAX_NOTE = 2000;

    private TextRules() {}

    /** Whether it is a control character of ASCII or Latin-1 (Unicode category Cc). */
    static boolean isControl(int codePoint) {
        return Character.isISOControl(codePoint);
    }

    /** Whether it is half of a surrogate pair whose other half is missing; it cannot be written as UTF-8. */
    static boolean isSurrogate(int codePoint) {
        return codePoint >= Character.MIN_SURROGATE && codePoint <= Character.MAX_SURROGATE;
    }

    static int length(String text) {
        return text.codePointCount(0, text.length());
    }

    static boolean hasControl(String text) {
        for (int i = 0; i < text.length(); i++) {
            if (isControl(text.charAt(i))) {
                return true;
            }
        }
        return false;
    }

    static boolean hasBrokenPair(String text) {
        int i = 0;
        while (i < text.length()) {
            int codePoint = text.codePointAt(i);
            if (isSurrogate(codePoint)) {
                return true;
            }
            i += Character.charCount(codePoint);
        }
        return false;
    }
}
