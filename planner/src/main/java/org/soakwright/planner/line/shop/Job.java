package org.soakwright.planner.line.shop;

import java.util.List;
import java.util.OptionalLong;

/**
 * What goes through the shop together.
 *
 * @param ready not to be moved before, s
 * @param due when it is to have left its last station, s; empty where nobody waits
 * @param weight of a second of lateness
 * @param amount what it takes of stations that hold many
 * @param phases one or more
 * @param physics what its durations must satisfy
 * @param tariff what its times cost
 */
public record Job(
        String name,
        long ready,
        OptionalLong due,
        double weight,
        long amount,
        List<Phase> phases,
        Physics physics,
        Tariff tariff) {
    public Job {
        phases = List.copyOf(phases);
        if (phases.isEmpty()) {
            throw new IllegalArgumentException("a job has a phase");
        }
    }

    public int size() {
        return phases.size();
    }

    public Phase phase(int k) {
        return phases.get(k);
    }

    /** Least time between its phases k - 1 and k, s. */
    public long leastGap(int k) {
        Joint before = phases.get(k).before();
        if (before instanceof Joint.Lift lift) {
            return lift.least();
        }
        return before instanceof Joint.Change change ? change.seconds() : 0;
    }
}
