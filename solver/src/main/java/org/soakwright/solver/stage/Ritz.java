package org.soakwright.solver.stage;

import java.util.Arrays;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.EigenDecomposition;
import org.soakwright.solver.shape.Axis;

/**
 * The modes of one side on its own, at one Biot number, found among piecewise polynomials (Rayleigh-Ritz): orthonormal in the mean over
 * the side, slowest first, with rates in units of D/L^2. The slow ones agree with the standing waves to rounding; the quick ones are no
 * waves, but together they follow the surroundings as the endless rest of the waves would. All Biot numbers share one space,
 * so nothing is lost between stages.
 *
 * <p>Found from the inverse of the operator, whose largest eigenvalues are the slow modes: so these keep their relative precision
 * although the quick ones are up to 1e12 times as quick; rates are Rayleigh quotients, sums of squares without cancellation.
 */
public final class Ritz {
    /** Added to every rate before inverting, so that a sealed side has an inverse. */
    private static final double SHIFT = 1;

    private static final GaussIntegratorFactory RULES = new GaussIntegratorFactory();

    private final Axis axis;
    private final Mesh mesh;
    private final int size;
    private final double[] rate;
    private final double[] uniform;
    /** By mode, then by polynomial. */
    private final double[][] shape;
    /** By mode, then by orthonormal basis function of the whole space. */
    private final double[][] basis;

    /**
     * Finds the modes of a side from the core.
     *
     * @param biot 0 when sealed, infinite when the surface is in equilibrium with its surroundings at once
     */
    public Ritz(Axis axis, Mesh mesh, double biot) {
        this(axis, mesh, 0, biot);
    }

