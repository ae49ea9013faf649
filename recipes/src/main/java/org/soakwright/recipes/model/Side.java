package org.soakwright.recipes.model;

import java.util.function.UnaryOperator;
import org.soakwright.recipes.text.Unsound;

/**
 * One extent of a piece.
 *
 * @param size above zero
 * @param faces both, unless one of the two at its ends is sealed
 */
public record Side(Dimension dimension, Quantity size, Faces faces) {
    public Side {
        Rules.positive("the " + dimension.word(), size);
        if (faces == Faces.ONE && !dimension.hasFaces()) {
            throw new Unsound(size.place(), "a " + dimension.word() + " has no faces to seal");
        }
    }

    public Side each(UnaryOperator<Quantity> change) {
        return new Side(dimension, change.apply(size), faces);
    }

    /** Metres from the wetted face to where the solute has farthest to go: half the size, or all of it with one face. */
    public double depth() {
        return faces == Faces.ONE ? size.si() : size.si() / 2;
    }
}
