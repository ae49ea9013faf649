package org.soakwright.solver.chain;

import org.soakwright.solver.Require;
import org.soakwright.solver.shape.Grain;
import org.soakwright.solver.stage.Surface;

/**
 * One stage of one species: the same for as long as it lasts.
 *
 * @param diffusivity in the piece, m2/s; above 0
 * @param partition content of the piece over content of the surroundings at equilibrium; above 0
 * @param surface sealed if and only if the surroundings are a rest
 * @param clinging liquor that the pieces carry away at the end, m3; it joins the next liquor. 0 where no liquor is met
 * @param grain how the diffusivity differs by direction
 */
public record Stage(
        double diffusivity,
        double partition,
        Surface surface,
        Surroundings surroundings,
        double clinging,
        Grain grain) {
    public Stage {
        Require.positive("diffusivity", diffusivity, "m2/s");
        Require.positive("partition", partition, "1");
        Require.notNegative("clinging liquor", clinging, "m3");
        if (surface instanceof Surface.Sealed != surroundings instanceof Surroundings.Rest) {
            throw new IllegalArgumentException("a sealed surface goes with a rest, and only with it");
        }
        if (clinging > 0 && !wets(surroundings)) {
            throw new IllegalArgumentException("only a liquor can cling, found " + clinging + " m3 in " + surroundings);
        }
    }

    /** The same diffusivity in every direction. */
    public Stage(double diffusivity, double partition, Surface surface, Surroundings surroundings, double clinging) {
        this(diffusivity, partition, surface, surroundings, clinging, Grain.NONE);
    }

    /** Whether the pieces leave this stage with liquor of its own. */
    public boolean wets() {
        return wets(surroundings);
    }

    private static boolean wets(Surroundings surroundings) {
        return surroundings instanceof Surroundings.Vessel || surroundings instanceof Surroundings.Plenty;
    }
}
