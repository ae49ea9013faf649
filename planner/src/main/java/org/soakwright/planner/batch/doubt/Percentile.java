package org.soakwright.planner.batch.doubt;

import java.util.Arrays;

/**
 * What a share of the samples reads at most.
 *
 * @param level the share, within 0 and 1
 * @param error standard error of sampling alone; NaN where there was one round
 */
public record Percentile(double level, double value, double error) {
    /** By sample, rounds one after the other. Infinite values count where they lie. */
    public static Percentile of(double[] values, int rounds, double level) {
        double[] sorted = values.clone();
        Arrays.sort(sorted);
        double value = ofSorted(sorted, level);
        if (rounds == 1) {
            return new Percentile(level, value, Double.NaN);
        }
        int perRound = values.length / rounds;
        double[] byRound = new double[rounds];
        for (int r = 0; r < rounds; r++) {
            double[] own = Arrays.copyOfRange(values, r * perRound, (r + 1) * perRound);
            Arrays.sort(own);
            byRound[r] = ofSorted(own, level);
        }
        return new Percentile(level, value, Chance.standardError(byRound));
    }

    /** Hazen's: each value stands for the middle of its own share, straight lines in between. */
    static double ofSorted(double[] sorted, double level) {
        int n = sorted.length;
        double place = Math.min(n - 1.0, Math.max(0, level * n - 0.5));
        int below = (int) place;
        double part = place - below;
        if (part == 0 || sorted[below] == sorted[below + 1]) {
            return sorted[below];
        }
        return sorted[below] + part * (sorted[below + 1] - sorted[below]);
    }
}
