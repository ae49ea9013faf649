package org.soakwright.solver.finitevolume;

import java.util.List;

/**
 * Equal bodies of a lot, each the product of its edges, wetted wherever an edge ends.
 *
 * @param volume m3, of all these bodies
 * @param ease diffusivity in these bodies over that of the phase
 * @param coat what sets the surface apart
 */
record Solid(List<Edge> edges, double volume, double ease, Coat coat) {
    Solid(List<Edge> edges, double volume, double ease) {
        this(edges, volume, ease, Coat.NONE);
    }

    static Solid of(int power, double length, double volume) {
        return new Solid(List.of(new Edge(power, length, 0)), volume, 1);
    }

    static Solid shortCylinder(double radius, double half, double volume) {
        return new Solid(List.of(new Edge(1, radius, 0), new Edge(0, half, 1)), volume, 1);
    }

    static Solid bar(double a, double b, double volume) {
        return new Solid(List.of(new Edge(0, a, 0), new Edge(0, b, 1)), volume, 1);
    }

    static Solid brick(double a, double b, double c, double volume) {
        return new Solid(List.of(new Edge(0, a, 0), new Edge(0, b, 1), new Edge(0, c, 2)), volume, 1);
    }

    Solid eased(double other) {
        return new Solid(edges, volume, other, coat);
    }

    Solid in(Coat other) {
        return new Solid(edges, volume, ease, other);
    }

    /** The edge along which the surface is nearest to the core; the first of several. */
    int shortest() {
        int best = 0;
        for (int i = 1; i < edges.size(); i++) {
            best = edges.get(i).length() < edges.get(best).length() ? i : best;
        }
        return best;
    }
}
