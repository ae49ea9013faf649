package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.recipes.model.Goal;

/**
 * What is to be least: the recipe's goals, first first, and time after them, so that of two equals the shorter wins. All are linear in
 * the durations.
 */
final class Merit {
    /** Relative differences below this are rounding, not preference. */
    private static final double SAME = 1e-11;

    private final Cost cost;
    private final List<Goal> goals;
    private final Grid grid;
    private final double[] weights;

    Merit(Batch batch, Grid grid) {
        this.cost = batch.cost();
        this.grid = grid;
        List<Goal> all = new ArrayList<>(batch.recipe().minimise());
        if (!all.contains(Goal.TIME)) {
            all.add(Goal.TIME);
        }
        goals = List.copyOf(all);
        weights = blend();
    }

    /**
     * One weight a second for each free step, scaled so that the first goal that a free step can change spans one over the grid, each
     * later goal a millionth of the one before.
     */
    private double[] blend() {
        double[] blend = new double[grid.size()];
        double share = 1;
        for (Goal goal : goals) {
            double span = 0;
            for (int a = 0; a < blend.length; a++) {
                span += Math.abs(rate(goal, a)) * (grid.high(a) - grid.low(a));
            }
            if (span > 0) {
                for (int a = 0; a < blend.length; a++) {
                    blend[a] += share * rate(goal, a) / span;
                }
                share *= 1e-6;
            }
        }
        return blend;
    }

    private double rate(Goal goal, int axis) {
        return cost.rate(goal, grid.step(axis));
    }

    Goal first() {
        return goals.get(0);
    }

    /** The blended goals, by second of each free step. */
    double[] weights() {
        return weights;
    }

    double blended(double[] free) {
        double sum = 0;
        for (int a = 0; a < free.length; a++) {
            sum += weights[a] * free[a];
        }
        return sum;
    }

    double first(double[] free) {
        return cost.of(first(), grid.seconds(free));
    }

    /** Below zero when the first is better; zero when neither is. */
    int compare(double[] free, double[] other) {
        double[] a = grid.seconds(free);
        double[] b = grid.seconds(other);
        for (Goal goal : goals) {
            double x = cost.of(goal, a);
            double y = cost.of(goal, b);
            if (Math.abs(x - y) > SAME * Math.max(Math.abs(x), Math.abs(y))) {
                return Double.compare(x, y);
            }
        }
        return 0;
    }
}
