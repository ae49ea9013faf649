package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.PriorityQueue;
import org.jspecify.annotations.Nullable;

/**
 * Branch and bound over the grid: a descent in a part of it bounds what that part can give; a part that could still beat what is known is
 * split beside where the descent ended. Complete as far as the descents find the least in their part; where tangents bound it
 * (`proven`), a part is only left when they do.
 */
final class Branching {
    private static final int MOST_PARTS = 1500;
    private static final int MOST_CORNER_AXES = 6;

    private final Grid grid;
    private final Landscape landscape;
    private final Merit merit;
    private final Linear goal;
    private final List<Linear.Cap> caps;
    private final boolean proven;
    private final double gain;
    private @Nullable Found best;

    /**
     * Prepares a search.
     *
     * @param goal what is to be least
     * @param caps what must not be exceeded on the way
     * @param proven whether tangents bound the requirements everywhere
     */
    Branching(
            Grid grid,
            Landscape landscape,
            Merit merit,
            Linear goal,
            List<Linear.Cap> caps,
            boolean proven,
            @Nullable Found known) {
        this.grid = grid;
        this.landscape = landscape;
        this.merit = merit;
        this.goal = goal;
        this.caps = caps;
        this.proven = proven;
        gain = Math.max(1e-9, 0.999 * smallestGain());
        best = known;
    }

    /**
     * What came of it.
     *
     * @param best the best point of the grid that was found; empty where none meets the targets
     * @param complete whether every part was gone into or left for a reason
     */
    record Outcome(Optional<Found> best, boolean complete) {}

    private record Part(Box box, double[] free, double cost) {}

    /** From the whole grid, whose relaxed optimum is known. */
    Outcome from(Descent.End relaxed, double[] inside) {
        startWith(relaxed.free(), inside);
        PriorityQueue<Part> parts = new PriorityQueue<>(Comparator.comparingDouble(Part::cost));
        parts.add(new Part(Box.whole(grid), relaxed.free(), goal.of(relaxed.free())));
        for (int looked = 0; !parts.isEmpty(); looked++) {
            Part part = parts.remove();
            if (part.cost > ceiling()) {
                return new Outcome(Optional.ofNullable(best), true);
            }
            if (looked >= MOST_PARTS) {
                return new Outcome(Optional.ofNullable(best), false);
            }
            for (Box half : halves(part)) {
                enter(half, part.free).ifPresent(parts::add);
            }
        }
        return new Outcome(Optional.ofNullable(best), true);
    }

    /** What something better may cost at most. */
    private double ceiling() {
        return best == null ? Double.POSITIVE_INFINITY : goal.of(best.free()) - gain;
    }

    /** A first point of the grid: around the relaxed optimum, then from there towards where there is most room. */
    private void startWith(double[] relaxed, double[] inside) {
        Box whole = Box.whole(grid);
        for (double share = 0; best == null && share <= 1; share = share == 0 ? 1.0 / 64 : 2 * share) {
            double[] at = relaxed.clone();
            for (int a = 0; a < at.length; a++) {
                at[a] += share * (inside[a] - relaxed[a]);
            }
            corners(whole, at);
        }
    }

    /** Bounds a part; empty where nothing in it can be better. */
    private Optional<Part> enter(Box box, double[] near) {
        if (single(box)) {
            take(grid.values(box.first()));
            return Optional.empty();
        }
        List<Linear.Cap> limits = new ArrayList<>(caps);
        if (best != null) {
            limits.add(new Linear.Cap(goal, ceiling()));
        }
        Descent.End end = Descent.toLeast(goal, box, landscape, limits).from(near);
        if (end.met()) {
            corners(box, end.free());
            return Optional.of(new Part(box, end.free(), goal.of(end.free())));
        }
        if (proven) {
            Run run = landscape.run(end.free());
            double bound = Convexity.bound(
                    box, goal, end.free(), landscape.misses(run), landscape.gradients(run), end.multipliers());
            double dearest = best == null ? goal.of(grid.highest()) : ceiling();
            return bound > dearest
                    ? Optional.empty()
                    : Optional.of(new Part(box, end.free(), Math.min(bound, goal.of(end.free()))));
        }
        return Optional.empty();
    }

    private boolean single(Box box) {
        for (int a = 0; a < box.size(); a++) {
            if (box.first()[a] != box.last()[a]) {
                return false;
            }
        }
        return true;
    }

    /** Split beside the place, along the step whose duration lies farthest from the grid, else along the longest side. */
    private List<Box> halves(Part part) {
        Box box = part.box;
        int axis = -1;
        double farthest = 1e-6;
        for (int a = 0; a < box.size(); a++) {
            int below = box.below(a, part.free[a]);
            if (below < box.last()[a]) {
                double gap = grid.value(a, below + 1) - grid.value(a, below);
                double off = (part.free[a] - grid.value(a, below)) / gap;
                double distance = Math.min(off, 1 - off);
                if (distance > farthest) {
                    farthest = distance;
                    axis = a;
                }
            }
        }
        if (axis < 0) {
            for (int a = 0; a < box.size(); a++) {
                if (axis < 0 || box.last()[a] - box.first()[a] > box.last()[axis] - box.first()[axis]) {
                    axis = a;
                }
            }
        }
        if (box.first()[axis] == box.last()[axis]) {
            return List.of();
        }
        int split = Math.min(box.below(axis, part.free[axis]), box.last()[axis] - 1);
        return List.of(box.upTo(axis, split), box.from(axis, split + 1));
    }

    /** The grid points around a place, of those that cost less than what is known; with many free steps only the nearest few. */
    private void corners(Box box, double[] at) {
        int size = box.size();
        int[] below = new int[size];
        for (int a = 0; a < size; a++) {
            below[a] = box.below(a, at[a]);
        }
        int combinations = size <= MOST_CORNER_AXES ? 1 << size : 2;
        List<double[]> points = new ArrayList<>();
        for (int bits = 0; bits < combinations; bits++) {
            int[] choice = below.clone();
            for (int a = 0; a < size; a++) {
                boolean up = size <= MOST_CORNER_AXES ? (bits >> a & 1) == 1 : bits == 1;
                choice[a] = Math.min(box.last()[a], below[a] + (up ? 1 : 0));
            }
            points.add(grid.values(choice));
        }
        points.sort(merit::compare);
        points.forEach(this::take);
    }

    private void take(double[] free) {
        boolean cheaper = best == null || goal.of(free) < goal.of(best.free()) - Merit.SAME;
        boolean equal = best != null && !cheaper && goal.of(free) <= goal.of(best.free()) + Merit.SAME;
        if (!cheaper && !equal) {
            return;
        }
        for (Linear.Cap cap : caps) {
            if (cap.sum().of(free) > cap.limit() + Merit.SAME) {
                return;
            }
        }
        Found found = Found.of(landscape, free);
        boolean roomier = best != null && found.miss() < best.miss();
        if (found.met() && (cheaper || roomier)) {
            best = found;
        }
    }

    /** The least by which one grid point can be better than another; zero where the weights differ. */
    private double smallestGain() {
        double weight = goal.weights()[0];
        long grain = 0;
        for (int a = 0; a < grid.size(); a++) {
            if (goal.weights()[a] != weight) {
                return 0;
            }
            for (long gap : grid.gapsInMicroseconds(a)) {
                grain = divisor(grain, gap);
            }
        }
        return weight * grain * 1e-6;
    }

    private static long divisor(long a, long b) {
        return b == 0 ? a : divisor(b, a % b);
    }
}
