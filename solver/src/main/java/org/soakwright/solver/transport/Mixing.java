package org.soakwright.solver.transport;

/** Films in beds and stirred tanks; formulas and ranges in {@link Correlation}. */
final class Mixing {
    private static final double LIQUID = 165;
    private static final double BED_TURNS = 55;
    private static final double BED_ENDS = 1500;

    private Mixing() {}

    static Estimate packed(Body.Bounded body, Medium medium, Bed bed) {
        double diameter = body.equalSurface();
        double reynolds = bed.speed() * diameter / medium.fluid().kinematicViscosity();
        Case of = new Case(body, medium, diameter, reynolds, 0, bed.voids());
        double spread = Math.cbrt(of.schmidt());
        if (of.schmidt() < LIQUID || reynolds > BED_ENDS) {
            return of.film(Correlation.BED, 2 + 1.1 * Math.pow(reynolds, 0.6) * spread);
        }
        return reynolds <= BED_TURNS
                ? of.film(Correlation.BED_SLOW, 1.09 / bed.voids() * Math.cbrt(reynolds) * spread)
                : of.film(Correlation.BED_QUICK, 0.25 / bed.voids() * Math.pow(reynolds, 0.69) * spread);
    }

    static Estimate stirred(Body body, Medium medium, double powerPerVolume) {
        Fluid fluid = medium.fluid();
        double strength = powerPerVolume * fluid.viscosity() / (fluid.density() * fluid.density());
        double coefficient = 0.13 * Math.pow(strength, 0.25) * Math.pow(medium.schmidt(), -2.0 / 3);
        double length = length(body);
        Case of = new Case(body, medium, length, 0, 0, 1);
        return of.film(Correlation.STIRRED, coefficient * length / medium.diffusivity());
    }

    static Estimate suspended(Body.Sphere sphere, Medium medium, Stirring stirring) {
        double diameter = sphere.diameter();
        double eddies = Math.cbrt(stirring.power() * diameter)
                * diameter
                / medium.fluid().kinematicViscosity();
        Case of = new Case(sphere, medium, diameter, eddies, 0, 1);
        double moving = 0.47 * Math.pow(eddies, 0.62) * Math.pow(stirring.impellerShare(), 0.17);
        return of.film(Correlation.SUSPENDED, 2 + moving * Math.pow(of.schmidt(), 0.36));
    }

    static Estimate sinking(Body.Sphere sphere, Medium medium, double densityDifference) {
        Fluid fluid = medium.fluid();
        double diameter = sphere.diameter();
        Case of = Case.still(sphere, medium, diameter, densityDifference);
        double pull = densityDifference * fluid.viscosity() * Film.GRAVITY / (fluid.density() * fluid.density());
        double moving = 0.31 * Math.pow(of.schmidt(), -2.0 / 3) * Math.cbrt(pull);
        return of.film(Correlation.SINKING, 2 + moving * diameter / medium.diffusivity());
    }

    private static double length(Body body) {
        if (body instanceof Body.Plate plate) {
            return plate.length();
        }
        if (body instanceof Body.Lying plate) {
            return plate.length();
        }
        return body instanceof Body.Cylinder cylinder ? cylinder.diameter() : ((Body.Bounded) body).equalSurface();
    }
}
