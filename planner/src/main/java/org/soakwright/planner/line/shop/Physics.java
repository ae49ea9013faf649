package org.soakwright.planner.line.shop;

import java.util.List;

/**
 * What the durations of a job must satisfy beyond each one's own limits. Times are in s, a phase's and the gap's after it by turns: 2 n - 1 of
 * them for n phases.
 */
public interface Physics {
    /** Nothing. */
    Physics NONE = new Physics() {
        @Override
        public Reading read(long[] times) {
            return new Reading(new double[0], new double[0][]);
        }

        @Override
        public List<long[]> styles() {
            return List.of();
        }
    };

    /** Exactly what comes of these times. */
    Reading read(long[] times);

    /**
     * Durations of the phases, gaps at their least, that satisfy everything in different ways, the quickest first. Empty where the shortest do.
     */
    List<long[]> styles();

    /** What holds for all times that satisfy everything, whatever else: proofs rest on it. */
    default List<Cut> certain() {
        return List.of();
    }

    /** Whether every miss is convex in the times, so that its tangents hold for all times that satisfy it. */
    default boolean convex() {
        return false;
    }

    /**
     * Times weighed by these sum to no less than so much.
     *
     * @param weights one for each time
     */
    record Cut(double[] weights, double atLeast) {}

    /**
     * How far each requirement is missed.
     *
     * @param misses above 0 where missed; nearly straight in the times
     * @param slopes of each miss by each time, 1/s
     */
    record Reading(double[] misses, double[][] slopes) {
        public double worst() {
            double worst = Double.NEGATIVE_INFINITY;
            for (double miss : misses) {
                worst = Math.max(worst, miss);
            }
            return misses.length == 0 ? -1 : worst;
        }

        public boolean met() {
            return worst() <= 0;
        }
    }
}
