package org.soakwright.solver.stage;

import org.soakwright.solver.Require;
import org.soakwright.solver.shape.Grade;

/**
 * What decides the modes of a stage: everything but contents and duration. Equal conditions share one spectrum.
 *
 * @param diffusivity in the piece, m2/s; above 0
 * @param partition content of the piece over content of the liquor at equilibrium, (kg/m3)/(kg/m3); above 0
 */
public record Conditions(double diffusivity, double partition, Surface surface, Bath bath) {
    public Conditions {
        Require.positive("diffusivity", diffusivity, "m2/s");
        Require.positive("partition", partition, "1");
    }

    /** D/L^2, 1/s: what turns a squared frequency into a rate. */
    public double pace(Grade grade) {
        return diffusivity / (grade.length() * grade.length());
    }

    /** Biot number k L/(K D): 0 when sealed, infinite when there is no film. */
    public double biot(Grade grade) {
        if (surface instanceof Surface.Film film) {
            return film.coefficient() * grade.length() / (partition * diffusivity);
        }
        return surface instanceof Surface.Sealed ? 0 : Double.POSITIVE_INFINITY;
    }

    /** Whether pieces and liquor change each other, so that their modes are coupled. */
    boolean coupled() {
        return bath instanceof Bath.Vessel && !(surface instanceof Surface.Sealed);
    }
}
