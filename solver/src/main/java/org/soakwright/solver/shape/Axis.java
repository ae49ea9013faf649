package org.soakwright.solver.shape;

import org.apache.commons.math3.special.BesselJ;

/**
 * One axis of diffusion, from the core (x = 0) to the wetted surface (x = 1). Its standing wave u(z), z = frequency times
 * x, is the regular solution of u'' + (s/z) u' + u = 0 with u(0) = 1: cos z, J0(z) or sin z / z.
 */
public enum Axis {
    /** Between two plane faces, or from a sealed face to a wetted one. */
    SLAB(0) {
        @Override
        public double wave(double z) {
            return Math.cos(z);
        }

        @Override
        public double slope(double z) {
            return -Math.sin(z);
        }

        @Override
        double guessWaveZero(int n) {
            return (n - 0.5) * Math.PI;
        }

        @Override
        double guessSlopeZero(int n) {
            return n * Math.PI;
        }
    },

    /** Radially in a cylinder whose ends do not matter. */
    CYLINDER(1) {
        @Override
        public double wave(double z) {
            return BesselJ.value(0, z);
        }

        @Override
        public double slope(double z) {
            return -BesselJ.value(1, z);
        }

        /** McMahon's expansion, Abramowitz and Stegun 9.5.12. */
        @Override
        double guessWaveZero(int n) {
            double b = (n - 0.25) * Math.PI;
            double e = 8 * b;
            return b + 1 / e - 124 / (3 * e * e * e);
        }

        @Override
        double guessSlopeZero(int n) {
            double b = (n + 0.25) * Math.PI;
            double e = 8 * b;
            return b - 3 / e + 36 / (e * e * e);
        }
    },

    /** Radially in a sphere. */
    SPHERE(2) {
        @Override
        public double wave(double z) {
            return z < 1e-4 ? 1 - z * z / 6 : Math.sin(z) / z;
        }

        @Override
        public double slope(double z) {
            if (z > 1) {
                return (Math.cos(z) - Math.sin(z) / z) / z;
            }
            // The closed form cancels near zero; the series has no such trouble and ends below 1e-18 here.
            double term = -z / 3;
            double sum = term;
            for (int k = 2; Math.abs(term) > 1e-18 * Math.abs(sum); k++) {
                term *= -z * z / ((2.0 * k - 2) * (2 * k + 1));
                sum += term;
            }
            return sum;
        }

        @Override
        double guessWaveZero(int n) {
            return n * Math.PI;
        }

        @Override
        double guessSlopeZero(int n) {
            double b = (n + 0.5) * Math.PI;
            return b - 1 / b - 2 / (3 * b * b * b);
        }
    };

    private static final int POLISHING_STEPS = 6;

    private final int power;

    Axis(int power) {
        this.power = power;
    }

    /** s in the volume element x^s dx: 0, 1 or 2. */
    public int power() {
        return power;
    }

    /** u(z) for z at or above 0. */
    public abstract double wave(double z);

    /** du/dz for z at or above 0. */
    public abstract double slope(double z);

    abstract double guessWaveZero(int n);

    abstract double guessSlopeZero(int n);

    /** The n-th positive zero of u, n from 1. */
    public final double waveZero(int n) {
        double z = guessWaveZero(n);
        for (int i = 0; i < POLISHING_STEPS; i++) {
            double step = wave(z) / slope(z);
            z -= step;
            if (Math.abs(step) <= Math.ulp(z)) {
                break;
            }
        }
        return z;
    }

    /** The n-th zero of u', n from 0, the zeroth being 0 itself. */
    public final double slopeZero(int n) {
        if (n == 0) {
            return 0;
        }
        double z = guessSlopeZero(n);
        for (int i = 0; i < POLISHING_STEPS; i++) {
            double slope = slope(z);
            double step = slope / (-power * slope / z - wave(z));
            z -= step;
            if (Math.abs(step) <= Math.ulp(z)) {
                break;
            }
        }
        return z;
    }

    /** Mean of u over the body when the frequency is z: (s + 1) times the integral of x^s u(z x). */
    public final double mean(double z, double slopeAtSurface) {
        return z == 0 ? 1 : -(power + 1) * slopeAtSurface / z;
    }

    /** Mean of u squared over the body, from u and u' at the surface (Lommel's integral). */
    public final double meanSquare(double z, double waveAtSurface, double slopeAtSurface) {
        if (z == 0) {
            return 1;
        }
        double u = waveAtSurface;
        double v = slopeAtSurface;
        return 0.5 * (power + 1) * (v * v + u * u + (power - 1) * u * v / z);
    }
}
