package org.soakwright.recipes.model;

/** Which mass of the piece a content by mass is counted against. */
public enum Per implements Word {
    /** All of it as loaded. */
    LOADED,
    /** All of it at the time of reading. */
    PRESENT,
    /** All of it that is not water, as loaded. */
    DRY
}
