package org.soakwright.planner.batch;

import java.util.List;

/** The recipe as a function of its free durations: how far each requirement is missed, and how that changes. */
final class Landscape {
    private final Batch batch;
    private final Grid grid;
    private final List<Requirement> requirements;

    Landscape(Batch batch, Grid grid) {
        this.batch = batch;
        this.grid = grid;
        requirements = batch.requirements();
    }

    int requirements() {
        return requirements.size();
    }

    Run run(double[] free) {
        return batch.follow(grid.seconds(free));
    }

    double[] misses(Run run) {
        double[] misses = new double[requirements.size()];
        for (int i = 0; i < misses.length; i++) {
            misses[i] = run.miss(requirements.get(i));
        }
        return misses;
    }

    /** By requirement, then by free step; per second. */
    double[][] gradients(Run run) {
        double[][] gradients = new double[requirements.size()][grid.size()];
        for (int i = 0; i < gradients.length; i++) {
            double[] all = run.missGradient(requirements.get(i));
            for (int a = 0; a < grid.size(); a++) {
                gradients[i][a] = all[grid.step(a)];
            }
        }
        return gradients;
    }

    /** The largest miss; with no requirements, nothing is missed. */
    double worst(double[] free) {
        return largest(misses(run(free)));
    }

    static double largest(double[] misses) {
        double worst = Double.NEGATIVE_INFINITY;
        for (double miss : misses) {
            worst = Math.max(worst, miss);
        }
        return misses.length == 0 ? -1 : worst;
    }
}
