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
