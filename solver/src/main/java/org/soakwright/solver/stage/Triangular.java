package org.soakwright.solver.stage;

/** Small dense matrices with a triangular root. */
final class Triangular {
    private Triangular() {}

    /** The lower triangular root of a symmetric positive definite matrix. */
    static double[][] cholesky(double[][] a) {
        int n = a.length;
        double[][] root = new double[n][n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j <= i; j++) {
                double sum = a[i][j];
                for (int k = 0; k < j; k++) {
                    sum -= root[i][k] * root[j][k];
                }
                if (i == j && !(sum > 0)) {
                    throw new IllegalArgumentException("not positive definite: found " + sum + " in row " + i);
                }
                root[i][j] = i == j ? Math.sqrt(sum) : sum / root[j][j];
            }
        }
        return root;
    }

    /** The first rows and columns. A leading part of a root is the root of the leading part. */
    static double[][] leading(double[][] root, int n) {
        double[][] part = new double[n][];
        for (int i = 0; i < n; i++) {
            part[i] = java.util.Arrays.copyOf(root[i], n);
        }
        return part;
    }

    /** L' (R R')^-1 L for lower triangular L and R: symmetric, as X' X with X = R^-1 L. */
    static double[][] congruent(double[][] r, double[][] l) {
        int n = l.length;
        double[][] column = new double[n][n];
        for (int j = 0; j < n; j++) {
            for (int i = j; i < n; i++) {
                double sum = l[i][j];
                for (int k = j; k < i; k++) {
                    sum -= r[i][k] * column[j][k];
                }
                column[j][i] = sum / r[i][i];
            }
        }
        double[][] product = new double[n][n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j <= i; j++) {
                double sum = 0;
                for (int k = i; k < n; k++) {
                    sum += column[i][k] * column[j][k];
                }
                product[i][j] = sum;
                product[j][i] = sum;
            }
        }
        return product;
    }

    /** L' x for lower triangular L. */
    static double[] timesTransposed(double[][] l, double[] x) {
        double[] product = new double[x.length];
        for (int i = 0; i < x.length; i++) {
            for (int k = i; k < x.length; k++) {
                product[i] += l[k][i] * x[k];
            }
        }
        return product;
    }

    /** x with L' x = b for lower triangular L. */
    static double[] solveTransposed(double[][] l, double[] b) {
        double[] x = b.clone();
        for (int i = x.length - 1; i >= 0; i--) {
            for (int k = i + 1; k < x.length; k++) {
                x[i] -= l[k][i] * x[k];
            }
            x[i] /= l[i][i];
        }
        return x;
    }
}
