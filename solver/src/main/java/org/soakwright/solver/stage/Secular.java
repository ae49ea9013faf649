package org.soakwright.solver.stage;

import java.util.List;
import org.soakwright.solver.shape.Grade;

/**
 * The coupled rates of several grades in one vessel: F(lambda) = lambda (V + sum S H(lambda)) - Q = 0, where H is a grade's
 * uptake response. F rises from minus to plus infinity between neighbouring poles, so each gap holds one root.
 *
 * <p>The unknown is the offset from the nearer pole, and every grade is evaluated from its own offset: so roots that almost
 * coincide with a pole, and poles that almost coincide with each other, keep full relative precision in what matters.
 * Newton's steps on offset times F, which has no pole, replaced by bisection when they leave the bracket; done when a step
 * is below four units in the last place of the offset.
 */
final class Secular {
    private static final int MOST_EVALUATIONS = 300;

    private final PlainRoots[] roots;
    private final double[] capacity;
    private final double volume;
    private final double flow;
    final Wave[] waves;

    Secular(List<Grade> lot, Conditions conditions, PlainRoots[] roots) {
        this.roots = roots;
        Bath.Vessel vessel = (Bath.Vessel) conditions.bath();
        volume = vessel.volume();
        flow = vessel.flow();
        capacity = new double[roots.length];
        waves = new Wave[roots.length];
        for (int j = 0; j < roots.length; j++) {
            capacity[j] = conditions.partition() * lot.get(j).volume();
            waves[j] = new Wave();
        }
    }

    /** F at anchor + offset; leaves each grade's wave in place. */
    private double balance(double anchor, double offset) {
        double lambda = anchor + offset;
        double sum = volume;
        for (int j = 0; j < roots.length; j++) {
            PlainRoots plain = roots[j];
            Wave wave = waves[j];
            place(plain, wave, anchor, offset, lambda);
            double response =
                    wave.z == 0 ? 1 : -(plain.axis.power() + 1) * plain.beta * wave.v / (wave.z * wave.defect);
            sum += capacity[j] * response;
        }
        return lambda * sum - flow;
    }

    private static void place(PlainRoots plain, Wave wave, double anchor, double offset, double lambda) {
        double z = Math.sqrt(lambda / plain.pace);
        int n = plain.nearest(lambda);
        double root = plain.z(n);
        double h = (anchor - plain.rate(n) + offset) / (plain.pace * (z + root));
        if (Math.abs(h) <= Wave.NEAR * Math.min(1, root)) {
            wave.near(plain.series(n), plain.beta, root, h);
        } else {
            wave.direct(plain.axis, plain.beta, z);
        }
    }

    /** dF/dlambda at the waves left in place: also the squared norm of the mode with unit liquor content. */
    double squaredNorm() {
        double sum = volume;
        for (int j = 0; j < roots.length; j++) {
            double amplitude = amplitude(j);
            sum += capacity[j] * amplitude * amplitude * roots[j].axis.meanSquare(waves[j].z, waves[j].u, waves[j].v);
        }
        return sum;
    }

    /** Amplitude of the piece's wave when the liquor's content is one. */
    double amplitude(int grade) {
        return roots[grade].beta / waves[grade].defect;
    }

    /** Puts the waves of the uniform state in place. */
    void atRest() {
        balance(0, 0);
    }

    /**
     * Finds the root between two neighbouring poles (the lower may be 0, which is no pole); leaves the waves in place.
     *
     * @return the rate
     */
    double between(double lower, double upper) {
        double half = 0.5 * (upper - lower);
        double middle = balance(lower, half);
        boolean leans = middle > 0;
        boolean pole = lower > 0 || !leans;
        double anchor = leans ? lower : upper;
        double sign = leans ? 1 : -1;
        double low = 0;
        double high = half;
        double e = half;
        double f = leans ? middle : balance(anchor, -half);
        for (int i = 0; i < MOST_EVALUATIONS; i++) {
            double slope = squaredNorm();
            // With the pole multiplied away: g(e) rises through zero, from minus the residue at e = 0.
            double g = pole ? sign * e * f : f;
            double derivative = pole ? sign * f + e * slope : slope;
            if (g > 0) {
                high = e;
            } else {
                low = e;
            }
            double next = e - g / derivative;
            if (!(next > low && next < high)) {
                next = 0.5 * (low + high);
            }
            boolean done = Math.abs(next - e) <= 4 * Math.ulp(e) || g == 0;
            e = done ? e : next;
            if (done) {
                return anchor + sign * e;
            }
            f = balance(anchor, sign * e);
        }
        throw new NotConverged("coupled rate", lower, upper);
    }
}
