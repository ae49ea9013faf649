package org.soakwright.solver.transport;

/**
 * Liquid water at 0.1 MPa: IAPWS SR6-08 (2011), Revised Supplementary Release on Properties of Liquid Water at 0.1 MPa,
 * volume by equation 2 with table 2, viscosity by equation 7 with table 6 (equation and table numbers from memory,
 * coefficients read in several public codes that agree), reproduced to all digits of the check values.
 */
final class LiquidWater {
    private static final double GAS_CONSTANT = 461.51805;
    private static final double PRESSURE = 1e5;
    private static final double SCALE = 10;
    private static final double UPPER = 593;
    private static final double LOWER = 232;
    private static final double CONSTANT = 1.93763157e-2;
    private static final double[] A = {6.74458446e3, -2.22521604e5, 1.00231247e8, -1.63552118e9, 8.32299658e9};
    private static final int[] A_POWER = {4, 5, 7, 8, 9};
    private static final double[] B = {
        5.78545292e-3, -1.53195665e-2, 3.11337859e-2, -4.23546241e-2, 3.38713507e-2, -1.19946761e-2
    };
    private static final int[] B_POWER = {1, 2, 3, 4, 5, 6};
    private static final double VISCOSITY_SCALE = 300;
    private static final double[] MICROPASCAL_SECONDS = {280.68, 511.45, 61.131, 0.45903};
    private static final double[] VISCOSITY_POWER = {-1.9, -7.7, -19.6, -40};

    private LiquidWater() {}

    static double density(double temperature) {
        return 1 / volume(temperature);
    }

    static double expansion(double temperature) {
        double alpha = SCALE / (UPPER - temperature);
        double beta = SCALE / (temperature - LOWER);
        double slope = 0;
        for (int i = 0; i < A.length; i++) {
            slope += A[i] * A_POWER[i] * Math.pow(alpha, A_POWER[i] + 1);
        }
        for (int i = 0; i < B.length; i++) {
            slope -= B[i] * B_POWER[i] * Math.pow(beta, B_POWER[i] + 1);
        }
        return GAS_CONSTANT / PRESSURE * slope / volume(temperature);
    }

    static double viscosity(double temperature) {
        double reduced = temperature / VISCOSITY_SCALE;
        double sum = 0;
        for (int i = 0; i < MICROPASCAL_SECONDS.length; i++) {
            sum += MICROPASCAL_SECONDS[i] * Math.pow(reduced, VISCOSITY_POWER[i]);
        }
        return 1e-6 * sum;
    }

    private static double volume(double temperature) {
        double alpha = SCALE / (UPPER - temperature);
        double beta = SCALE / (temperature - LOWER);
        double sum = CONSTANT;
        for (int i = 0; i < A.length; i++) {
            sum += A[i] * Math.pow(alpha, A_POWER[i]);
        }
        for (int i = 0; i < B.length; i++) {
            sum += B[i] * Math.pow(beta, B_POWER[i]);
        }
        return GAS_CONSTANT * SCALE / PRESSURE * sum;
    }
}
