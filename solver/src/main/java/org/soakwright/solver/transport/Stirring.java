package org.soakwright.solver.transport;

import org.soakwright.solver.Require;

/**
 * A stirred tank.
 *
 * @param power that the impeller gives to a kilogram of liquor, W/kg; above 0
 * @param impellerShare diameter of the impeller over that of the tank, 1; above 0 and below 1
 */
public record Stirring(double power, double impellerShare) {
    public Stirring {
        Require.positive("power", power, "W/kg");
        if (!(impellerShare > 0 && impellerShare < 1)) {
            throw new IllegalArgumentException(
                    "impeller over tank must be above 0 and below 1, found " + impellerShare);
        }
    }
}
