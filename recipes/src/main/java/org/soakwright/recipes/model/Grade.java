package org.soakwright.recipes.model;

import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/**
 * Pieces of one shape and size.
 *
 * @param size thickness of a slab, diameter of a cylinder or a sphere; above zero
 * @param faces both, unless the shape is a slab sealed on one side
 * @param share of the lot's mass, above 0 up to 1
 */
public record Grade(Place place, String name, OneAxisShape shape, Quantity size, Faces faces, double share) {
    public Grade {
        Rules.named("a grade", name, place);
        Rules.positive("the " + shape.measure(), size);
        if (faces == Faces.ONE && shape != OneAxisShape.SLAB) {
            throw new Unsound(place, "only a slab has faces: found faces on a " + shape.word() + "; remove them");
        }
        if (!(share > 0 && share <= 1)) {
            throw new Unsound(place, "a share lies above 0 % and up to 100 %: found " + Rules.percent(share));
        }
    }

    /** Metres from the wetted surface to the core: half the size, or all of it where one face is sealed. */
    public double depth() {
        return faces == Faces.ONE ? size.si() : size.si() / 2;
    }
}
