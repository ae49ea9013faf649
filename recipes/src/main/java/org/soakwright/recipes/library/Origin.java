package org.soakwright.recipes.library;

import org.soakwright.recipes.text.Unsound;

/**
 * Where a figure comes from and what it is worth.
 *
 * @param method how it was found, as far as the source tells; may be empty
 * @param at the table, row or page of the publication
 * @param note what whoever uses it should know; may be empty
 */
public record Origin(Trust trust, String method, Publication publication, String at, String note) {
    public Origin {
        if ((trust == Trust.FROM_MEMORY) != (publication.read() == Read.MEMORY)) {
            throw new Unsound(
                    publication.place(),
                    "a figure is from memory exactly when nothing of its source was read: found trust \"" + trust.word()
                            + "\" where read is \"" + publication.read().word() + "\"; correct one of them");
        }
    }

    /** Whether a source stands behind it that somebody opened. */
    public boolean isRead() {
        return trust != Trust.FROM_MEMORY;
    }
}
