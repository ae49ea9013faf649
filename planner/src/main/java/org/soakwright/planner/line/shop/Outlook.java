package org.soakwright.planner.line.shop;

import java.util.Arrays;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * How long the phases of a job that are still to come must and may last, given those that are over. What is to come is taken from a style, all of
 * its durations shortened or stretched alike between each one's shortest and beyond: the least of it that meets what more time helps with.
 */
final class Outlook {
    private static final double MOST = 4;
    private static final int MOST_STEPS = 24;
    private static final double MINUTE = 60;

    private final Job job;
    private final Estimate estimate;

    Outlook(Job job, Estimate estimate) {
        this.job = job;
        this.estimate = estimate;
    }

    /** Least and most that each phase may last, s. */
    record Bounds(long[] least, long[] most) {
        /** Whether they are those of others from a phase on. */
        boolean equalFrom(int phase, Bounds other) {
            int n = least.length;
            return Arrays.equals(least, phase, n, other.least, phase, n)
                    && Arrays.equals(most, phase, n, other.most, phase, n);
        }
    }

    /** The shortest durations of each phase. */
    private long[] shortest() {
        return job.phases().stream().mapToLong(Phase::shortest).toArray();
    }

    /**
     * Bounds on what is to come.
     *
     * @param style durations of all phases
     * @param past times of the phases that are over, and the gaps before and after them
     * @param over how many they are
     * @return null where this style cannot meet what is asked after such a past
     */
    @Nullable
    Bounds after(long[] style, long[] past, int over) {
        long[] least = scaled(style, past, over);
        if (least == null) {
            return null;
        }
        long[] most = new long[job.size()];
        for (int k = 0; k < most.length; k++) {
            most[k] = k < over ? least[k] : most(least, past, over, k);
            if (most[k] < least[k]) {
                return null;
            }
        }
        return new Bounds(least, most);
    }

    /** By false position, which a nearly straight miss ends in a few steps. */
    private long @Nullable [] scaled(long[] style, long[] past, int over) {
        long[] shortest = shortest();
        double low = 0;
        double below = misses(at(low, style, shortest, past, over), past, over, style);
        if (below <= 0) {
            return at(low, style, shortest, past, over);
        }
        double high = 1;
        double above = misses(at(high, style, shortest, past, over), past, over, style);
        while (above > 0) {
            low = high;
            below = above;
            high *= 1.5;
            if (high > MOST) {
                return null;
            }
            above = misses(at(high, style, shortest, past, over), past, over, style);
        }
        double enough = MINUTE / Math.max(MINUTE, beyond(style, shortest, over));
        for (int i = 0; i < MOST_STEPS && high - low > enough; i++) {
            double share = below / (below - above);
            double next = low + (high - low) * Math.min(0.95, Math.max(0.05, i % 3 == 2 ? 0.5 : share + 0.01));
            double miss = misses(at(next, style, shortest, past, over), past, over, style);
            if (miss <= 0) {
                high = next;
                above = miss;
            } else {
                low = next;
                below = miss;
            }
        }
        return at(high, style, shortest, past, over);
    }

    /** How much of a style is more than the shortest, s. */
    private static double beyond(long[] style, long[] shortest, int over) {
        double sum = 0;
        for (int k = over; k < style.length; k++) {
            sum += Math.max(0, style[k] - shortest[k]);
        }
        return sum;
    }

    private long[] at(double share, long[] style, long[] shortest, long[] past, int over) {
        long[] durations = new long[job.size()];
        for (int k = 0; k < durations.length; k++) {
            durations[k] = k < over
                    ? past[2 * k]
                    : job.phase(k).atLeast(shortest[k] + share * Math.max(0, style[k] - shortest[k]));
        }
        return durations;
    }

    /** The worst of what more time helps with. */
    private double misses(long[] durations, long[] past, int over, long[] style) {
        long[] times = times(durations, past, over);
        Estimate.Tangent near = estimate.near(times);
        double worst = Double.NEGATIVE_INFINITY;
        for (int r = 0; r < near.size(); r++) {
            if (!rises(near.slopes(r), over, style)) {
                worst = Math.max(worst, near.miss(r, times));
            }
        }
        return near.size() == 0 ? -1 : worst;
    }

    /** Whether more of what is to come makes a miss worse. */
    private boolean rises(double[] slopes, int over, long[] style) {
        double along = 0;
        for (int k = over; k < job.size(); k++) {
            along += slopes[2 * k] * Math.max(1, style[k] - job.phase(k).shortest());
        }
        return along > 0;
    }

    /** How long a phase may last before what more time harms is missed, those after it as short as can be. */
    private long most(long[] least, long[] past, int over, int k) {
        long longest = job.phase(k).longest();
        if (!estimate.rises()) {
            return longest;
        }
        long[] durations = least.clone();
        for (int j = k + 1; j < durations.length; j++) {
            durations[j] = job.phase(j).shortest();
        }
        Estimate.Tangent near = estimate.near(times(durations, past, over));
        boolean any = false;
        for (int r = 0; r < near.size(); r++) {
            any |= near.slopes(r)[2 * k] > 0;
        }
        if (!any) {
            return longest;
        }
        long low = durations[k];
        long high = Math.min(longest, durations[k] + MOST_WAIT);
        if (harm(durations, past, over, k, high)) {
            while (high - low > 60) {
                long middle = (low + high) / 2;
                if (harm(durations, past, over, k, middle)) {
                    high = middle;
                } else {
                    low = middle;
                }
            }
            long allowed = job.phase(k).lasting().atOrBefore(low);
            return allowed;
        }
        return high;
    }

    /** Nobody waits longer, s. */
    private static final long MOST_WAIT = 7 * 86_400;

    private boolean harm(long[] durations, long[] past, int over, int k, long seconds) {
        long[] longer = durations.clone();
        longer[k] = seconds;
        long[] times = times(longer, past, over);
        Estimate.Tangent near = estimate.near(times);
        for (int r = 0; r < near.size(); r++) {
            if (near.slopes(r)[2 * k] > 0 && near.miss(r, times) > 0) {
                return true;
            }
        }
        return false;
    }

    /** Durations with the gaps that were, and the least ones where they are to come. */
    private long[] times(long[] durations, long[] past, int over) {
        long[] times = new long[2 * durations.length - 1];
        for (int k = 0; k < durations.length; k++) {
            times[2 * k] = durations[k];
            if (k > 0) {
                times[2 * k - 1] = k < over ? past[2 * k - 1] : job.leastGap(k);
            }
        }
        return times;
    }

    /** The styles of a job; its shortest durations where its physics has none. */
    static List<long[]> styles(Job job) {
        List<long[]> styles = job.physics().styles();
        return styles.isEmpty()
                ? List.of(job.phases().stream().mapToLong(Phase::shortest).toArray())
                : styles;
    }
}
