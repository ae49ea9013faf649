package org.soakwright.recipes.model;

/** What part of the piece a content is counted against. */
public enum Phase implements Word {
    /** The solute and the water together: solute/(solute + water). */
    WATER,
    /** The water alone: solute/water. */
    MOISTURE
}
