package org.soakwright.solver.chain;

import java.util.Arrays;
import java.util.HashMap;
import java.util.Map;
import org.soakwright.solver.shape.Axis;
import org.soakwright.solver.stage.Modes;

/**
 * Places where the profile of a grade is highest or lowest: the ends, and every zero of its slope. What is looked at is slope over
 * position, which at the core is the curvature, so that a zero close to the core is seen too. A grid of four points or more to
 * the shortest wave finds the changes of sign; each is narrowed down by false position until the place is known to 1e-9 of the
 * depth, so the value, flat there, to about 1e-18.
 */
final class Extrema {
    private static final double PLACE = 1e-9;
    private static final int MOST_EVALUATIONS = 100;
    private static final int SMALLEST_TABLE = 8;

    private final Modes modes;
    private final int grade;
    private final Axis axis;
    /** By the number of modes a table holds, a power of two: so that a reading does not depend on what was read before. */
    private final Map<Integer, double[][]> tables = new HashMap<>();

    Extrema(Modes modes, int grade, Axis axis) {
        this.modes = modes;
        this.grade = grade;
        this.axis = axis;
    }

    /** Position of the largest (sign 1) or smallest (sign -1) of sum y amplitude u(z x). */
    double place(double[] y, int count, double sign) {
        int size = Math.max(SMALLEST_TABLE, Integer.highestOneBit(Math.max(1, count - 1)) * 2);
        double[][] table = tables.computeIfAbsent(size, this::empty);
        fill(table, count);
        double best = 0;
        double bestValue = sign * value(y, count, 0);
        double atSurface = sign * value(y, count, 1);
        if (atSurface > bestValue) {
            best = 1;
            bestValue = atSurface;
        }
        int last = table.length - 1;
        double left = sign * Link.dot(table[0], y, count);
        for (int i = 1; i <= last; i++) {
            double right = sign * Link.dot(table[i], y, count);
            if (left > 0 && right < 0) {
                double x = narrow(y, count, sign, (i - 1.0) / last, left, (double) i / last, right);
                double value = sign * value(y, count, x);
                if (value > bestValue) {
                    best = x;
                    bestValue = value;
                }
            }
            left = right;
        }
        return best;
    }

    private double[][] empty(int size) {
        double[][] table = new double[2 * size + 17][size];
        for (double[] row : table) {
            Arrays.fill(row, Double.NaN);
        }
        return table;
    }

    /** Rows by position, from core to surface; columns by mode, filled as far as they are asked for. */
    private void fill(double[][] table, int count) {
        if (!Double.isNaN(table[0][count - 1])) {
            return;
        }
        int last = table.length - 1;
        for (int n = 0; n < count; n++) {
            if (Double.isNaN(table[0][n])) {
                for (int i = 0; i <= last; i++) {
                    table[i][n] = steepness(n, (double) i / last);
                }
            }
        }
    }

    /** Slope over position of a mode; at the core its limit, the curvature. */
    private double steepness(int mode, double x) {
        double amplitude = modes.amplitude(grade, mode);
        double z = modes.frequency(grade, mode);
        if (amplitude == 0 || z == 0) {
            return 0;
        }
        return amplitude * z * (x == 0 ? -z / (axis.power() + 1) : axis.slope(z * x) / x);
    }

    private double narrow(double[] y, int count, double sign, double a, double fa, double b, double fb) {
        double low = a;
        double high = b;
        double fLow = fa;
        double fHigh = fb;
        int side = 0;
        for (int i = 0; i < MOST_EVALUATIONS && high - low > PLACE; i++) {
            double x = high - fHigh * (high - low) / (fHigh - fLow);
            double margin = 0.25 * PLACE;
            x = Math.min(high - margin, Math.max(low + margin, x));
            double f = 0;
            for (int n = 0; n < count; n++) {
                f += sign * y[n] * steepness(n, x);
            }
            // The Illinois rule: an end that stays is given half its weight.
            if (f > 0) {
                low = x;
                fLow = f;
                fHigh = side == 1 ? fHigh / 2 : fHigh;
                side = 1;
            } else {
                high = x;
                fHigh = f;
                fLow = side == -1 ? fLow / 2 : fLow;
                side = -1;
            }
        }
        return 0.5 * (low + high);
    }

    private double value(double[] y, int count, double x) {
        double sum = 0;
        for (int n = 0; n < count; n++) {
            sum += y[n] * modes.at(grade, n, x);
        }
        return sum;
    }
}
