package org.soakwright.planner.batch;

/** A sum of weights times the free durations; per second of each free step. */
record Linear(double[] weights) {
    double of(double[] free) {
        double sum = 0;
        for (int a = 0; a < free.length; a++) {
            sum += weights[a] * free[a];
        }
        return sum;
    }

    /** A sum that must not exceed a limit. */
    record Cap(Linear sum, double limit) {}
}
