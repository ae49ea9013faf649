package org.soakwright.solver.transport;

/** Films of liquor that runs past a body; formulas and ranges in {@link Correlation}. */
final class Flowing {
    private static final double PLATE_TURNS = 5e5;
    private static final double SPHERE_CREEPS = 1;
    private static final double SPHERE_SLOW = 100;
    private static final double SPHERE_FAST = 2000;
    private static final double GAS = 2.7;

    private Flowing() {}

    static Estimate film(Body body, Medium medium, double speed) {
        if (body instanceof Body.Plate plate) {
            return plate(Case.past(body, medium, plate.length(), speed));
        }
        if (body instanceof Body.Lying plate) {
            return plate(Case.past(body, medium, plate.length(), speed));
        }
        if (body instanceof Body.Cylinder cylinder) {
            return cylinder(Case.past(body, medium, cylinder.diameter(), speed));
        }
        if (body instanceof Body.Sphere sphere) {
            return sphere(Case.past(body, medium, sphere.diameter(), speed));
        }
        return shortBody((Body.Bounded) body, medium, speed);
    }

    private static Estimate plate(Case of) {
        double spread = Math.cbrt(of.schmidt());
        return of.reynolds() <= PLATE_TURNS
                ? of.film(Correlation.PLATE_LAMINAR, 0.664 * Math.sqrt(of.reynolds()) * spread)
                : of.film(Correlation.PLATE_MIXED, (0.037 * Math.pow(of.reynolds(), 0.8) - 871) * spread);
    }

    private static Estimate cylinder(Case of) {
        double laminar = 0.62 * Math.sqrt(of.reynolds()) * Math.cbrt(of.schmidt());
        double thin = Math.pow(1 + Math.pow(0.4 / of.schmidt(), 2.0 / 3), 0.25);
        double quick = Math.pow(1 + Math.pow(of.reynolds() / 282_000, 0.625), 0.8);
        return of.film(Correlation.CYLINDER, 0.3 + laminar / thin * quick);
    }

    private static Estimate sphere(Case of) {
        double re = of.reynolds();
        double spread = Math.cbrt(of.schmidt());
        if (of.schmidt() <= GAS) {
            return of.film(Correlation.SPHERE_IN_GAS, 2 + 0.552 * Math.pow(re, 0.53) * spread);
        }
        if (re <= SPHERE_CREEPS) {
            return of.film(Correlation.SPHERE_CREEPING, 1 + Math.cbrt(1 + re * of.schmidt()));
        }
        if (re <= SPHERE_SLOW) {
            double still = Math.cbrt(1 + 1 / (re * of.schmidt()));
            return of.film(Correlation.SPHERE_SLOW, 1 + still * Math.pow(re, 0.41) * spread);
        }
        return re <= SPHERE_FAST
                ? of.film(Correlation.SPHERE_MIDDLE, 1 + 0.724 * Math.pow(re, 0.48) * spread)
                : of.film(Correlation.SPHERE_FAST, 1 + 0.425 * Math.pow(re, 0.55) * spread);
    }

    private static Estimate shortBody(Body.Bounded body, Medium medium, double speed) {
        double root = Math.sqrt(body.area());
        Case of = Case.past(body, medium, root, speed);
        double girth = Equivalent.girth(body) / root;
        double moving = 0.15 * Math.sqrt(girth * of.reynolds()) + 0.35 * Math.pow(of.reynolds(), 0.566);
        return of.film(Correlation.SHORT_BODY, body.pureDiffusion() * root + moving * Math.cbrt(of.schmidt()));
    }
}
