package org.soakwright.recipes.model;

/** What is measured of a piece. */
public enum Dimension implements Word {
    THICKNESS,
    WIDTH,
    LENGTH,
    DIAMETER;

    /** Whether it ends in two faces, one of which can be sealed; a diameter is wetted all round. */
    public boolean hasFaces() {
        return this != DIAMETER;
    }
}
