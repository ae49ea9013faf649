package org.soakwright.solver.stage;

import org.soakwright.solver.Require;

/** What surrounds the pieces. */
public sealed interface Bath {
    /** So much that its content does not change. */
    record Unlimited() implements Bath {}

    /**
     * A well-stirred volume, with liquor running through it or not.
     *
     * @param volume liquor in the vessel, m3; above 0
     * @param flow liquor running in and over, m3/s; 0 for a closed bath
     */
    record Vessel(double volume, double flow) implements Bath {
        public Vessel {
            Require.positive("liquor volume", volume, "m3");
            Require.notNegative("flow", flow, "m3/s");
        }
    }
}
