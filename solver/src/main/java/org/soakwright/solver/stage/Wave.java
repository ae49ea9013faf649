package org.soakwright.solver.stage;

import org.soakwright.solver.shape.Axis;

/** Scratch for a standing wave at the surface: u, u' = v, and the scaled film defect (1 - beta) z v + beta u. */
final class Wave {
    /**
     * How far from a root, relative to min(1, z), the Taylor series of u is used. Beyond it the direct form loses no more than
     * two bits; within it fourteen terms end below 1e-19.
     */
    static final double NEAR = 0.25;

    static final int TERMS = 15;

    double z;
    double u;
    double v;
    double defect;

    void direct(Axis axis, double beta, double at) {
        z = at;
        u = axis.wave(at);
        v = axis.slope(at);
        defect = (1 - beta) * at * v + beta * u;
    }

    /**
     * At root + h, from the Taylor coefficients about a root, where the defect vanishes: everything keeps its relative precision as h
     * goes to 0.
     */
    void near(double[] a, double beta, double root, double h) {
        double uSum = 0;
        double vSum = 0;
        double dSum = 0;
        for (int k = TERMS - 2; k >= 1; k--) {
            uSum = uSum * h + a[k];
            vSum = vSum * h + (k + 1) * a[k + 1];
            dSum = dSum * h + (1 - beta) * (root * (k + 1) * a[k + 1] + k * a[k]) + beta * a[k];
        }
        z = root + h;
        u = uSum * h + a[0];
        v = vSum * h + a[1];
        defect = dSum * h;
    }

    /** Coefficients of u(z0 + h) in powers of h, from z u'' + s u' + z u = 0. */
    static double[] taylor(Axis axis, double z0, double u0, double v0) {
        double[] a = new double[TERMS];
        a[0] = u0;
        a[1] = v0;
        for (int k = 0; k + 2 < TERMS; k++) {
            double before = k == 0 ? 0 : a[k - 1];
            a[k + 2] = -((k + 1) * (k + axis.power()) * a[k + 1] + z0 * a[k] + before) / (z0 * (k + 2) * (k + 1));
        }
        return a;
    }
}
