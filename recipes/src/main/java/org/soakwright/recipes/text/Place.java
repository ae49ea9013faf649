package org.soakwright.recipes.text;

import java.util.Comparator;

/** Where something stands in a file; line and column count from 1, and 0 means the file as a whole. */
public record Place(String file, int line, int column) implements Comparable<Place> {
    private static final Comparator<Place> READING_ORDER =
            Comparator.comparing(Place::file).thenComparingInt(Place::line).thenComparingInt(Place::column);

    public Place {
        if (line < 0 || column < 0) {
            throw new IllegalArgumentException("a place lies at line and column 0 or more: " + line + ":" + column);
        }
    }

    /** The file as a whole, for a problem that no line can carry. */
    public static Place of(String file) {
        return new Place(file, 0, 0);
    }

    @Override
    public int compareTo(Place other) {
        return READING_ORDER.compare(this, other);
    }

    /** {@code file:line:column}, or the bare file name where there is no line. */
    @Override
    public String toString() {
        return line == 0 ? file : file + ":" + line + ":" + column;
    }
}
