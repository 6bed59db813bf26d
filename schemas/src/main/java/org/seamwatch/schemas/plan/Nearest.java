package org.seamwatch.schemas.plan;

import java.util.Collection;
import java.util.Locale;
import java.util.Optional;

/** Finds the known word that a misspelt one most likely meant. */
final class Nearest {

    private Nearest() {}

    /** The ending of a message about an unknown word: the words there are, and the nearest. */
    static String known(String word, Collection<String> known) {
        return ", known: " + String.join(", ", known) + suggestion(word, known);
    }

    /** {@code ; did you mean "x"?}, or nothing where no known word is near. */
    static String suggestion(String word, Collection<String> known) {
        return of(word, known).map(near -> "; did you mean \"" + near + "\"?").orElse("");
    }

    /** The known word with the fewest edits, the first of equals; none where more than half would have to change. */
    static Optional<String> of(String word, Collection<String> known) {
        String best = null;
        int fewest = Integer.MAX_VALUE;
        for (String candidate : known) {
            int edits = distance(word.toLowerCase(Locale.ROOT), candidate.toLowerCase(Locale.ROOT));
            if (edits < fewest) {
                best = candidate;
                fewest = edits;
            }
        }
        return best != null && 2 * fewest <= Math.max(word.length(), best.length())
                ? Optional.of(best)
                : Optional.empty();
    }

    /** Edits that turn one word into the other: insertions, deletions and replacements (Levenshtein 1966). */
    static int distance(String from, String to) {
        int[] previous = new int[to.length() + 1];
        for (int j = 0; j <= to.length(); j++) {
            previous[j] = j;
        }
        for (int i = 1; i <= from.length(); i++) {
            int[] current = new int[to.length() + 1];
            current[0] = i;
            for (int j = 1; j <= to.length(); j++) {
                int replaced = previous[j - 1] + (from.charAt(i - 1) == to.charAt(j - 1) ? 0 : 1);
                current[j] = Math.min(replaced, Math.min(previous[j], current[j - 1]) + 1);
            }
            previous = current;
        }
        return previous[to.length()];
    }
}
