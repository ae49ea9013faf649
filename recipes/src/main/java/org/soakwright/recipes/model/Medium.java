package org.soakwright.recipes.model;

/** What a species can leave the piece into, or enter it from. */
public enum Medium implements Word {
    LIQUOR,
    AIR
}
