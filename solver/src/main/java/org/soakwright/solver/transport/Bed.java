package org.soakwright.solver.transport;

import org.soakwright.solver.Require;

/**
 * Pieces poured together, with liquor running through.
 *
 * @param speed flow over the whole cross-section of the bed (superficial), m/s; above 0
 * @param voids share of the bed's volume that is liquor, 1; above 0 and below 1
 */
public record Bed(double speed, double voids) {
    public Bed {
        Require.positive("speed", speed, "m/s");
        if (!(voids > 0 && voids < 1)) {
            throw new IllegalArgumentException("share of voids must be above 0 and below 1, found " + voids);
        }
    }
}
