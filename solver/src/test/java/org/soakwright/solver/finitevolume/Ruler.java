package org.soakwright.solver.finitevolume;

import java.util.Arrays;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;

/**
 * One axis of unit length cut up: the mass matrix of its nodes by share of the volume, and the root of its stiffness, so that
 * what drives is the sum of squares of root times contents. The first node is the core, the last the surface.
 */
final class Ruler {
    /** Elements become smaller towards the surface, so that a stage's first moments are resolved. */
    private static final double[] ENDS = {0, 0.4, 0.7, 0.86, 0.94, 0.98, 1};

    /** The same from both faces. */
    private static final double[] BETWEEN_FACES = {0, 0.01, 0.03, 0.07, 0.15, 0.3, 0.5, 0.7, 0.85, 0.93, 0.97, 0.99, 1};

    private static final int BETWEEN_CELLS = 7;

    final double[] node;
    final double[][] mass;
    final double[][] root;
    /** Degree of the polynomial that stands for the contents between nodes. */
    final int degree;

    private final boolean elements;

    private Ruler(boolean elements, int degree, double[] node, double[][] mass, double[][] root) {
        this.elements = elements;
        this.degree = degree;
        this.node = node;
        this.mass = mass;
        this.root = root;
    }

    /** Finite volumes: the cells and faces of a mesh. */
    static Ruler cells(int power, boolean twoFaced, int cells) {
        Mesh mesh = twoFaced ? Mesh.twoFaced(cells) : new Mesh(power, cells);
        double[][] mass = new double[cells + 1][cells + 1];
        double[][] root = new double[cells][cells + 1];
        for (int i = 0; i <= cells; i++) {
            mass[i][i] = mesh.share[i];
            if (i < cells) {
                root[i][i] = -Math.sqrt(mesh.conductance[i]);
                root[i][i + 1] = Math.sqrt(mesh.conductance[i]);
            }
        }
        return new Ruler(false, BETWEEN_CELLS, mesh.node, mass, root);
    }

    /** Finite elements of a high degree: polynomials through Chebyshev's points, every integral exact. */
    static Ruler elements(int power, boolean twoFaced, int degree) {
        double[] ends = twoFaced ? BETWEEN_FACES : ENDS;
        GaussIntegrator rule = new GaussIntegratorFactory().legendreHighPrecision(degree + 2);
        int points = rule.getNumberOfPoints();
        int elements = ends.length - 1;
        int nodes = elements * degree + 1;
        double[] local = new double[degree + 1];
        for (int i = 0; i <= degree; i++) {
            local[i] = -Math.cos(Math.PI * i / degree);
        }
        double[] node = new double[nodes];
        double[][] mass = new double[nodes][nodes];
        double[][] root = new double[elements * points][nodes];
        for (int e = 0; e < elements; e++) {
            double half = 0.5 * (ends[e + 1] - ends[e]);
            double middle = 0.5 * (ends[e + 1] + ends[e]);
            int first = e * degree;
            for (int i = 0; i <= degree; i++) {
                node[first + i] = i == degree ? ends[e + 1] : i == 0 ? ends[e] : middle + half * local[i];
            }
            for (int q = 0; q < points; q++) {
                double x = middle + half * rule.getPoint(q);
                double weight = half * rule.getWeight(q) * (power + 1) * Math.pow(x, power);
                double[] value = values(local, rule.getPoint(q));
                double[] slope = slopes(local, rule.getPoint(q));
                for (int i = 0; i <= degree; i++) {
                    root[e * points + q][first + i] = Math.sqrt(weight) * slope[i] / half;
                    for (int k = 0; k <= degree; k++) {
                        mass[first + i][first + k] += weight * value[i] * value[k];
                    }
                }
            }
        }
        return new Ruler(true, degree, node, mass, root);
    }

    /** The first of the nodes whose polynomial stands for the contents at a place. */
    int first(double x) {
        int below = Math.abs(Arrays.binarySearch(node, x) + 1);
        int start = elements ? (below - 1) / degree * degree : below - (degree + 1) / 2;
        return Math.max(0, Math.min(node.length - 1 - degree, start));
    }

    /** What each of those nodes counts for at the place. */
    double[] weights(double x) {
        int first = first(x);
        return values(Arrays.copyOfRange(node, first, first + degree + 1), x);
    }

    /** Lagrange's polynomials at a place. */
    private static double[] values(double[] nodes, double x) {
        double[] values = new double[nodes.length];
        for (int i = 0; i < nodes.length; i++) {
            values[i] = 1;
            for (int k = 0; k < nodes.length; k++) {
                values[i] *= k == i ? 1 : (x - nodes[k]) / (nodes[i] - nodes[k]);
            }
        }
        return values;
    }

    private static double[] slopes(double[] nodes, double x) {
        double[] slopes = new double[nodes.length];
        for (int i = 0; i < nodes.length; i++) {
            for (int m = 0; m < nodes.length; m++) {
                double term = m == i ? 0 : 1 / (nodes[i] - nodes[m]);
                for (int k = 0; k < nodes.length; k++) {
                    term *= k == i || k == m ? 1 : (x - nodes[k]) / (nodes[i] - nodes[k]);
                }
                slopes[i] += term;
            }
        }
        return slopes;
    }
}
