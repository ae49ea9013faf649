package org.soakwright.planner.line.shop;

import java.util.List;

/**
 * What goes through the shop together.
 *
 * @param ready not to be moved before, s
 * @param dues when it is to have left its last station; several where several share it, none where nobody waits
 * @param amount what it takes of stations that hold many
 * @param phases one or more
 * @param physics what its durations must satisfy
 * @param tariff what its times cost
 */
public record Job(
        String name, long ready, List<Due> dues, long amount, List<Phase> phases, Physics physics, Tariff tariff) {
    public Job {
        dues = List.copyOf(dues);
        phases = List.copyOf(phases);
        if (phases.isEmpty()) {
            throw new IllegalArgumentException("a job has a phase");
        }
    }

    /**
     * A moment that somebody waits for.
     *
     * @param moment s
     * @param weight of a second of lateness
     */
    public record Due(long moment, double weight) {}

    /** The first moment that somebody waits for; {@link Moments#NEVER} where nobody does. */
    public long due() {
        return dues.stream().mapToLong(Due::moment).min().orElse(Moments.NEVER);
    }

    /** What a second of lateness weighs once all are late. */
    public double weight() {
        return dues.stream().mapToDouble(Due::weight).sum();
    }

    /** Lateness times weight of being out at a moment, s. */
    public double lateness(long out) {
        double sum = 0;
        for (Due due : dues) {
            sum += due.weight() * Math.max(0, out - due.moment());
        }
        return sum;
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
