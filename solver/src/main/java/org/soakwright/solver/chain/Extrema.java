package org.soakwright.solver.chain;

import org.soakwright.solver.shape.Axis;
import org.soakwright.solver.stage.Modes;

/**
 * Places where the profile of a grade is highest or lowest: the ends, and every zero of its slope. The slope is looked at on a
 * grid of four points to the shortest wave; each change of sign is narrowed down by false position until the place is
 * known to 1e-9 of the half-thickness, so the value, flat there, to about 1e-18.
 */
final class Extrema {
    private static final double PLACE = 1e-9;
    private static final int MOST_EVALUATIONS = 100;

    private final Modes modes;
    private final int grade;
    private final Axis axis;
    private double[][] slopes = new double[0][];
    private int known;

    Extrema(Modes modes, int grade, Axis axis) {
        this.modes = modes;
        this.grade = grade;
        this.axis = axis;
    }

    /** Position of the largest (sign 1) or smallest (sign -1) of sum y amplitude u(z x). */
    double place(double[] y, int count, double sign) {
        if (count > known) {
            tabulate(count);
        }
        double best = 0;
        double bestValue = sign * value(y, count, 0);
        double atSurface = sign * value(y, count, 1);
        if (atSurface > bestValue) {
            best = 1;
            bestValue = atSurface;
        }
        int last = slopes.length;
        double left = sign * Link.dot(slopes[0], y, count);
        for (int i = 1; i < last; i++) {
            double right = sign * Link.dot(slopes[i], y, count);
            if (left > 0 && right < 0) {
                double x = narrow(y, count, sign, position(i - 1), left, position(i), right);
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

    private double position(int i) {
        return (i + 1.0) / slopes.length;
    }

    private void tabulate(int count) {
        int points = 2 * count + 16;
        double[][] table = new double[points][count];
        for (int i = 0; i < points; i++) {
            double x = (i + 1.0) / points;
            for (int n = 0; n < count; n++) {
                double amplitude = modes.amplitude(grade, n);
                double z = modes.frequency(grade, n);
                table[i][n] = amplitude == 0 ? 0 : amplitude * z * axis.slope(z * x);
            }
        }
        slopes = table;
        known = count;
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
            double f = sign * slope(y, count, x);
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

    private double slope(double[] y, int count, double x) {
        double sum = 0;
        for (int n = 0; n < count; n++) {
            double weight = y[n] * modes.amplitude(grade, n);
            if (weight != 0) {
                double z = modes.frequency(grade, n);
                sum += weight * z * axis.slope(z * x);
            }
        }
        return sum;
    }

    private double value(double[] y, int count, double x) {
        double sum = 0;
        for (int n = 0; n < count; n++) {
            sum += y[n] * modes.at(grade, n, x);
        }
        return sum;
    }
}
