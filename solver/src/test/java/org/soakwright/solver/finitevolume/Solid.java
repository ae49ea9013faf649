package org.soakwright.solver.finitevolume;

import java.util.ArrayList;
import java.util.List;

/**
 * Equal bodies of a lot, each the product of its edges, wetted wherever an edge ends.
 *
 * @param volume m3, of all these bodies
 * @param ease diffusivity in these bodies over that of the phase
 * @param coat what sets the surface apart
 * @param back the same of the backs of edges with two faces
 */
record Solid(List<Edge> edges, double volume, double ease, Coat coat, Coat back) {
    Solid(List<Edge> edges, double volume, double ease) {
        this(edges, volume, ease, Coat.NONE, Coat.NONE);
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

    /** The first flat edge goes from face to face; where there is none only the front counts. */
    Solid twoFaced(Coat front, Coat behind) {
        List<Edge> others = new ArrayList<>(edges);
        for (int i = 0; i < others.size(); i++) {
            Edge edge = edges.get(i);
            if (edge.power() == 0) {
                others.set(i, new Edge(0, 2 * edge.length(), edge.direction(), true));
                break;
            }
        }
        return new Solid(others, volume, ease, front, behind);
    }

    boolean isTwoFaced() {
        return edges.stream().anyMatch(Edge::twoFaced);
    }

    Solid eased(double other) {
        return new Solid(edges, volume, other, coat, back);
    }

    Solid in(Coat other) {
        return new Solid(edges, volume, ease, other, back);
    }

    /** The edge along which the surface is nearest to the core; the first of several. */
    int shortest() {
        int best = 0;
        for (int i = 1; i < edges.size(); i++) {
            best = edges.get(i).depth() < edges.get(best).depth() ? i : best;
        }
        return best;
    }
}
