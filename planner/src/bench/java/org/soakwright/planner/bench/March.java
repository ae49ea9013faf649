package org.soakwright.planner.bench;

/**
 * {@link FiveSoaks} on cells, marched by Crank-Nicolson from steps that damp: after each change of liquor, the first steps are
 * two backward-Euler half steps each (Rannacher, Numerische Mathematik 43, 1984, 309). One matrix serves both kinds of step, and a
 * Crank-Nicolson step from y is 2z - y, z being the half step.
 *
 * <p>Content over partition and liquor content are scaled by the roots of their capacities: the matrix is then symmetric, the
 * reverse sweep solves with the same factors, and the derivative of either step by its length is the solution with its own
 * difference over that length.
 */
final class March {
    private final int cells;
    private final int steps;
    /** Half steps that damp, and all solves, in a soak. */
    private final int damped;

    private final int solves;
    private final double[] width;
    private final double[] scale;
    private final double[] between;
    private final double surface;
    private final double[][][] state;
    private final double[][] pivot = new double[FiveSoaks.SOAKS][];
    private final double[][] factor = new double[FiveSoaks.SOAKS][];
    private final double[] work;
    private final double[] adjoint;
    private double[] seconds = {};

    March(Effort effort) {
        cells = effort.cells();
        steps = effort.steps();
        damped = 2 * effort.damped();
        solves = steps + effort.damped();
        double capacity = FiveSoaks.PARTITION * FiveSoaks.VOLUME;
        double pace = capacity * FiveSoaks.DIFFUSIVITY / (FiveSoaks.LENGTH * FiveSoaks.LENGTH);
        width = new double[cells];
        scale = new double[cells];
        between = new double[cells - 1];
        for (int i = 0; i < cells; i++) {
            width[i] = effort.place(i + 1) - effort.place(i);
            scale[i] = Math.sqrt(capacity * width[i]);
        }
        for (int i = 0; i + 1 < cells; i++) {
            between[i] = pace / (effort.place(i + 1.5) - effort.place(i + 0.5));
        }
        surface = (1 - effort.place(cells - 0.5)) / pace;
        state = new double[FiveSoaks.SOAKS][solves + 1][cells + 1];
        for (int k = 0; k < FiveSoaks.SOAKS; k++) {
            pivot[k] = new double[cells + 1];
            factor[k] = new double[cells + 1];
        }
        work = new double[cells + 1];
        adjoint = new double[cells + 1];
    }

    /** The mean at the end, kg/m3. */
    double follow(double[] durations) {
        seconds = durations;
        double[] first = state[0][0];
        for (int i = 0; i < cells; i++) {
            first[i] = scale[i] * FiveSoaks.START / FiveSoaks.PARTITION;
        }
        for (int k = 0; k < FiveSoaks.SOAKS; k++) {
            factorise(k);
            double[][] of = state[k];
            if (k > 0) {
                System.arraycopy(state[k - 1][solves], 0, of[0], 0, cells);
            }
            of[0][cells] = 0;
            for (int s = 0; s < solves; s++) {
                solve(k, of[s], of[s + 1]);
                if (s >= damped) {
                    reflect(of[s + 1], of[s]);
                }
            }
        }
        double[] last = state[FiveSoaks.SOAKS - 1][solves];
        double sum = 0;
        for (int i = 0; i < cells; i++) {
            sum += width[i] * last[i] / scale[i];
        }
        return FiveSoaks.PARTITION * sum;
    }

    /** Adds the derivatives of the value last followed by the durations, times a weight. */
    void addGradient(double weight, double[] gradient) {
        double[] q = adjoint;
        for (int i = 0; i < cells; i++) {
            q[i] = weight * FiveSoaks.PARTITION * width[i] / scale[i];
        }
        for (int k = FiveSoaks.SOAKS - 1; k >= 0; k--) {
            q[cells] = 0;
            double slope = 0;
            for (int s = solves - 1; s >= 0; s--) {
                solve(k, q, work);
                double[] before = state[k][s];
                double[] after = state[k][s + 1];
                double mirror = s >= damped ? 1 : 0;
                for (int i = 0; i <= cells; i++) {
                    slope += work[i] * (after[i] - before[i]);
                    q[i] = (1 + mirror) * work[i] - mirror * q[i];
                }
            }
            gradient[k] += slope / seconds[k];
        }
    }

    /** Identity plus half a step times the scaled conductances, as L D L'. */
    private void factorise(int k) {
        double half = 0.5 * seconds[k] / steps;
        double toBath = 1 / (surface + FiveSoaks.LENGTH / (FiveSoaks.VOLUME * FiveSoaks.film(k)));
        double root = Math.sqrt(FiveSoaks.liquor(k));
        double[] inverse = pivot[k];
        double[] lower = factor[k];
        double left = 0;
        double carried = 0;
        for (int i = 0; i <= cells; i++) {
            double right = i == cells ? 0 : i == cells - 1 ? toBath : between[i];
            double own = i == cells ? root : scale[i];
            double diagonal = 1 + half * (left + right) / (own * own);
            inverse[i] = 1 / (diagonal - carried);
            if (i < cells) {
                double off = -half * right / (own * (i == cells - 1 ? root : scale[i + 1]));
                lower[i + 1] = off * inverse[i];
                carried = off * lower[i + 1];
            }
            left = right;
        }
    }

    /** Every product waits for the one before; fused, as machines do it, a third less. */
    private void solve(int k, double[] right, double[] solution) {
        double[] inverse = pivot[k];
        double[] lower = factor[k];
        double last = right[0];
        solution[0] = last;
        for (int i = 1; i <= cells; i++) {
            last = Math.fma(-lower[i], last, right[i]);
            solution[i] = last;
        }
        last *= inverse[cells];
        solution[cells] = last;
        for (int i = cells - 1; i >= 0; i--) {
            last = Math.fma(-lower[i + 1], last, solution[i] * inverse[i]);
            solution[i] = last;
        }
    }

    private void reflect(double[] after, double[] before) {
        for (int i = 0; i <= cells; i++) {
            after[i] = 2 * after[i] - before[i];
        }
    }
}
