package org.soakwright.recipes.text;

import java.util.Arrays;
import java.util.Collection;
import java.util.Comparator;
import java.util.Optional;

/** The known word that someone most likely meant. */
public final class Nearest {
    private Nearest() {}

    /** The closest of the words by edit distance; the earlier one of two equally close. Empty only for no words. */
    public static Optional<String> of(String found, Collection<String> known) {
        return known.stream().min(Comparator.comparingInt(word -> distance(found, word)));
    }

    /** {@code did you mean "x"?}, or the known words where there is nothing close. */
    public static String hint(String found, Collection<String> known) {
        return of(found, known)
                .filter(word -> distance(found, word) <= Math.max(2, word.length() / 2))
                .map(word -> "did you mean \"" + word + "\"?")
                .or(() -> of(found, known)
                        .map(word -> "known are " + String.join(", ", known) + "; the nearest is \"" + word + "\""))
                .orElse("none are known here");
    }

    /** Insertions, deletions, replacements and swaps of neighbours that turn one word into the other. */
    static int distance(String from, String to) {
        String a = from.length() > 100 ? from.substring(0, 100) : from;
        int[] beforeLast = new int[to.length() + 1];
        int[] last = new int[to.length() + 1];
        Arrays.setAll(last, j -> j);
        for (int i = 1; i <= a.length(); i++) {
            int[] row = new int[to.length() + 1];
            row[0] = i;
            for (int j = 1; j <= to.length(); j++) {
                int replaced = last[j - 1] + (a.charAt(i - 1) == to.charAt(j - 1) ? 0 : 1);
                row[j] = Math.min(replaced, Math.min(last[j], row[j - 1]) + 1);
                if (i > 1 && j > 1 && a.charAt(i - 1) == to.charAt(j - 2) && a.charAt(i - 2) == to.charAt(j - 1)) {
                    row[j] = Math.min(row[j], beforeLast[j - 2] + 1);
                }
            }
            beforeLast = last;
            last = row;
        }
        return last[to.length()];
    }
}