    /**
     * Finds the modes of a side that may exchange at both ends.
     *
     * @param back Biot number at position 0; 0 at a core
     * @param biot the same at position 1
     */
    public Ritz(Axis axis, Mesh mesh, double back, double biot) {
        this.axis = axis;
        this.mesh = mesh;
        int all = mesh.size();
        double[][] mass = new double[all][all];
        double[][] stiffness = new double[all][all];
        assemble(mass, stiffness);
        boolean held = Double.isInfinite(biot);
        double pull = held ? 0 : (axis.power() + 1) * biot;
        boolean backHeld = Double.isInfinite(back);
        double backPull = backHeld ? 0 : back;
        // The unknown at the surface comes last, that at the back first: held, they are simply left out.
        int first = backHeld ? 1 : 0;
        int n = (held ? all - 1 : all) - first;
        double[][] shifted = new double[n][n];
        double[][] free = new double[n][n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                free[i][j] = mass[first + i][first + j];
                shifted[i][j] = stiffness[first + i][first + j] + SHIFT * free[i][j];
            }
        }
        if (!held) {
            shifted[n - 1][n - 1] += pull;
        }
        if (!backHeld) {
            shifted[0][0] += backPull;
        }
        double[][] root = Triangular.cholesky(mass);
        double[][] part = backHeld ? Triangular.cholesky(free) : Triangular.leading(root, n);
        double[][] inverse = Triangular.congruent(Triangular.cholesky(shifted), part);
        EigenDecomposition eigen = new EigenDecomposition(new Array2DRowRealMatrix(inverse, false));
        size = n;
        rate = new double[n];
        uniform = new double[n];
        shape = new double[n][];
        basis = new double[n][];
        Integer[] order = order(eigen.getRealEigenvalues());
        for (int m = 0; m < n; m++) {
            double[] vector = eigen.getEigenvector(order[m]).toArray();
            shape[m] = new double[all];
            System.arraycopy(Triangular.solveTransposed(part, vector), 0, shape[m], first, n);
            basis[m] = backHeld ? Triangular.timesTransposed(root, shape[m]) : Arrays.copyOf(vector, all);
            rate[m] = biot == 0 && back == 0 && m == 0
                    ? 0
                    : steepness(shape[m])
                            + pull * shape[m][all - 1] * shape[m][all - 1]
                            + backPull * shape[m][0] * shape[m][0];
            uniform[m] = mean(shape[m], mass);
        }
    }

    private static Integer[] order(double[] eigenvalues) {
        Integer[] order = new Integer[eigenvalues.length];
        Arrays.setAll(order, i -> i);
        Arrays.sort(order, (a, b) -> Double.compare(eigenvalues[b], eigenvalues[a]));
        return order;
    }

    /** Number of modes. */
    public int size() {
        return size;
    }

    /** Rate of decay of a mode over D/L^2, 1. */
    public double rate(int mode) {
        return rate[mode];
    }

    /** Mean of each mode over the side: what the uniform state has of it. */
    public double[] uniform() {
        return uniform.clone();
    }

    double uniform(int mode) {
        return uniform[mode];
    }

    /** All modes at a position from 0, the core or back, to 1, the surface. */
    public double[] at(double position) {
        int e = 0;
        while (e < mesh.elements() - 1 && position > mesh.ends()[e + 1]) {
            e++;
        }
        double low = mesh.ends()[e];
        double half = 0.5 * (mesh.ends()[e + 1] - low);
        double[] local = Bubbles.values(mesh.degree(), (position - low) / half - 1);
        double[] values = new double[size];
        for (int m = 0; m < size; m++) {
            double sum = 0;
            for (int i = 0; i < local.length; i++) {
                sum += local[i] * shape[m][unknown(e, i)];
            }
            values[m] = sum;
        }
        return values;
    }

    /** What each mode of another set has of each of these, by these and then by the other's; both on one mesh. */
    public double[][] carryFrom(Ritz before) {
        double[][] carry = new double[size][before.size];
        for (int m = 0; m < size; m++) {
            for (int n = 0; n < before.size; n++) {
                double sum = 0;
                for (int i = 0; i < mesh.size(); i++) {
                    sum += basis[m][i] * before.basis[n][i];
                }
                carry[m][n] = sum;
            }
        }
        return carry;
    }

    /** Means of each mode times a profile that is smooth within each element. */
    public double[] project(java.util.function.DoubleUnaryOperator profile) {
        double[] sums = new double[size];
        GaussIntegrator rule = RULES.legendre(mesh.degree() + 4);
        for (int e = 0; e < mesh.elements(); e++) {
            double half = 0.5 * (mesh.ends()[e + 1] - mesh.ends()[e]);
            double middle = 0.5 * (mesh.ends()[e + 1] + mesh.ends()[e]);
            for (int g = 0; g < rule.getNumberOfPoints(); g++) {
                double x = middle + half * rule.getPoint(g);
                double weight = half * rule.getWeight(g) * (axis.power() + 1) * Math.pow(x, axis.power());
                double[] values = at(x);
                for (int m = 0; m < size; m++) {
                    sums[m] += weight * profile.applyAsDouble(x) * values[m];
                }
            }
        }
        return sums;
    }

    /** Index of an element's function: its two ends first, then its bubbles; the surface is the last of all. */
    private int unknown(int element, int local) {
        if (local < 2) {
            int end = element + local;
            return end == mesh.elements() ? mesh.size() - 1 : end;
        }
        return mesh.elements() + element * (mesh.degree() - 1) + local - 2;
    }

    private void assemble(double[][] mass, double[][] stiffness) {
        GaussIntegrator rule = RULES.legendre(mesh.degree() + 2);
        for (int e = 0; e < mesh.elements(); e++) {
            double half = 0.5 * (mesh.ends()[e + 1] - mesh.ends()[e]);
            double middle = 0.5 * (mesh.ends()[e + 1] + mesh.ends()[e]);
            for (int g = 0; g < rule.getNumberOfPoints(); g++) {
                double x = middle + half * rule.getPoint(g);
                double weight = half * rule.getWeight(g) * (axis.power() + 1) * Math.pow(x, axis.power());
                double[] value = Bubbles.values(mesh.degree(), rule.getPoint(g));
                double[] slope = Bubbles.slopes(mesh.degree(), rule.getPoint(g));
                for (int i = 0; i < value.length; i++) {
                    for (int j = 0; j < value.length; j++) {
                        mass[unknown(e, i)][unknown(e, j)] += weight * value[i] * value[j];
                        stiffness[unknown(e, i)][unknown(e, j)] += weight * slope[i] * slope[j] / (half * half);
                    }
                }
            }
        }
    }

    /** Mean of the squared slope: a sum of squares, small where the mode is nearly uniform. */
    private double steepness(double[] mode) {
        GaussIntegrator rule = RULES.legendre(mesh.degree() + 2);
        double sum = 0;
        for (int e = 0; e < mesh.elements(); e++) {
            double half = 0.5 * (mesh.ends()[e + 1] - mesh.ends()[e]);
            double middle = 0.5 * (mesh.ends()[e + 1] + mesh.ends()[e]);
            for (int g = 0; g < rule.getNumberOfPoints(); g++) {
                double[] slopes = Bubbles.slopes(mesh.degree(), rule.getPoint(g));
                // The ends' slopes are opposite: their difference, taken first, does not cancel.
                double slope = (mode[unknown(e, 1)] - mode[unknown(e, 0)]) * slopes[1];
                for (int i = 2; i < slopes.length; i++) {
                    slope += slopes[i] * mode[unknown(e, i)];
                }
                double x = middle + half * rule.getPoint(g);
                sum += rule.getWeight(g) / half * (axis.power() + 1) * Math.pow(x, axis.power()) * slope * slope;
            }
        }
        return sum;
    }

    /** The uniform state is one at every end and has no bubbles. */
    private double mean(double[] mode, double[][] mass) {
        int all = mesh.size();
        double sum = 0;
        for (int end = 0; end <= mesh.elements(); end++) {
            double[] row = mass[end == mesh.elements() ? all - 1 : end];
            for (int i = 0; i < all; i++) {
                sum += row[i] * mode[i];
            }
        }
        return sum;
    }
}
