package org.soakwright.recipes.library;

import org.soakwright.recipes.model.Word;

/** How much of a source was read by whoever wrote the figure or the caution down. */
public enum Read implements Word {
    /** The passage itself, in the source or in a copy of its text. */
    TEXT,
    /** The table itself. */
    TABLE,
    /** The abstract only. */
    ABSTRACT,
    /** What somebody else says that it says. */
    QUOTED,
    /** Nothing. */
    MEMORY
}
