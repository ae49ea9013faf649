package org.soakwright.solver.shape;

import org.soakwright.solver.Require;

/**
 * One axis of a piece and how far it reaches. Positions along it run from 0 to 1 over its length.
 *
 * @param axis the kind of axis
 * @param length m: from the core to the wetted surface half the thickness (the full thickness when one face is sealed) or the radius;
 *     between two faces the full thickness; above 0
 * @param direction which factor of a {@link Grain} holds along it, from 0
 * @param reach where it begins
 */
public record Side(Axis axis, double length, int direction, Reach reach) {
    /** Where a side begins. */
    public enum Reach {
        /** At the core, where nothing passes: by symmetry or because a face is sealed. */
        FROM_CORE,
        /** At a face, the back, that exchanges as the front does, but not alike: a skin may cover it. */
        FROM_BACK
    }

    public Side {
        Require.positive("length", length, "m");
        if (direction < 0) {
            throw new IllegalArgumentException("direction must be at least 0, found " + direction);
        }
        if (reach == Reach.FROM_BACK && axis != Axis.SLAB) {
            throw new IllegalArgumentException("only a slab has a back, found a " + axis);
        }
    }

    /** From the core. */
    public Side(Axis axis, double length, int direction) {
        this(axis, length, direction, Reach.FROM_CORE);
    }

    /** A side from the core for which the direction does not matter. */
    public Side(Axis axis, double length) {
        this(axis, length, 0);
    }

    /**
     * A slab whose two faces both exchange, each in its own way: position 0 is the back, 1 the front.
     *
     * @param thickness from face to face, m; above 0
     */
    public static Side betweenFaces(double thickness, int direction) {
        return new Side(Axis.SLAB, thickness, direction, Reach.FROM_BACK);
    }

    /** Whether both its ends exchange. */
    public boolean twoFaced() {
        return reach == Reach.FROM_BACK;
    }

    /** So many times as long. */
    public Side scaled(double factor) {
        return new Side(axis, factor * length, direction, reach);
    }

    /** Position of the core: the middle between two faces. */
    public double core() {
        return twoFaced() ? 0.5 : 0;
    }

    /** From the core to the nearest end that exchanges, m. */
    public double depth() {
        return twoFaced() ? length / 2 : length;
    }
}
