package org.soakwright.planner.batch;

/** A part of the grid: for each free step, from one choice to another. */
record Box(Grid grid, int[] first, int[] last) {
    static Box whole(Grid grid) {
        int[] first = new int[grid.size()];
        int[] last = new int[grid.size()];
        for (int a = 0; a < last.length; a++) {
            last[a] = grid.choices(a) - 1;
        }
        return new Box(grid, first, last);
    }

    int size() {
        return first.length;
    }

    double low(int axis) {
        return grid.value(axis, first[axis]);
    }

    double high(int axis) {
        return grid.value(axis, last[axis]);
    }

    double range(int axis) {
        return high(axis) - low(axis);
    }

    /** The last choice that is not longer, within the box. */
    int below(int axis, double seconds) {
        return Math.min(last[axis], Math.max(first[axis], grid.below(axis, seconds)));
    }

    /** Durations at shares of the ranges. */
    double[] at(double[] shares) {
        double[] free = new double[shares.length];
        for (int a = 0; a < free.length; a++) {
            free[a] = low(a) + shares[a] * range(a);
        }
        return free;
    }

    /** Shares of the ranges, of durations brought into the box. */
    double[] shares(double[] free) {
        double[] shares = new double[free.length];
        for (int a = 0; a < shares.length; a++) {
            double inside = Math.min(high(a), Math.max(low(a), free[a]));
            shares[a] = range(a) > 0 ? (inside - low(a)) / range(a) : 0;
        }
        return shares;
    }

    Box upTo(int axis, int choice) {
        int[] changed = last.clone();
        changed[axis] = choice;
        return new Box(grid, first, changed);
    }

    Box from(int axis, int choice) {
        int[] changed = first.clone();
        changed[axis] = choice;
        return new Box(grid, changed, last);
    }
}
