package org.soakwright.solver.shape;

import java.util.List;
import org.soakwright.solver.Require;

/**
 * Pieces of one shape and size within a lot. A shape is the product of its sides: one slab, cylinder or sphere; a cylinder and a slab
 * (a short cylinder); two or three slabs (a bar, a brick).
 *
 * @param sides one to three; several only as just said
 * @param volume volume of all pieces of the grade together, m3; above 0
 * @param ease diffusivity in these pieces over the stage's, 1; above 0
 */
public record Grade(List<Side> sides, double volume, double ease) {
    public Grade {
        sides = List.copyOf(sides);
        Require.positive("volume", volume, "m3");
        Require.positive("ease", ease, "1");
        if (sides.isEmpty() || sides.size() > 3) {
            throw new IllegalArgumentException("a piece has one to three sides, found " + sides.size());
        }
        boolean flat = sides.stream().skip(1).allMatch(side -> side.axis() == Axis.SLAB);
        boolean closes = sides.size() == 1
                || sides.get(0).axis() == Axis.SLAB
                || (sides.get(0).axis() == Axis.CYLINDER && sides.size() == 2);
        if (!flat || !closes) {
            throw new IllegalArgumentException("several sides are slabs, or a cylinder and then a slab; found "
                    + sides.stream().map(Side::axis).toList());
        }
    }

    /** Pieces in which the solute moves along one axis only. */
    public Grade(Axis axis, double length, double volume) {
        this(List.of(new Side(axis, length)), volume, 1);
    }

    /** Whether the solute moves along one axis only. */
    public boolean oneAxis() {
        return sides.size() == 1;
    }

    /** Whether some side lies between two faces that need not be alike. */
    public boolean twoFaced() {
        return sides.stream().anyMatch(Side::twoFaced);
    }

    /** The first side's axis: the only one of a grade of one axis. */
    public Axis axis() {
        return sides.get(0).axis();
    }

    /** The first side's length, m. */
    public double length() {
        return sides.get(0).length();
    }

    /** The side along which the surface is nearest to the core; the first of several. */
    public int shortest() {
        int best = 0;
        for (int i = 1; i < sides.size(); i++) {
            if (sides.get(i).depth() < sides.get(best).depth()) {
                best = i;
            }
        }
        return best;
    }

    /**
     * What part of the wetted surface a side's faces are: each side's have the area (s + 1) volume / depth.
     *
     * @param side from 0
     */
    public double wetted(int side) {
        double whole = 0;
        for (Side one : sides) {
            whole += (one.axis().power() + 1) / one.depth();
        }
        Side one = sides.get(side);
        return (one.axis().power() + 1) / one.depth() / whole;
    }
}
