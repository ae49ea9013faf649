package org.soakwright.solver.stage;

import org.soakwright.solver.shape.Axis;

/** Means of products of two standing waves over the body. */
final class Overlap {
    private Overlap() {}

    /**
     * Mean of u(z x) u(w x), by Green's identity; where z and w nearly agree, by the Taylor series of the same numerator, which
     * is divided by their difference term by term.
     */
    static double of(Axis axis, double z, double uz, double vz, double w, double uw, double vw) {
        if (z > w) {
            return of(axis, w, uw, vw, z, uz, vz);
        }
        double h = w - z;
        if (h > Wave.NEAR * Math.min(1, z)) {
            return (axis.power() + 1) * (uw * z * vz - uz * w * vw) / (h * (w + z));
        }
        if (z == 0) {
            return 1;
        }
        double[] a = Wave.taylor(axis, z, uz, vz);
        double sum = 0;
        for (int k = Wave.TERMS - 2; k >= 1; k--) {
            sum = sum * h + uz * (z * (k + 1) * a[k + 1] + k * a[k]) - z * vz * a[k];
        }
        return -(axis.power() + 1) * sum / (w + z);
    }
}
