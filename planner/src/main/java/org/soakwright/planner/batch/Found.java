package org.soakwright.planner.batch;

/**
 * A point of the grid that was followed.
 *
 * @param free durations of the free steps, s
 * @param miss the largest miss
 * @param met whether every target is met, as a result says it
 */
record Found(double[] free, double miss, boolean met) {
    /** Misses that differ by less, relative to their limit, are told apart by nobody: the cheaper is shown. */
    static final double ALIKE = 1e-3;

    static Found of(Landscape landscape, double[] free) {
        Run run = landscape.run(free);
        return new Found(free, Landscape.largest(landscape.misses(run)), run.meetsTargets());
    }
}
