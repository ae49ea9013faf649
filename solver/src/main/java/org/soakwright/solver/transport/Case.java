package org.soakwright.solver.transport;

import java.util.ArrayList;
import java.util.List;

/**
 * One body in one medium: the values that correlations are stated in, and the film that follows from a Sherwood number.
 */
record Case(Body body, Medium medium, double length, double reynolds, double grashof, double voids) {
    static Case past(Body body, Medium medium, double length, double speed) {
        double reynolds = speed * length / medium.fluid().kinematicViscosity();
        return new Case(body, medium, length, reynolds, 0, 1);
    }

    static Case still(Body body, Medium medium, double length, double densityDifference) {
        double nu = medium.fluid().kinematicViscosity();
        double reduced = Film.GRAVITY * densityDifference / medium.fluid().density();
        return new Case(body, medium, length, 0, reduced * length * length * length / (nu * nu), 1);
    }

    double schmidt() {
        return medium.schmidt();
    }

    double rayleigh() {
        return grashof * schmidt();
    }

    /** The film that a correlation gives, but not less than diffusion alone would carry. */
    Estimate film(Correlation correlation, double sherwood) {
        List<Caution> cautions = new ArrayList<>(medium.fluid().cautions());
        for (Limit limit : correlation.limits()) {
            limit.of(correlation.title()).note(value(limit.group()), cautions);
        }
        if (!correlation.rangeKnown()) {
            cautions.add(new Caution.Note("the range of " + correlation.title() + " is not known here"));
        }
        double coefficient = sherwood * medium.diffusivity() / length;
        double least = body.pureDiffusion() * medium.diffusivity();
        if (coefficient < least) {
            cautions.add(new Caution.Note(correlation.title() + " gives " + Figure.shown(coefficient, "m/s")
                    + ", less than diffusion alone: raised to " + Figure.shown(least, "m/s")));
            coefficient = least;
        }
        Groups groups = new Groups(length, reynolds, schmidt(), grashof, coefficient * length / medium.diffusivity());
        return new Estimate(coefficient, groups, List.of(correlation), correlation.within(), cautions);
    }

    private double value(Group group) {
        return switch (group) {
            case REYNOLDS -> reynolds;
            case SCHMIDT -> schmidt();
            case RAYLEIGH -> rayleigh();
            case PECLET -> reynolds * schmidt();
            case VOIDS -> voids;
            case ASPECT -> body instanceof Body.Bounded bounded ? bounded.aspect() : 1;
            case DIAMETER -> length;
        };
    }
}
