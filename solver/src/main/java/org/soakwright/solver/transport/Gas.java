package org.soakwright.solver.transport;

/** Viscosities of dilute gases, Pa s; sources in {@link Air#viscosity}. */
final class Gas {
    private static final double SUTHERLAND = 110.4;
    private static final double CRITICAL_TEMPERATURE = 647.096;
    private static final double[] STEAM = {1.67752, 2.20462, 0.6366564, -0.241605};

    private Gas() {}

    static double airViscosity(double temperature) {
        return 1.458e-6 * temperature * Math.sqrt(temperature) / (temperature + SUTHERLAND);
    }

    static double vapourViscosity(double temperature) {
        double reduced = temperature / CRITICAL_TEMPERATURE;
        double sum = 0;
        for (int i = STEAM.length - 1; i >= 0; i--) {
            sum = sum / reduced + STEAM[i];
        }
        return 1e-4 * Math.sqrt(reduced) / sum;
    }

    /** Wilke's mixture of two gases; share is the first's by mole. */
    static double mixed(double share, double one, double oneMass, double other, double otherMass) {
        double rest = 1 - share;
        double first = share * one / (share + rest * drag(one, oneMass, other, otherMass));
        double second = rest * other / (rest + share * drag(other, otherMass, one, oneMass));
        return first + second;
    }

    private static double drag(double one, double oneMass, double other, double otherMass) {
        double root = 1 + Math.sqrt(one / other) * Math.pow(otherMass / oneMass, 0.25);
        return root * root / Math.sqrt(8 * (1 + oneMass / otherMass));
    }
}
