package org.soakwright.recipes.text;

import java.util.Comparator;

/**
 * Something wrong in a file, said once: what is wrong, what was found, what would be right. Unknown keys sort first,
 * because a misspelt key usually causes the problems after it; the rest follows the file.
 */
public record Problem(Place place, Rank rank, String what) implements Comparable<Problem> {
    private static final Comparator<Problem> ORDER =
            Comparator.comparing(Problem::rank).thenComparing(Problem::place).thenComparing(Problem::what);

    /** Which problems come first. */
    public enum Rank {
        UNKNOWN_KEY,
        OTHER
    }

    public Problem(Place place, String what) {
        this(place, Rank.OTHER, what);
    }

    @Override
    public int compareTo(Problem other) {
        return ORDER.compare(this, other);
    }

    /** {@code file:line:column: what}. */
    @Override
    public String toString() {
        return place + ": " + what;
    }
}
