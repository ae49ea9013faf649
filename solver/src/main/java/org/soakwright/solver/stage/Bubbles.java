package org.soakwright.solver.stage;

/**
 * The functions of one element on [-1, 1]: the two straight lines that are one at one end, then integrals of Legendre polynomials, which
 * vanish at both ends (Babuska and Szabo's hierarchic basis).
 */
final class Bubbles {
    private Bubbles() {}

    static double[] values(int degree, double x) {
        double[] legendre = legendre(degree, x);
        double[] values = new double[degree + 1];
        values[0] = 0.5 * (1 - x);
        values[1] = 0.5 * (1 + x);
        for (int k = 2; k <= degree; k++) {
            values[k] = (legendre[k] - legendre[k - 2]) / Math.sqrt(2.0 * (2 * k - 1));
        }
        return values;
    }

    static double[] slopes(int degree, double x) {
        double[] legendre = legendre(degree, x);
        double[] slopes = new double[degree + 1];
        slopes[0] = -0.5;
        slopes[1] = 0.5;
        for (int k = 2; k <= degree; k++) {
            slopes[k] = Math.sqrt(0.5 * (2 * k - 1)) * legendre[k - 1];
        }
        return slopes;
    }

    private static double[] legendre(int degree, double x) {
        double[] p = new double[degree + 1];
        p[0] = 1;
        p[1] = x;
        for (int k = 2; k <= degree; k++) {
            p[k] = ((2 * k - 1) * x * p[k - 1] - (k - 1) * p[k - 2]) / k;
        }
        return p;
    }
}
