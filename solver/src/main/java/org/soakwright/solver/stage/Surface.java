package org.soakwright.solver.stage;

import org.soakwright.solver.Require;

/** How the surface of the pieces meets what surrounds them. */
public sealed interface Surface {
    /** Nothing passes: the profile evens out. */
    record Sealed() implements Surface {}

    /** No resistance: the surface is in equilibrium with the surroundings at once. */
    record Open() implements Surface {}

    /**
     * A film in between.
     *
     * @param coefficient film coefficient on the liquor's side, m/s; above 0
     */
    record Film(double coefficient) implements Surface {
        public Film {
            Require.positive("film coefficient", coefficient, "m/s");
        }
    }

    /**
     * The two faces of a side between faces, each with its own; whatever else of the piece is wetted is like the front.
     *
     * @param back at position 0, usually behind a skin
     * @param front at position 1; not sealed where the back is: that is a rest
     */
    record Faces(Surface back, Surface front) implements Surface {
        public Faces {
            if (back instanceof Faces || front instanceof Faces) {
                throw new IllegalArgumentException("a face has one surface, found " + back + " and " + front);
            }
            if (back instanceof Sealed && front instanceof Sealed) {
                throw new IllegalArgumentException("two sealed faces are a sealed surface, found both sealed");
            }
        }
    }

    /** What the back of a side between faces meets. */
    default Surface atBack() {
        return this instanceof Faces faces ? faces.back : this;
    }

    /** What the front, or any other wetted surface, meets. */
    default Surface atFront() {
        return this instanceof Faces faces ? faces.front : this;
    }

    /**
     * A film and a skin one behind the other: their resistances add.
     *
     * @param film coefficient of the film, m/s; above 0, infinite where there is none
     * @param permeance of the peel, rind or coating, m/s, for differences counted as contents of the liquor; above 0
     */
    static Film inSeries(double film, double permeance) {
        Require.positive("permeance", permeance, "m/s");
        if (Double.isInfinite(film) && film > 0) {
            return new Film(permeance);
        }
        Require.positive("film coefficient", film, "m/s");
        return new Film(1 / (1 / film + 1 / permeance));
    }
}
