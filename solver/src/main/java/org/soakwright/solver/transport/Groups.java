package org.soakwright.solver.transport;

import org.soakwright.solver.Require;

/**
 * The dimensionless groups of a film.
 *
 * @param length the length they are made with, m
 * @param reynolds speed times length over kinematic viscosity; 0 where no speed is part of it
 * @param schmidt kinematic viscosity over diffusivity
 * @param grashof g length^3 density difference / (density nu^2); 0 where no density difference is part of it
 * @param sherwood film coefficient times length over diffusivity
 */
public record Groups(double length, double reynolds, double schmidt, double grashof, double sherwood) {
    public Groups {
        Require.positive("length", length, "m");
        Require.notNegative("Reynolds number", reynolds, "1");
        Require.positive("Schmidt number", schmidt, "1");
        Require.notNegative("Grashof number", grashof, "1");
        Require.positive("Sherwood number", sherwood, "1");
    }

    /** Grashof times Schmidt number. */
    public double rayleigh() {
        return grashof * schmidt;
    }

    /** Reynolds times Schmidt number. */
    public double peclet() {
        return reynolds * schmidt;
    }
}
