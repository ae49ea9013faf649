package org.soakwright.planner.line.shop;

import java.util.ArrayList;
import java.util.IdentityHashMap;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * Puts a job on a floor so that it is out as early as can be and its times hold when followed exactly. In each style: placed with the least
 * durations; a phase that had to be stretched is then over, and what follows it is shortened by as much as that was worth and placed again.
 */
final class Placement {
    /** Stretched by no more than this, nothing after it is worth changing, s. */
    private static final long HARDLY = 120;

    private static final int MOST_REPAIRS = 12;

    /** Instead of the number of a style: durations that are none of the job's own. */
    private static final int FOREIGN = -1;

    private final IdentityHashMap<Physics, Estimate> estimates = new IdentityHashMap<>();
    private final IdentityHashMap<Job, Known> known = new IdentityHashMap<>();
    private long placings;

    /**
     * What a placement is not to do, so that others have room.
     *
     * @param notBefore s; its first move begins no earlier
     * @param without a station that it does without where it can; -1 for none
     */
    record Whim(long notBefore, int without) {
        static final Whim NONE = new Whim(-Moments.NEVER, -1);
    }

    /** A job placed, and whether what was asked of it holds. */
    record Outcome(Placed placed, boolean met, int style) {}

    /** Bounds of a style of which nothing is over yet, worked out with so many tangents; they are asked for again and again. */
    private record Fresh(int tangents, Outlook.@Nullable Bounds bounds) {}

    /** What does not depend on the floor. */
    private record Known(List<long[]> styles, @Nullable Fresh[] fresh) {
        static Known of(Job job) {
            List<long[]> styles = Outlook.styles(job);
            return new Known(styles, new Fresh[styles.size()]);
        }
    }

    /** How often a job has been placed. */
    long placings() {
        return placings;
    }

    /**
     * The earliest completion over its styles.
     *
     * @param only a style to take; -1 for the best of all
     * @return null where it cannot be placed even if its physics were no matter
     */
    @Nullable
    Outcome place(Floor floor, Job job, int only) {
        return place(floor, job, only, Whim.NONE);
    }

    /** The same with a whim, which nothing is kept from the floor for. */
    @Nullable
    Outcome place(Floor floor, Job job, int only, Whim whim) {
        List<long[]> styles = known(job).styles();
        Outcome best = null;
        for (int s = 0; s < styles.size(); s++) {
            if (only < 0 || s == only) {
                Placed placed = exactly(floor, job, s, styles.get(s), whim);
                if (placed != null && (best == null || isEarlier(floor, placed, best.placed()))) {
                    best = new Outcome(placed, true, s);
                }
            }
        }
        if (best != null) {
            return best;
        }
        if (only >= 0) {
            return place(floor, job, -1);
        }
        placings++;
        long[] style = styles.get(0);
        long[] most = job.phases().stream().mapToLong(Phase::longest).toArray();
        Placed placed = new Insertion(floor, job, List.of(), style, most).place(-Moments.NEVER);
        return placed == null ? null : new Outcome(placed, isMet(placed), 0);
    }

    /** In a style that is not of its own: durations that somebody proposes; null where it does not lead anywhere. */
    @Nullable
    Outcome like(Floor floor, Job job, long[] style) {
        Placed placed = exactly(floor, job, FOREIGN, style, Whim.NONE);
        return placed == null ? null : new Outcome(placed, true, 0);
    }

    private static boolean isEarlier(Floor floor, Placed one, Placed other) {
        Carriage carriage = floor.shop().carriage();
        long difference = one.finishes(carriage) - other.finishes(carriage);
        return difference < 0 || (difference == 0 && one.begins(carriage) > other.begins(carriage));
    }

    /** Whether what was asked of a job holds, followed exactly. */
    boolean isMet(Placed placed) {
        return estimate(placed.job()).exactly(placed.times()).met();
    }

    List<Followed> followed(Physics physics) {
        Estimate estimate = estimates.get(physics);
        return estimate == null ? List.of() : estimate.followed();
    }

    private Estimate estimate(Job job) {
        return estimates.computeIfAbsent(job.physics(), Estimate::new);
    }

    private @Nullable Placed exactly(Floor floor, Job job, int style, long[] durations, Whim whim) {
        Estimate estimate = estimate(job);
        for (int repair = 0; repair < MOST_REPAIRS; repair++) {
            Placed placed = estimated(floor, job, style, durations, estimate, whim);
            if (placed == null || estimate.exactly(placed.times()).met()) {
                return placed;
            }
        }
        return null;
    }

    private @Nullable Placed estimated(
            Floor floor, Job job, int style, long[] durations, Estimate estimate, Whim whim) {
        Outlook outlook = new Outlook(job, estimate);
        List<Placed.Visit> done = List.of();
        long[] past = new long[2 * job.size() - 1];
        Placed placed = null;
        Outlook.Bounds before = null;
        while (true) {
            Outlook.Bounds bounds = done.isEmpty() && style != FOREIGN
                    ? fresh(job, style, outlook, estimate)
                    : outlook.after(durations, past, done.size());
            if (bounds == null) {
                return placed;
            }
            // With the same bounds as before, what is to come would be placed where it is.
            if (placed == null || before == null || !bounds.equalFrom(done.size(), before)) {
                placings++;
                Placed next = new Insertion(floor, job, done, bounds.least(), bounds.most())
                        .without(whim.without())
                        .place(whim.notBefore());
                if (next == null) {
                    return placed;
                }
                placed = next;
            }
            before = bounds;
            int stretched = stretched(placed, bounds.least(), done.size());
            if (stretched >= job.size() - 1) {
                return placed;
            }
            done = new ArrayList<>(placed.visits().subList(0, stretched + 1));
            past = placed.times();
        }
    }

    private Outlook.@Nullable Bounds fresh(Job job, int style, Outlook outlook, Estimate estimate) {
        Known known = known(job);
        Fresh fresh = known.fresh()[style];
        if (fresh == null || fresh.tangents() != estimate.tangents()) {
            Outlook.Bounds bounds = outlook.after(known.styles().get(style), new long[2 * job.size() - 1], 0);
            fresh = new Fresh(estimate.tangents(), bounds);
            known.fresh()[style] = fresh;
        }
        return fresh.bounds();
    }

    private Known known(Job job) {
        return known.computeIfAbsent(job, Known::of);
    }

    /** The first phase not over yet that lasts longer than it must, or is longer in the air before the next. */
    private static int stretched(Placed placed, long[] least, int over) {
        int k = over;
        while (k < least.length && placed.visit(k).seconds() <= least[k] + HARDLY) {
            k++;
        }
        return k;
    }
}
