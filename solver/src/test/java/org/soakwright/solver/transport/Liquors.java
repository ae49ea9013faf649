package org.soakwright.solver.transport;

/** Media made for a Schmidt number: one square millimetre per second, as heavy as water. */
final class Liquors {
    static final double NU = 1e-6;
    static final double DENSITY = 1000;

    private Liquors() {}

    static Medium ofSchmidt(double schmidt) {
        return new Medium(new Fluid(DENSITY, DENSITY * NU, 293.15), NU / schmidt);
    }

    /** The speed that makes a Reynolds number with a length. */
    static double speed(double reynolds, double length) {
        return reynolds * NU / length;
    }

    /** The density difference that makes a Rayleigh number with a length. */
    static Buoyancy buoyancy(double rayleigh, double schmidt, double length) {
        double grashof = rayleigh / schmidt;
        return new Buoyancy(grashof * NU * NU * DENSITY / (Film.GRAVITY * length * length * length));
    }
}
