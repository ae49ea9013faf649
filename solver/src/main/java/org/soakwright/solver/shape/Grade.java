package org.soakwright.solver.shape;

import org.soakwright.solver.Require;

/**
 * Pieces of one shape and size within a lot.
 *
 * @param axis the axis along which the solute moves
 * @param length distance from the core to the wetted surface, m: half the thickness (the full thickness when one face
 *     is wetted) or the radius; above 0
 * @param volume volume of all pieces of the grade together, m3; above 0
 */
public record Grade(Axis axis, double length, double volume) {
    public Grade {
        Require.positive("length", length, "m");
        Require.positive("volume", volume, "m3");
    }
}
