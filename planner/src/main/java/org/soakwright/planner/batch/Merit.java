package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.recipes.model.Goal;

/**
 * What is to be least: the recipe's goals, first first, and time after them, so that of two equals the shorter wins. All are linear in
 * the durations; each is measured in its span over the grid.
 */
final class Merit {
    /** Differences below this, as shares of a goal's span, are rounding, not preference. */
    static final double SAME = 1e-11;

    private final List<Goal> goals = new ArrayList<>();
    private final List<Linear> sums = new ArrayList<>();
    private final List<Double> spans = new ArrayList<>();
    private final Goal first;

    Merit(Batch batch, Grid grid) {
        List<Goal> all = new ArrayList<>(batch.recipe().minimise());
        if (!all.contains(Goal.TIME)) {
            all.add(Goal.TIME);
        }
        first = all.get(0);
        for (Goal goal : all) {
            double[] weights = new double[grid.size()];
            double span = 0;
            for (int a = 0; a < weights.length; a++) {
                weights[a] = batch.cost().rate(goal, grid.step(a));
                span += weights[a] * (grid.high(a) - grid.low(a));
            }
            if (span > 0) {
                for (int a = 0; a < weights.length; a++) {
                    weights[a] /= span;
                }
                goals.add(goal);
                sums.add(new Linear(weights));
                spans.add(span);
            }
        }
    }

    /** The goal that matters most, whether or not a free step can change it. */
    Goal first() {
        return first;
    }

    /** How many goals the free steps can change. */
    int size() {
        return goals.size();
    }

    Goal goal(int index) {
        return goals.get(index);
    }

    /** A goal as a share of its span. */
    Linear sum(int index) {
        return sums.get(index);
    }

    /** What one share of a goal's span is in seconds, m3 or money. */
    double span(int index) {
        return spans.get(index);
    }

    /** Whether two durations that agree in the first goals, so many, can still differ. */
    boolean undecidedAfter(int count) {
        if (goals.isEmpty()) {
            return false;
        }
        double[] any = sums.get(0).weights();
        for (int a = 0; a < any.length; a++) {
            boolean weighed = false;
            for (int g = 0; g < count; g++) {
                weighed |= sums.get(g).weights()[a] > 0;
            }
            if (!weighed) {
                return true;
            }
        }
        return false;
    }

    /** Below zero when the first is better; zero when neither is. Rounded to a lattice, so that the order is transitive. */
    int compare(double[] free, double[] other) {
        for (Linear sum : sums) {
            long a = Math.round(sum.of(free) / SAME);
            long b = Math.round(sum.of(other) / SAME);
            if (a != b) {
                return Long.compare(a, b);
            }
        }
        return 0;
    }
}
