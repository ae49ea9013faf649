package org.soakwright.planner.conditions;

import java.util.function.DoubleUnaryOperator;

/**
 * By how much a step is shorter, for what diffuses, than its clock says, because the piece was colder than the step at first: the
 * time integral of 1 - D(T)/D. Negative where it was warmer. The integral runs over the root of time, where the integrand is smooth, by
 * Gauss and Legendre's rule of four points on each of {@link #PANELS} panels.
 */
public final class Lag {
    /** Nothing to add or take away. */
    public static final Lag NONE = new Lag(seconds -> 0, 0);

    /**
     * Of (D t)^(1/2): a diffusivity that rises from the surface by m per 2 (D t)^(1/2) of depth, m small, makes the uptake of an endless piece
     * that of a time shorter by 2 m/(3 pi^(1/2)), to first order in m; so 4/(3 pi^(1/2)) of the root of D t.
     */
    private static final double LAYER = 4 / (3 * Math.sqrt(Math.PI));

    /** Of a slab's first mode in both: the mean of cos over sin^2 is 4/(3 pi), that of cos alone 2/pi. */
    private static final double THROUGH = 2.0 / 3;

    private static final int PANELS = 48;
    private static final double[] NODES = {
        -0.8611363115940526, -0.3399810435848563, 0.3399810435848563, 0.8611363115940526
    };
    private static final double[] WEIGHTS = {
        0.3478548451374538, 0.6521451548625461, 0.6521451548625461, 0.3478548451374538
    };

    private final DoubleUnaryOperator slope;
    private final double over;
    private final double[] sums;

    /**
     * Adds it up for one step.
     *
     * @param felt the share of the difference in temperature that what diffuses feels at a time since the step began, s
     * @param difference what the pieces are warmer by than the step when it begins, K
     * @param slowed 1 - D(T)/D where T is so many kelvins above the step's temperature
     */
    static Lag of(Warmth warmth, DoubleUnaryOperator felt, double difference, DoubleUnaryOperator slowed) {
        return new Lag(seconds -> slowed.applyAsDouble(difference * felt.applyAsDouble(seconds)), warmth.over());
    }

    /**
     * For a solute that only begins to leave or enter uniform pieces: it moves in a layer much thinner than the warmth's, and feels the
     * temperature there, its gradient at the surface times {@link #LAYER} of the solute's depth (D t)^(1/2).
     */
    public static Lag fresh(Warmth warmth, double diffusivity, double difference, DoubleUnaryOperator slowed) {
        return of(
                warmth,
                seconds -> Math.min(
                        warmth.left(seconds), LAYER * warmth.gradient(seconds) * Math.sqrt(diffusivity * seconds)),
                difference,
                slowed);
    }

    /** For a profile that reaches through the pieces: it feels {@link #THROUGH} of what their mean temperature has to go. */
    public static Lag through(Warmth warmth, double difference, DoubleUnaryOperator slowed) {
        return of(warmth, seconds -> THROUGH * warmth.left(seconds), difference, slowed);
    }

    /** At most: as if the whole of what the mean temperature has to go were felt. */
    public static Lag most(Warmth warmth, double difference, DoubleUnaryOperator slowed) {
        return of(warmth, warmth::left, difference, slowed);
    }

    /** The mean over so many seconds of what the mean temperature has to go, as a share of what it had. */
    public static double mean(Warmth warmth, double seconds) {
        return most(warmth, 1, left -> left).of(seconds) / seconds;
    }

    /**
     * Adds it up.
     *
     * @param slope 1 - D(T)/D at a time since the step began, s; below 1
     * @param over from here on the slope is nothing, s
     */
    Lag(DoubleUnaryOperator slope, double over) {
        this.slope = slope;
        this.over = over;
        sums = new double[over > 0 ? PANELS + 1 : 1];
        for (int i = 1; i < sums.length; i++) {
            sums[i] = sums[i - 1] + panel(root(i - 1), root(i));
        }
    }

    /** What diffuses as if the step had its temperature throughout and lasted so long, s; above 0 for any step above 0. */
    public double effective(double seconds) {
        return seconds - of(seconds);
    }

    /** The lag of a step of so many seconds, s. */
    public double of(double seconds) {
        if (over == 0) {
            return 0;
        }
        if (seconds >= over) {
            return sums[PANELS];
        }
        double root = Math.sqrt(seconds);
        int before = (int) (root / root(1));
        return sums[before] + panel(root(before), root);
    }

    /** How much longer the step is for what diffuses by a second more, 1. */
    public double rate(double seconds) {
        return over == 0 || seconds >= over ? 1 : 1 - slope.applyAsDouble(seconds);
    }

    private double root(int panel) {
        return Math.sqrt(over) * panel / PANELS;
    }

    private double panel(double from, double to) {
        double middle = (from + to) / 2;
        double half = (to - from) / 2;
        double sum = 0;
        for (int i = 0; i < NODES.length; i++) {
            double root = middle + half * NODES[i];
            sum += WEIGHTS[i] * 2 * root * slope.applyAsDouble(root * root);
        }
        return half * sum;
    }
}
