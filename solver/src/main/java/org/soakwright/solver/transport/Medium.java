package org.soakwright.solver.transport;

import org.soakwright.solver.Require;

/**
 * A fluid and what moves in it.
 *
 * @param fluid the liquor or the air
 * @param diffusivity of the solute, or of the vapour, in the fluid, m2/s; above 0
 */
public record Medium(Fluid fluid, double diffusivity) {
    public Medium {
        Require.positive("diffusivity", diffusivity, "m2/s");
    }

    /** Kinematic viscosity over diffusivity, 1. */
    public double schmidt() {
        return fluid.kinematicViscosity() / diffusivity;
    }
}
