package org.soakwright.recipes.model;

/** What is read off the profile of a piece. */
public enum Reading implements Word {
    MEAN,
    /** At the point farthest from every wetted face. */
    CORE,
    /** The piece's own content at the wetted face. */
    SURFACE,
    HIGHEST,
    LOWEST,
    /** Highest less lowest within one piece. */
    RANGE
}
