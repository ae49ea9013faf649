package org.soakwright.planner.bench;

import org.soakwright.planner.bench.FiveSoaks.Answer;

/** Crank-Nicolson extrapolated (Richardson): two marches, the second with twice the cells and twice the steps. */
final class Rival {
    private final March coarse;
    private final March fine;

    Rival(Effort effort) {
        coarse = new March(effort);
        fine = new March(effort.doubled());
    }

    Answer answer(double[] seconds) {
        double value = (4 * fine.follow(seconds) - coarse.follow(seconds)) / 3;
        double[] gradient = new double[seconds.length];
        coarse.addGradient(-1.0 / 3, gradient);
        fine.addGradient(4.0 / 3, gradient);
        return new Answer(value, gradient);
    }

    /** Fails unless the reverse sweep agrees with central differences of the marched value. */
    void checkGradient(double[] seconds) {
        double[] gradient = answer(seconds).gradient();
        for (int k = 0; k < seconds.length; k++) {
            double step = 1e-4 * seconds[k];
            double[] moved = seconds.clone();
            moved[k] = seconds[k] + step;
            double above = answer(moved).value();
            moved[k] = seconds[k] - step;
            double slope = (above - answer(moved).value()) / (2 * step);
            if (!(Math.abs(gradient[k] - slope) <= 1e-6 * Math.abs(slope))) {
                throw new IllegalStateException(
                        "derivative by soak " + k + " is " + gradient[k] + ", differences say " + slope);
            }
        }
    }
}
