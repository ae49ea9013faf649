package org.soakwright.solver.transport;

import java.util.function.DoubleFunction;
import java.util.function.DoubleUnaryOperator;

/**
 * A film in still liquor and the density difference that keeps it up: the stronger the film, the smaller the difference
 * it leaves.
 *
 * <p>Found by going half way from each difference to the one its film leaves. That comes to rest where a rise in the
 * difference makes what its film leaves fall by less than three times as much; films go with about the fourth root of
 * the difference, so it falls by less than a third. Done when a step is below {@link #ROUNDING} of the larger of the
 * first difference and the present one; after {@link #MOST_EVALUATIONS} evaluations it is given up.
 *
 * @param estimate the film
 * @param densityDifference kg/m3; at least 0
 * @param evaluations of the film
 */
public record Settled(Estimate estimate, double densityDifference, int evaluations) {
    /** Films evaluated at most. */
    public static final int MOST_EVALUATIONS = 200;

    /** Step, as a share of the difference, that no longer counts. */
    public static final double ROUNDING = 1e-12;

    private static final double DAMPING = 0.5;

    /**
     * Finds the two.
     *
     * @param film the film at a density difference, kg/m3
     * @param left the density difference that a film coefficient in m/s leaves, kg/m3; at least 0
     * @param first where to start, kg/m3; at least 0
     * @throws NotSettled when it does not come to rest or meets what is not a density difference
     */
    public static Settled of(DoubleFunction<Estimate> film, DoubleUnaryOperator left, double first) {
        double difference = first;
        for (int evaluations = 1; evaluations <= MOST_EVALUATIONS; evaluations++) {
            check(difference, evaluations);
            Estimate estimate = film.apply(difference);
            double next = left.applyAsDouble(estimate.coefficient());
            check(next, evaluations);
            if (Math.abs(next - difference) <= ROUNDING * Math.max(first, difference)) {
                return new Settled(estimate, difference, evaluations);
            }
            difference += DAMPING * (next - difference);
        }
        throw new NotSettled("density difference", MOST_EVALUATIONS, difference, "kg/m3");
    }

    private static void check(double difference, int evaluations) {
        if (!(difference >= 0) || Double.isInfinite(difference)) {
            throw new NotSettled("density difference", evaluations, difference, "kg/m3");
        }
    }
}
