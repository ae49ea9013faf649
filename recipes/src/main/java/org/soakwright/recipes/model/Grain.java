package org.soakwright.recipes.model;

/** A direction in a piece in which a diffusivity of its own can hold. */
public enum Grain implements Word {
    /** Along the axis of a cylinder. */
    ALONG,
    /** From the axis of a cylinder outwards. */
    ACROSS,
    THICKNESS,
    WIDTH,
    LENGTH
}
