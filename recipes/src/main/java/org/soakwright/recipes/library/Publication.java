package org.soakwright.recipes.library;

import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/**
 * Where figures were published.
 *
 * @param author empty where it was not shown where it was read
 * @param year null where it was not shown there
 * @param in the journal, report or book, with volume and pages where they were shown; empty where not
 */
public record Publication(
        Place place, String author, @Nullable Integer year, String title, String in, Read read) {
    private static final int EARLIEST = 1850;
    private static final int LATEST = 2100;

    public Publication {
        if (year != null && (year < EARLIEST || year > LATEST)) {
            throw new Unsound(
                    place,
                    "a year lies from " + EARLIEST + " to " + LATEST + ": found " + year + "; write such as 2010");
        }
    }

    /** {@code Guinee and Fox 1983, Journal of Dairy Research 50}; the title where the author is unknown. */
    @Override
    public String toString() {
        return (author.isEmpty() ? title : author) + (year == null ? "" : " " + year) + (in.isEmpty() ? "" : ", " + in);
    }
}
