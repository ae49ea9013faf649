package org.soakwright.recipes.library;

import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/**
 * Where a caution stands written.
 *
 * @param document such as 29 CFR, or common practice where it is only that
 * @param section in it; empty for common practice
 * @param dated the edition, or until when the text that was read was current
 * @param seen where it was read, where that was not the document itself; may be empty
 */
public record Authority(Place place, String document, String section, String dated, String seen, Read read) {
    /** The document of what is done everywhere and prescribed nowhere in particular. */
    public static final String COMMON_PRACTICE = "common practice";

    public Authority {
        boolean practice = document.equals(COMMON_PRACTICE);
        if (practice != section.isEmpty()) {
            throw new Unsound(
                    place,
                    practice
                            ? "common practice has no section: found \"" + section
                                    + "\"; remove it, or name the document"
                            : "a source needs section: found none; write such as 3-501.16");
        }
        if (practice && read != Read.MEMORY) {
            throw new Unsound(
                    place, "common practice is from memory: found read \"" + read.word() + "\"; name what was read");
        }
    }

    /** {@code FDA Food Code 3-501.16}. */
    public String cited() {
        return section.isEmpty() ? document : document + " " + section;
    }
}
