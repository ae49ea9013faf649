package org.soakwright.planner.batch;

import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.CholeskyDecomposition;

/**
 * One step of a descent, in shares of the ranges: quadratic goal, straight requirements that may all be overstepped by one amount at a price. Turned into the
 * point nearest to the origin by the Cholesky factor of the curvature.
 */
record Subproblem(
        double[] u,
        double[] goal,
        double[] misses,
        double[][] slopes,
        double[][] curvature,
        boolean nearest,
        double[][] capRows,
        double[] capRoom) {
    /**
     * The solution.
     *
     * @param move change of each free duration, as a share of its range
     * @param over the common overstep
     * @param multipliers of the requirements
     */
    record Step(double[] move, double over, double[] multipliers) {}

    /**
     * Solves it.
     *
     * @param price of one unit of the overstep, where the goal is not the overstep itself
     * @param trust no share may change by more
     */
    Step solve(double price, double trust) {
        int size = u.length;
        int n = size + 1;
        double[][] b = new double[n][n];
        double[] g = new double[n];
        for (int a = 0; a < size; a++) {
            System.arraycopy(curvature[a], 0, b[a], 0, size);
            g[a] = nearest ? 0 : goal[a];
        }
        b[size][size] = nearest ? 1e-3 : 1;
        g[size] = nearest ? 1 : price;
        double[][] l = lower(b, n);
        int rows = misses.length + 2 * size + (nearest ? 0 : 1) + capRows.length;
        double[][] a = new double[rows][n];
        double[] c = new double[rows];
        int at = 0;
        for (int i = 0; i < misses.length; i++, at++) {
            for (int k = 0; k < size; k++) {
                a[at][k] = -slopes[i][k];
            }
            a[at][size] = 1;
            c[at] = misses[i];
        }
        for (int k = 0; k < size; k++) {
            a[at][k] = 1;
            c[at++] = -Math.min(u[k], trust);
            a[at][k] = -1;
            c[at++] = -Math.min(1 - u[k], trust);
        }
        if (!nearest) {
            a[at++][size] = 1;
        }
        for (int i = 0; i < capRows.length; i++, at++) {
            for (int k = 0; k < size; k++) {
                a[at][k] = -capRows[i][k];
            }
            c[at] = -capRoom[i];
        }
        double[] shift = forward(l, g);
        for (int i = 0; i < rows; i++) {
            a[i] = forward(l, a[i]);
            for (int k = 0; k < n; k++) {
                c[i] += a[i][k] * shift[k];
            }
        }
        LeastDistance nearestPoint = LeastDistance.of(a, c, n);
        double[] y = nearestPoint.point;
        for (int k = 0; k < n; k++) {
            y[k] -= nearestPoint.feasible ? shift[k] : 0;
        }
        double[] move = nearestPoint.feasible ? backward(l, y) : new double[n];
        double[] multipliers = new double[misses.length];
        System.arraycopy(nearestPoint.multipliers, 0, multipliers, 0, misses.length);
        double[] step = new double[size];
        System.arraycopy(move, 0, step, 0, size);
        return new Step(step, move[size], multipliers);
    }

    private static double[][] lower(double[][] b, int n) {
        double ridge = 0;
        while (true) {
            try {
                return new CholeskyDecomposition(new Array2DRowRealMatrix(b, false), 1e-8, 1e-14)
                        .getL()
                        .getData();
            } catch (org.apache.commons.math3.linear.NonPositiveDefiniteMatrixException flat) {
                ridge = ridge == 0 ? 1e-8 : 10 * ridge;
                for (int k = 0; k < n; k++) {
                    b[k][k] += ridge;
                }
            }
        }
    }

    private static double[] forward(double[][] l, double[] v) {
        double[] x = v.clone();
        for (int i = 0; i < x.length; i++) {
            for (int k = 0; k < i; k++) {
                x[i] -= l[i][k] * x[k];
            }
            x[i] /= l[i][i];
        }
        return x;
    }

    private static double[] backward(double[][] l, double[] v) {
        double[] x = v.clone();
        for (int i = x.length - 1; i >= 0; i--) {
            for (int k = i + 1; k < x.length; k++) {
                x[i] -= l[k][i] * x[k];
            }
            x[i] /= l[i][i];
        }
        return x;
    }
}
