package org.soakwright.recipes.model;

import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Unit;

/** What a content is counted against. */
public enum Basis {
    /** kg of solute per kg of piece as loaded, or of liquor. */
    PER_MASS,
    /** kg of solute per m3 of piece or of liquor. */
    PER_VOLUME,
    /** mol of solute per m3 of liquor. */
    PER_AMOUNT,
    /** A part of what the liquor can dissolve. */
    OF_SATURATION,
    /** A share of what the piece held at the start; only a limit can be one. */
    OF_START;

    /** The basis of a content written in the unit. */
    public static Basis of(Unit unit) {
        if (Kind.PER_VOLUME.has(unit)) {
            return PER_VOLUME;
        }
        return Kind.PER_AMOUNT.has(unit) ? PER_AMOUNT : Kind.SATURATION.has(unit) ? OF_SATURATION : PER_MASS;
    }
}
