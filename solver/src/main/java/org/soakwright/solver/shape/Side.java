package org.soakwright.solver.shape;

import org.soakwright.solver.Require;

/**
 * One axis of a piece and how far it reaches.
 *
 * @param axis the kind of axis
 * @param length distance from the core to the wetted surface, m: half the thickness (the full thickness when one face
 *     is wetted) or the radius; above 0
 * @param direction which factor of a {@link Grain} holds along it, from 0
 */
public record Side(Axis axis, double length, int direction) {
    public Side {
        Require.positive("length", length, "m");
        if (direction < 0) {
            throw new IllegalArgumentException("direction must be at least 0, found " + direction);
        }
    }

    /** A side for which the direction does not matter. */
    public Side(Axis axis, double length) {
        this(axis, length, 0);
    }
}
