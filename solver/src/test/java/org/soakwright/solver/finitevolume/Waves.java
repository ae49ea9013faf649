package org.soakwright.solver.finitevolume;

import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.SingularValueDecomposition;

/**
 * The standing waves of one axis behind one film: orthonormal in the mass matrix, each with its rate. They are singular vectors of
 * the stiffness's root: its square would lose half the digits of the slowest rates.
 */
final class Waves {
    final Ruler ruler;
    final double[] rate;
    /** Contents of the nodes in each wave: nodes by waves. */
    final double[][] wave;
    /** What contents of the nodes hold of each wave: waves by nodes. */
    final double[][] part;
    /** What a uniform content of 1 holds of each wave. */
    final double[] uniform;
    /** Mean of what is at the nodes. */
    final double[] share;
    /** Whether some end is part of the bath. */
    final boolean open;

    /**
     * Finds the waves.
     *
     * @param back the same as the next at the first node; 0 at a core
     * @param biot 0 where the surface is sealed, infinite where there is no film
     */
    Waves(Ruler ruler, int power, double back, double biot) {
        this.ruler = ruler;
        boolean openBack = Double.isInfinite(back);
        boolean openFront = Double.isInfinite(biot);
        open = openBack || openFront;
        int nodes = ruler.node.length;
        int first = openBack ? 1 : 0;
        int free = (openFront ? nodes - 1 : nodes) - first;
        double[][] lower = lower(ruler.mass, first, free);
        double[][] root = new double[ruler.root.length + 2][free];
        for (int i = 0; i < ruler.root.length; i++) {
            System.arraycopy(ruler.root[i], first, root[i], 0, free);
        }
        if (!openFront) {
            root[ruler.root.length][free - 1] = Math.sqrt(biot * (power + 1));
        }
        if (!openBack) {
            root[ruler.root.length + 1][0] = Math.sqrt(back);
        }
        for (double[] row : root) {
            forward(lower, row);
        }
        SingularValueDecomposition split = new SingularValueDecomposition(new Array2DRowRealMatrix(root, false));
        double[] singular = split.getSingularValues();
        double[][] vector = split.getVT().getData();
        rate = new double[free];
        wave = new double[nodes][free];
        for (int n = 0; n < free; n++) {
            rate[n] = singular[n] * singular[n];
            backward(lower, vector[n]);
            for (int i = 0; i < free; i++) {
                wave[first + i][n] = vector[n][i];
            }
        }
        part = new Array2DRowRealMatrix(wave, false)
                .transpose()
                .multiply(new Array2DRowRealMatrix(ruler.mass, false))
                .getData();
        share = new double[nodes];
        uniform = new double[free];
        for (int i = 0; i < nodes; i++) {
            for (int k = 0; k < nodes; k++) {
                share[i] += ruler.mass[i][k];
            }
            for (int n = 0; n < free; n++) {
                uniform[n] += part[n][i];
            }
        }
    }

    /** Cholesky's factor of a block on the diagonal. */
    private static double[][] lower(double[][] mass, int first, int size) {
        double[][] lower = new double[size][];
        for (int i = 0; i < size; i++) {
            lower[i] = java.util.Arrays.copyOfRange(mass[first + i], first, first + i + 1);
            for (int k = 0; k <= i; k++) {
                for (int m = 0; m < k; m++) {
                    lower[i][k] -= lower[i][m] * lower[k][m];
                }
                lower[i][k] = k < i ? lower[i][k] / lower[k][k] : Math.sqrt(lower[i][i]);
            }
        }
        return lower;
    }

    /** Solves L x = row in place. */
    private static void forward(double[][] lower, double[] row) {
        for (int i = 0; i < row.length; i++) {
            for (int k = 0; k < i; k++) {
                row[i] -= lower[i][k] * row[k];
            }
            row[i] /= lower[i][i];
        }
    }

    /** Solves L' x = row in place. */
    private static void backward(double[][] lower, double[] row) {
        for (int i = row.length - 1; i >= 0; i--) {
            for (int k = i + 1; k < row.length; k++) {
                row[i] -= lower[k][i] * row[k];
            }
            row[i] /= lower[i][i];
        }
    }
}
