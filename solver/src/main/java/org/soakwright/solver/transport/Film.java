package org.soakwright.solver.transport;

import org.soakwright.solver.Require;

/**
 * Films around pieces, by what is known of the motion of the liquor. Each gives a mean over the piece, on the liquor's
 * side, together with the correlation it is from and a caution for whatever lies outside that one's range; ranges and
 * sources stand with {@link Correlation}. Properties are meant halfway between surface and bulk. No film is less than
 * what diffusion alone carries from the body.
 */
public final class Film {
    /** Standard gravity, m/s2. */
    public static final double GRAVITY = 9.80665;

    private Film() {}

    /**
     * Liquor or air that runs past a piece. A plate is laminar up to Re 5e5; a sphere goes through four regimes that
     * meet; bricks and short cylinders go by the root of their surface and the least girth they can turn to the flow.
     *
     * @param speed of the liquor away from the piece, m/s; above 0
     */
    public static Estimate past(Body body, Medium medium, double speed) {
        Require.positive("speed", speed, "m/s");
        return Flowing.film(body, medium, speed);
    }

    /**
     * Still liquor, which only the difference in density between surface and bulk moves. The difference depends on the
     * film in turn: {@link Settled#of} finds both.
     */
    public static Estimate still(Body body, Medium medium, Buoyancy buoyancy) {
        return Rising.film(body, medium, buoyancy.size()).and(buoyancy.cautions());
    }

    /**
     * Slow flow and density at once, by the cubes of the coefficients: for flow along or across what density does. Each
     * matters from Gr/Re^2 about 0.1 to 10; where they oppose each other this is too much.
     */
    public static Estimate together(Estimate past, Estimate still) {
        return Estimate.together(past, still);
    }

    /**
     * Pieces held or tumbling in stirred liquor.
     *
     * @param powerPerVolume that the impeller gives to the liquor, W/m3; above 0
     */
    public static Estimate stirred(Body body, Medium medium, double powerPerVolume) {
        Require.positive("power per volume", powerPerVolume, "W/m3");
        return Mixing.stirred(body, medium, powerPerVolume);
    }

    /**
     * Small pieces, about as dense as the liquor, suspended by an impeller. The Reynolds number is that of the eddies.
     */
    public static Estimate suspended(Body.Sphere sphere, Medium medium, Stirring stirring) {
        return Mixing.suspended(sphere, medium, stirring);
    }

    /**
     * Small pieces that sink or rise freely by their own density.
     *
     * @param densityDifference between piece and liquor, kg/m3; at least 0
     */
    public static Estimate sinking(Body.Sphere sphere, Medium medium, double densityDifference) {
        Require.notNegative("density difference", densityDifference, "kg/m3");
        return Mixing.sinking(sphere, medium, densityDifference);
    }

    /** Liquor or air that runs through a bed of pieces; each counts as the sphere of its surface. */
    public static Estimate packed(Body.Bounded body, Medium medium, Bed bed) {
        return Mixing.packed(body, medium, bed);
    }
}
