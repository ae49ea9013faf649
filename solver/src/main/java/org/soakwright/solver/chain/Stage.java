package org.soakwright.solver.chain;

import org.soakwright.solver.Require;
import org.soakwright.solver.shape.Grain;
import org.soakwright.solver.stage.Bath;
import org.soakwright.solver.stage.Conditions;
import org.soakwright.solver.stage.Surface;
import org.soakwright.solver.stage.Surfaces;

/**
 * One stage of one species: the same for as long as it lasts.
 *
 * @param diffusivity in the piece, m2/s; above 0
 * @param partition content of the piece over content of the surroundings at equilibrium; above 0
 * @param surfaces sealed if and only if the surroundings are a rest
 * @param clinging liquor that the pieces carry away at the end, m3; it joins the next liquor. 0 where no liquor is met
 * @param grain how the diffusivity differs by direction
 */
public record Stage(
        double diffusivity,
        double partition,
        Surfaces surfaces,
        Surroundings surroundings,
        double clinging,
        Grain grain) {
    public Stage {
        Require.positive("diffusivity", diffusivity, "m2/s");
        Require.positive("partition", partition, "1");
        Require.notNegative("clinging liquor", clinging, "m3");
        if (surfaces.sealed() != surroundings instanceof Surroundings.Rest) {
            throw new IllegalArgumentException("a sealed surface goes with a rest, and only with it");
        }
        if (clinging > 0 && !wets(surroundings)) {
            throw new IllegalArgumentException("only a liquor can cling, found " + clinging + " m3 in " + surroundings);
        }
    }

    /** One surface for all grades. */
    public Stage(
            double diffusivity,
            double partition,
            Surface surface,
            Surroundings surroundings,
            double clinging,
            Grain grain) {
        this(diffusivity, partition, new Surfaces.Alike(surface), surroundings, clinging, grain);
    }

    /** The same diffusivity in every direction, too. */
    public Stage(double diffusivity, double partition, Surface surface, Surroundings surroundings, double clinging) {
        this(diffusivity, partition, surface, surroundings, clinging, Grain.NONE);
    }

    /** Whether the pieces leave this stage with liquor of its own. */
    public boolean wets() {
        return wets(surroundings);
    }

    /** As one grade of the lot meets it, from 0. */
    Stage of(int grade) {
        return surfaces instanceof Surfaces.Alike
                ? this
                : new Stage(diffusivity, partition, surfaces.of(grade), surroundings, clinging, grain);
    }

    /** What decides the stage's modes, when so much liquor, m3, clings to the pieces from before. */
    Conditions conditions(double clinging) {
        Bath bath = new Bath.Unlimited();
        if (surroundings instanceof Surroundings.Vessel vessel) {
            double volume = vessel.flow() > 0 ? vessel.volume() : vessel.volume() + clinging;
            bath = new Bath.Vessel(volume, vessel.flow());
        }
        return new Conditions(diffusivity, partition, surfaces, bath, grain);
    }

    /** Share of what clings in the liquor that the stage starts with. */
    double mixed(double clinging) {
        return surroundings instanceof Surroundings.Vessel vessel ? clinging / (vessel.volume() + clinging) : 0;
    }

    /** Content of the surroundings from which the pieces are counted, kg/m3: of the feed, of the liquor, of the equilibrium in air. */
    public double offset() {
        if (surroundings instanceof Surroundings.Vessel vessel) {
            return vessel.flow() > 0 ? vessel.feed() : vessel.content();
        }
        if (surroundings instanceof Surroundings.Plenty plenty) {
            return plenty.content();
        }
        return surroundings instanceof Surroundings.Air air ? air.equilibrium() : 0;
    }

    private static boolean wets(Surroundings surroundings) {
        return surroundings instanceof Surroundings.Vessel || surroundings instanceof Surroundings.Plenty;
    }
}
