package org.soakwright.solver.transport;

/**
 * Films of liquor that moves only because it is denser or lighter at the surface; formulas and ranges in {@link
 * Correlation}.
 */
final class Rising {
    /** Gases lie at 0.5 to 3, hot brine at 50: between, the lower formula is the one for liquids. */
    private static final double LIQUID = 10;

    private static final double LYING_TURNS = 1e7;
    private static final double CUBE = 0.951;
    private static final double STUB = 0.967;

    private Rising() {}

    static Estimate film(Body body, Medium medium, double densityDifference) {
        if (body instanceof Body.Plate plate) {
            Case of = Case.still(body, medium, plate.length(), densityDifference);
            return liquid(of)
                    ? of.film(Correlation.STANDING_PLATE, 0.68 + 0.670 * laminar(of, 0.492))
                    : of.film(Correlation.STANDING_PLATE_IN_GAS, whole(of, 0.825, 0.492));
        }
        if (body instanceof Body.Lying plate) {
            return lying(plate, medium, densityDifference);
        }
        if (body instanceof Body.Cylinder cylinder) {
            Case of = Case.still(body, medium, cylinder.diameter(), densityDifference);
            return liquid(of)
                    ? of.film(Correlation.LYING_CYLINDER, 0.36 + 0.518 * laminar(of, 0.559))
                    : of.film(Correlation.LYING_CYLINDER_IN_GAS, whole(of, 0.60, 0.559));
        }
        if (body instanceof Body.Sphere sphere) {
            Case of = Case.still(body, medium, sphere.diameter(), densityDifference);
            return of.film(Correlation.STILL_SPHERE, 2 + 0.589 * laminar(of, 0.469));
        }
        return shortBody((Body.Bounded) body, medium, densityDifference);
    }

    private static boolean liquid(Case of) {
        return of.schmidt() >= LIQUID;
    }

    private static Estimate lying(Body.Lying plate, Medium medium, double densityDifference) {
        double length = plate.length() * plate.width() / (2 * (plate.length() + plate.width()));
        Case of = Case.still(plate, medium, length, densityDifference);
        double root = Math.pow(of.rayleigh(), 0.25);
        return of.rayleigh() <= LYING_TURNS
                ? of.film(Correlation.LYING_PLATE, (0.54 * root + 0.27 * root) / 2)
                : of.film(Correlation.LYING_PLATE_TURBULENT, (0.15 * Math.cbrt(of.rayleigh()) + 0.27 * root) / 2);
    }

    private static Estimate shortBody(Body.Bounded body, Medium medium, double densityDifference) {
        double root = Math.sqrt(body.area());
        Case of = Case.still(body, medium, root, densityDifference);
        double shape = body instanceof Body.ShortCylinder ? STUB : CUBE;
        double sherwood = body.pureDiffusion() * root + 0.67 * shape * laminar(of, 0.492);
        return of.film(Correlation.STILL_SHORT_BODY, sherwood);
    }

    private static double whole(Case of, double still, double thickness) {
        double viscous = Math.pow(1 + Math.pow(thickness / of.schmidt(), 9.0 / 16), 8.0 / 27);
        double root = still + 0.387 * Math.pow(of.rayleigh(), 1.0 / 6) / viscous;
        return root * root;
    }

    private static double laminar(Case of, double thickness) {
        return Math.pow(of.rayleigh(), 0.25) / Math.pow(1 + Math.pow(thickness / of.schmidt(), 9.0 / 16), 4.0 / 9);
    }
}
