package org.soakwright.planner.batch;

import java.util.Arrays;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.QRDecomposition;
import org.apache.commons.math3.linear.SingularMatrixException;

/**
 * The point nearest to the origin within linear inequalities, as non-negative least squares: C. L. Lawson and R. J. Hanson, Solving
 * Least Squares Problems (1974), chapter 23, algorithms NNLS and LDP. Exact up to rounding; the number of passes is capped.
 */
final class LeastDistance {
    private static final double ROUNDING = 1e-12;

    final double[] point;
    final double[] multipliers;
    final boolean feasible;

    private LeastDistance(double[] point, double[] multipliers, boolean feasible) {
        this.point = point;
        this.multipliers = multipliers;
        this.feasible = feasible;
    }

    /**
     * Minimises |y| subject to rows y at or above limits. Rows are brought to length one, and distances measured in that of the
     * farthest limit, so that the answer's own size is about one.
     */
    static LeastDistance of(double[][] rows, double[] limits, int size) {
        int count = rows.length;
        double[][] unit = new double[count][size];
        double[] distance = new double[count];
        double[] length = new double[count];
        double farthest = 0;
        for (int i = 0; i < count; i++) {
            double square = 0;
            for (int k = 0; k < size; k++) {
                square += rows[i][k] * rows[i][k];
            }
            length[i] = Math.max(Math.sqrt(square), Double.MIN_NORMAL);
            for (int k = 0; k < size; k++) {
                unit[i][k] = rows[i][k] / length[i];
            }
            distance[i] = limits[i] / length[i];
            farthest = Math.max(farthest, distance[i]);
        }
        if (farthest == 0) {
            return new LeastDistance(new double[size], new double[count], true);
        }
        for (int i = 0; i < count; i++) {
            distance[i] /= farthest;
        }
        double[] u = nonNegative(unit, distance, size);
        double[] r = residual(unit, distance, size, u);
        double scale = r[size];
        boolean feasible = scale < -ROUNDING;
        double[] point = new double[size];
        double[] multipliers = new double[count];
        if (feasible) {
            for (int k = 0; k < size; k++) {
                point[k] = -farthest * r[k] / scale;
            }
            for (int i = 0; i < count; i++) {
                multipliers[i] = -farthest * u[i] / (scale * length[i]);
            }
        }
        return new LeastDistance(point, multipliers, feasible);
    }

    /** E u - f, where column i of E is row i with its limit below, and f is the last unit vector. */
    private static double[] residual(double[][] rows, double[] limits, int size, double[] u) {
        double[] r = new double[size + 1];
        for (int i = 0; i < rows.length; i++) {
            if (u[i] != 0) {
                for (int k = 0; k < size; k++) {
                    r[k] += rows[i][k] * u[i];
                }
                r[size] += limits[i] * u[i];
            }
        }
        r[size] -= 1;
        return r;
    }

    private static double[] nonNegative(double[][] rows, double[] limits, int size) {
        int count = rows.length;
        double[] u = new double[count];
        boolean[] passive = new boolean[count];
        for (int pass = 0; pass < 10 * (count + size); pass++) {
            int enter = entering(rows, limits, size, u, passive);
            if (enter < 0) {
                break;
            }
            passive[enter] = true;
            boolean first = true;
            while (true) {
                double[] z = leastSquares(rows, limits, size, passive);
                if (z == null || (first && z[enter] <= 0)) {
                    // Dependent on those already in: leave it out and stop, the fit cannot improve measurably.
                    passive[enter] = false;
                    return u;
                }
                first = false;
                double step = 1;
                for (int i = 0; i < count; i++) {
                    if (passive[i] && z[i] <= 0) {
                        step = Math.min(step, u[i] / (u[i] - z[i]));
                    }
                }
                boolean inside = step >= 1;
                for (int i = 0; i < count; i++) {
                    if (passive[i]) {
                        u[i] = inside ? z[i] : u[i] + step * (z[i] - u[i]);
                        if (u[i] <= 1e-14 * Math.abs(z[i]) || u[i] <= 0) {
                            u[i] = 0;
                            passive[i] = false;
                        }
                    }
                }
                if (inside) {
                    break;
                }
            }
        }
        return u;
    }

    private static int entering(double[][] rows, double[] limits, int size, double[] u, boolean[] passive) {
        double[] r = residual(rows, limits, size, u);
        int enter = -1;
        double most = ROUNDING;
        for (int i = 0; i < rows.length; i++) {
            if (!passive[i]) {
                double norm = limits[i] * limits[i];
                double w = -limits[i] * r[size];
                for (int k = 0; k < size; k++) {
                    w -= rows[i][k] * r[k];
                    norm += rows[i][k] * rows[i][k];
                }
                double scaled = w / Math.sqrt(Math.max(norm, Double.MIN_NORMAL));
                if (scaled > most) {
                    most = scaled;
                    enter = i;
                }
            }
        }
        return enter;
    }

    private static double @org.jspecify.annotations.Nullable [] leastSquares(
            double[][] rows, double[] limits, int size, boolean[] passive) {
        int[] columns = new int[passive.length];
        int count = 0;
        for (int i = 0; i < passive.length; i++) {
            if (passive[i]) {
                columns[count++] = i;
            }
        }
        if (count > size + 1) {
            return null;
        }
        double[][] e = new double[size + 1][count];
        for (int c = 0; c < count; c++) {
            for (int k = 0; k < size; k++) {
                e[k][c] = rows[columns[c]][k];
            }
            e[size][c] = limits[columns[c]];
        }
        double[] f = new double[size + 1];
        f[size] = 1;
        double[] z = new double[passive.length];
        Arrays.fill(z, 0);
        try {
            double[] solved = new QRDecomposition(new Array2DRowRealMatrix(e, false), 1e-14)
                    .getSolver()
                    .solve(new ArrayRealVector(f, false))
                    .toArray();
            for (int c = 0; c < count; c++) {
                z[columns[c]] = solved[c];
            }
            return z;
        } catch (SingularMatrixException dependent) {
            return null;
        }
    }
}
