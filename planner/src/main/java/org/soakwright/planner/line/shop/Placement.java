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

    private final IdentityHashMap<Physics, Estimate> estimates = new IdentityHashMap<>();
    private long placings;

    /** A job placed, and whether what was asked of it holds. */
    record Outcome(Placed placed, boolean met, int style) {}

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
        List<long[]> styles = Outlook.styles(job);
        Outcome best = null;
        for (int s = 0; s < styles.size(); s++) {
            if (only < 0 || s == only) {
                Placed placed = exactly(floor, job, styles.get(s));
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
        Placed placed = new Insertion(floor, job, List.of(), style, most).place(job.ready());
        return placed == null ? null : new Outcome(placed, isMet(placed), 0);
    }

    /** In a style that is not of its own: durations that somebody proposes; null where it does not lead anywhere. */
    @Nullable
    Outcome like(Floor floor, Job job, long[] style) {
        Placed placed = exactly(floor, job, style);
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

    private @Nullable Placed exactly(Floor floor, Job job, long[] style) {
        Estimate estimate = estimate(job);
        for (int repair = 0; repair < MOST_REPAIRS; repair++) {
            Placed placed = estimated(floor, job, style, estimate);
            if (placed == null || estimate.exactly(placed.times()).met()) {
                return placed;
            }
        }
        return null;
    }

    private @Nullable Placed estimated(Floor floor, Job job, long[] style, Estimate estimate) {
        Outlook outlook = new Outlook(job, estimate);
        List<Placed.Visit> done = List.of();
        long[] past = new long[2 * job.size() - 1];
        Placed placed = null;
        while (true) {
            Outlook.Bounds bounds = outlook.after(style, past, done.size());
            if (bounds == null) {
                return placed;
            }
            placings++;
            Placed next = new Insertion(floor, job, done, bounds.least(), bounds.most()).place(job.ready());
            if (next == null) {
                return placed;
            }
            placed = next;
            int stretched = stretched(placed, bounds.least(), done.size());
            if (stretched >= job.size() - 1) {
                return placed;
            }
            done = new ArrayList<>(placed.visits().subList(0, stretched + 1));
            past = placed.times();
        }
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
