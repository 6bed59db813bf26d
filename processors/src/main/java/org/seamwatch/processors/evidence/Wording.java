package org.seamwatch.processors.evidence;

import java.util.List;
import java.util.Locale;

/** Small pieces of plain English. */
final class Wording {

    private static final int LONGEST_NAME = 120;

    private Wording() {}

    /** An id as a title: {@code hand-foot-mouth} becomes {@code Hand foot mouth}, {@code covid-19} {@code Covid-19}. */
    static String title(String id) {
        String spaced = id.replaceAll("[-_](?=\\p{L})", " ");
        int first = spaced.offsetByCodePoints(0, 1);
        return spaced.substring(0, first).toUpperCase(Locale.ROOT) + spaced.substring(first);
    }

    static String count(long n, String noun) {
        return n + " " + noun + (n == 1 ? "" : "s");
    }

    static String times(int n) {
        return n == 1 ? "once" : n + " times";
    }

    /** Always two decimals: values to be compared. */
    static String hundredths(double value) {
        return String.format(Locale.ROOT, "%.2f", value);
    }

    /** At most two decimals, none from 10 on. */
    static String number(double value) {
        String pattern = StrictMath.abs(value) >= 10 ? "%.0f" : "%.2f";
        String text = String.format(Locale.ROOT, pattern, value);
        return text.contains(".") ? text.replaceAll("\\.?0+$", "") : text;
    }

    /** {@code A, B and C}, or {@code A, B, C and 4 more}. */
    static String list(List<String> names, int more) {
        if (more > 0) {
            return String.join(", ", names) + " and " + more + " more";
        }
        if (names.size() == 1) {
            return names.get(0);
        }
        int last = names.size() - 1;
        return String.join(", ", names.subList(0, last)) + " and " + names.get(last);
    }

    /** A name at its whole length, or its beginning where it is longer than any name should be. */
    static String cut(String name) {
        if (name.codePointCount(0, name.length()) <= LONGEST_NAME) {
            return name;
        }
        return name.substring(0, name.offsetByCodePoints(0, LONGEST_NAME - 1)) + "\u2026";
    }

    static String statistic(String name) {
        return name.equals("moran") ? "clustering (Moran's I)" : name;
    }
}
