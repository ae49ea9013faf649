package org.soakwright.solver.chain;

import org.soakwright.solver.Require;

/** What the pieces are put into during a stage, as it is prepared. */
public sealed interface Surroundings {
    /** Nothing is exchanged; liquor from before goes on clinging to the pieces. */
    record Rest() implements Surroundings {}

    /**
     * Air; liquor from before goes on clinging to the pieces.
     *
     * @param equilibrium content over partition towards which the surface goes, kg/m3
     */
    record Air(double equilibrium) implements Surroundings {
        public Air {
            Require.notNegative("equilibrium content", equilibrium, "kg/m3");
        }
    }

    /**
     * So much liquor that its content does not change.
     *
     * @param content kg/m3
     */
    record Plenty(double content) implements Surroundings {
        public Plenty {
            Require.notNegative("liquor content", content, "kg/m3");
        }
    }

    /**
     * A well-stirred volume of liquor. What clings to the pieces from before joins it: a closed vessel then holds that
     * much more, a flowing one overflows to its volume.
     *
     * @param volume liquor poured, m3; above 0
     * @param content of the liquor poured, kg/m3
     * @param flow liquor running in and over, m3/s; 0 for a closed vessel
     * @param feed content of the liquor running in, kg/m3
     */
    record Vessel(double volume, double content, double flow, double feed) implements Surroundings {
        public Vessel {
            Require.positive("liquor volume", volume, "m3");
            Require.notNegative("liquor content", content, "kg/m3");
            Require.notNegative("flow", flow, "m3/s");
            Require.notNegative("feed content", feed, "kg/m3");
        }
    }
}
