package org.soakwright.solver.transport;

/**
 * Water activity of sodium chloride solutions by Pitzer's equations, with the parameters of Møller 1988, Geochim
 * Cosmochim Acta 52:821, equation II-13 and table 1, 273 K to 573 K (read in a public code); Pitzer's equations from
 * memory (Pitzer 1991).
 */
final class Pitzer {
    private static final double[] SLOPE = {
        3.36901532e-1, -6.32100430e-4, 9.14252359, -1.35143986e-2, 2.26089488e-3, 1.92118597e-6, 4.52586464e1, 0
    };
    private static final double[] BETA0 = {
        1.43783204e1, 5.60767406e-3, -4.22185236e2, -2.51226677, 0, -2.61718135e-6, 4.43854508, -1.70502337
    };
    private static final double[] BETA1 = {-4.83060685e-1, 1.40677479e-3, 1.19311989e2, 0, 0, 0, 0, -4.23433299};
    private static final double[] C_PHI = {
        -1.00588714e-1, -1.80529413e-5, 8.61185543, 1.24880954e-2, 0, 3.41172108e-8, 6.83040995e-2, 2.93922611e-1
    };
    private static final double B = 1.2;
    private static final double ALPHA = 2;
    private static final int IONS = 2;
    private static final double WATER_MOLAR_MASS = 0.01801528;

    private Pitzer() {}

    /** Of sodium chloride, mol per kg of water. */
    static double waterActivity(double molality, double temperature) {
        double root = Math.sqrt(molality);
        double second = parameter(BETA0, temperature) + parameter(BETA1, temperature) * Math.exp(-ALPHA * root);
        double osmotic = 1
                - parameter(SLOPE, temperature) * root / (1 + B * root)
                + molality * second
                + molality * molality * parameter(C_PHI, temperature);
        return Math.exp(-osmotic * IONS * molality * WATER_MOLAR_MASS);
    }

    private static double parameter(double[] a, double t) {
        return a[0]
                + a[1] * t
                + a[2] / t
                + a[3] * Math.log(t)
                + a[4] / (t - 263)
                + a[5] * t * t
                + a[6] / (680 - t)
                + a[7] / (t - 227);
    }
}
