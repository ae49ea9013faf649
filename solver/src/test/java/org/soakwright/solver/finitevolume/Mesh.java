package org.soakwright.solver.finitevolume;

/**
 * Nodes from the core to the surface of a body of unit length, closer together towards the surface, each in a cell that
 * ends half-way (in the mesh's own coordinate) to its neighbours. Node and cell coincide at both ends, so core and surface
 * are unknowns themselves and all errors are even powers of the mesh width.
 */
final class Mesh {
    /** Nodes stand at tanh(g xi)/tanh(g): odd about the core, thirteen times finer at the surface than at the core. */
    private static final double GRADING = 2;

    /** Share of each cell in the volume. */
    final double[] share;
    /** Area of each inner face over the distance of the nodes beside it, per unit volume. */
    final double[] conductance;

    final double[] node;

    Mesh(int power, int cells) {
        node = new double[cells + 1];
        share = new double[cells + 1];
        conductance = new double[cells];
        double before = 0;
        for (int i = 0; i <= cells; i++) {
            node[i] = place((double) i / cells);
            double face = i == cells ? 1 : place((i + 0.5) / cells);
            share[i] = Math.pow(face, power + 1) - Math.pow(before, power + 1);
            before = face;
            if (i < cells) {
                double next = place((i + 1.0) / cells);
                conductance[i] = (power + 1) * Math.pow(face, power) / (next - node[i]);
            }
        }
    }

    /** Between two faces: each half as from the core. */
    static Mesh twoFaced(int cells) {
        return new Mesh(cells);
    }

    private Mesh(int cells) {
        node = new double[cells + 1];
        share = new double[cells + 1];
        conductance = new double[cells];
        double before = 0;
        for (int i = 0; i <= cells; i++) {
            node[i] = across((double) i / cells);
            double face = i == cells ? 1 : across((i + 0.5) / cells);
            share[i] = face - before;
            before = face;
            if (i < cells) {
                conductance[i] = 1 / (across((i + 1.0) / cells) - node[i]);
            }
        }
    }

    private static double across(double xi) {
        return 0.5 + 0.5 * Math.signum(xi - 0.5) * place(Math.abs(2 * xi - 1));
    }

    static double place(double xi) {
        return xi == 1 ? 1 : Math.tanh(GRADING * xi) / Math.tanh(GRADING);
    }
}
