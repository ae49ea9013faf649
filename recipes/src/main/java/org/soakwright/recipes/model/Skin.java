package org.soakwright.recipes.model;

import java.util.function.UnaryOperator;
import org.soakwright.recipes.text.Place;

/**
 * A layer on the piece that a species passes slowly.
 *
 * @param permeance m/s, above zero: the flux over the difference across it, counted as contents of the liquor
 * @param face which faces of the first side it covers; the whole surface is both
 */
public record Skin(Place place, Quantity permeance, Faces face) {
    public Skin {
        Rules.positive("a permeance", permeance);
    }

    public Skin each(UnaryOperator<Quantity> change) {
        return new Skin(place, change.apply(permeance), face);
    }
}
