package org.soakwright.solver.stage;

import org.soakwright.solver.Require;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.shape.Grain;
import org.soakwright.solver.shape.Side;

/**
 * What decides the modes of a stage: everything but contents and duration. Equal conditions share one spectrum.
 *
 * @param diffusivity in the piece, m2/s; above 0
 * @param partition content of the piece over content of the liquor at equilibrium, (kg/m3)/(kg/m3); above 0
 */
public record Conditions(double diffusivity, double partition, Surfaces surfaces, Bath bath, Grain grain) {
    public Conditions {
        Require.positive("diffusivity", diffusivity, "m2/s");
        Require.positive("partition", partition, "1");
    }

    /** One surface for all grades. */
    public Conditions(double diffusivity, double partition, Surface surface, Bath bath, Grain grain) {
        this(diffusivity, partition, new Surfaces.Alike(surface), bath, grain);
    }

    /** The same in every direction, too. */
    public Conditions(double diffusivity, double partition, Surface surface, Bath bath) {
        this(diffusivity, partition, surface, bath, Grain.NONE);
    }

    /** As one of the grades meets them, from 0. */
    public Conditions of(int grade) {
        return surfaces instanceof Surfaces.Alike
                ? this
                : new Conditions(diffusivity, partition, surfaces.of(grade), bath, grain);
    }

    /** D/L^2 along the first side, 1/s: what turns a squared frequency into a rate. */
    public double pace(Grade grade) {
        return pace(grade, 0);
    }

    /** D/L^2 along a side, 1/s. */
    public double pace(Grade grade, int side) {
        Side along = grade.sides().get(side);
        return diffusivity(grade, along) / (along.length() * along.length());
    }

    /** Biot number k L/(K D) of the first side: 0 when sealed, infinite when there is no film. */
    public double biot(Grade grade) {
        return biot(grade, 0);
    }

    /** Biot number k L/(K D) of a side; of its front, where it lies between two faces: L is then the full thickness. */
    public double biot(Grade grade, int side) {
        return biot(grade, side, one().atFront());
    }

    /** Biot number k L/(K D) of a side's back, L the full thickness; 0 where it begins at the core. */
    public double biotOfBack(Grade grade, int side) {
        return grade.sides().get(side).twoFaced() ? biot(grade, side, one().atBack()) : 0;
    }

    private double biot(Grade grade, int side, Surface surface) {
        Side along = grade.sides().get(side);
        if (surface instanceof Surface.Film film) {
            return film.coefficient() * along.length() / (partition * diffusivity(grade, along));
        }
        return surface instanceof Surface.Sealed ? 0 : Double.POSITIVE_INFINITY;
    }

    private Surface one() {
        if (surfaces instanceof Surfaces.Alike alike) {
            return alike.surface();
        }
        throw new IllegalStateException("surfaces differ by grade: ask the conditions of one");
    }

    private double diffusivity(Grade grade, Side side) {
        return diffusivity * grade.ease() * grain.of(side);
    }

    /** Whether pieces and liquor change each other, so that their modes are coupled. */
    boolean coupled() {
        return bath instanceof Bath.Vessel && !surfaces.sealed();
    }
}
