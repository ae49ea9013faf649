package org.soakwright.recipes.model;

import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Unit;

/** What a content is counted against. */
public enum Basis {
    /** kg of solute per kg of piece as loaded, or of liquor. */
    PER_MASS,
    /** kg of solute per m3 of piece or of liquor. */
    PER_VOLUME,
    /** A share of what the piece held at the start; only a limit can be one. */
    OF_START;

    /** The basis of a content written in the unit. */
    public static Basis of(Unit unit) {
        return Kind.PER_VOLUME.unit(unit.symbol()).isPresent() ? PER_VOLUME : PER_MASS;
    }
}
