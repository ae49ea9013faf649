package org.soakwright.solver.stage;

import java.util.Arrays;
import org.soakwright.solver.shape.Axis;
import org.soakwright.solver.shape.Grade;

/**
 * The roots z of (1 - beta) z u'(z) + beta u(z) = 0 for one grade, beta = Bi/(1 + Bi), found as they are asked for. One root lies
 * between each zero of u' and the next zero of u, for any Biot number.
 *
 * <p>Newton's steps, replaced by bisection when they leave the bracket; done when a step is below two units in the last
 * place. At a root the smaller of u and u' follows from the other, so that both keep their relative precision.
 */
final class PlainRoots {
    private static final int MOST_EVALUATIONS = 200;

    final Axis axis;
    final double pace;
    final double beta;
    private int size;
    private double[] z = new double[8];
    private double[] u = new double[8];
    private double[] v = new double[8];
    private double[] rate = new double[8];
    /** Taylor coefficients about the roots, found when first asked for. */
    private double[][] series = new double[8][0];

    PlainRoots(Grade grade, Conditions conditions) {
        axis = grade.axis();
        pace = conditions.pace(grade);
        double biot = conditions.biot(grade);
        beta = Double.isInfinite(biot) ? 1 : biot / (1 + biot);
    }

    double z(int n) {
        return z[n];
    }

    double u(int n) {
        return u[n];
    }

    double v(int n) {
        return v[n];
    }

    double rate(int n) {
        return rate[n];
    }

    double[] series(int n) {
        if (series[n].length == 0) {
            series[n] = Wave.taylor(axis, z[n], u[n], v[n]);
        }
        return series[n];
    }

    /** Another grade's pole at the same place: from now on both are this number, so that offsets from it agree. */
    void takeRate(int n, double same) {
        rate[n] = same;
    }

    /** Finds roots until one has a rate above the limit; answers how many lie at or below it. */
    int upTo(double limit) {
        while (size == 0 || rate[size - 1] <= limit) {
            add();
        }
        int n = size;
        while (n > 0 && rate[n - 1] > limit) {
            n--;
        }
        return n;
    }

    /** The index of the root whose rate is nearest. */
    int nearest(double lambda) {
        int at = Arrays.binarySearch(rate, 0, size, lambda);
        if (at >= 0) {
            return at;
        }
        int above = -at - 1;
        if (above == 0) {
            return 0;
        }
        if (above == size) {
            return size - 1;
        }
        return lambda - rate[above - 1] <= rate[above] - lambda ? above - 1 : above;
    }

    private void add() {
        if (size == z.length) {
            z = Arrays.copyOf(z, 2 * size);
            u = Arrays.copyOf(u, 2 * size);
            v = Arrays.copyOf(v, 2 * size);
            rate = Arrays.copyOf(rate, 2 * size);
            series = Arrays.copyOf(series, 2 * size);
            Arrays.fill(series, size, 2 * size, new double[0]);
        }
        double root = find(size + 1);
        double wave = axis.wave(root);
        double slope = axis.slope(root);
        if (beta == 0) {
            slope = 0;
        } else if (Math.abs(wave) < root * Math.abs(slope)) {
            wave = -(1 - beta) * root * slope / beta;
        } else {
            slope = -beta * wave / ((1 - beta) * root);
        }
        z[size] = root;
        u[size] = wave;
        v[size] = slope;
        rate[size] = pace * root * root;
        size++;
    }

    private double find(int n) {
        if (beta == 0) {
            return axis.slopeZero(n - 1);
        }
        if (beta == 1) {
            return axis.waveZero(n);
        }
        double low = axis.slopeZero(n - 1);
        double high = axis.waveZero(n);
        double sign = n % 2 == 1 ? 1 : -1;
        double at = low + beta * (high - low);
        for (int i = 0; i < MOST_EVALUATIONS; i++) {
            double wave = axis.wave(at);
            double slope = axis.slope(at);
            double f = sign * ((1 - beta) * at * slope + beta * wave);
            if (f > 0) {
                low = at;
            } else {
                high = at;
            }
            double derivative = sign * ((1 - beta) * ((1 - axis.power()) * slope - at * wave) + beta * slope);
            double next = at - f / derivative;
            if (!(next > low && next < high)) {
                next = 0.5 * (low + high);
            }
            if (Math.abs(next - at) <= 2 * Math.ulp(at)) {
                return next;
            }
            at = next;
        }
        throw new NotConverged("root " + n + " of " + axis, low, high);
    }
}
