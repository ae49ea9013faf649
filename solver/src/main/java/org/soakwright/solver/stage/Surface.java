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
}
