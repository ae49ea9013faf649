package org.soakwright.planner.batch.doubt;

import org.apache.commons.math3.distribution.BetaDistribution;
import org.apache.commons.math3.distribution.TDistribution;

/**
 * A chance found by sampling.
 *
 * @param value share of the samples
 * @param low lower end of the 95 % interval of sampling alone
 * @param high its upper end
 */
public record Chance(double value, double low, double high, int samples) {
    private static final double CONFIDENCE = 0.95;

    /** With fewer samples on either side, the rounds' disagreement tells too little: the interval of independent samples is taken, which is wider. */
    private static final int FEW = 30;

    public Chance {
        if (!(0 <= low && low <= value && value <= high && high <= 1) || samples < 1) {
            throw new IllegalArgumentException("no chance: " + low + " <= " + value + " <= " + high);
        }
    }

    /**
     * Of samples that passed or not.
     *
     * @param passes by sample, rounds one after the other
     */
    public static Chance of(boolean[] passes, int rounds) {
        int n = passes.length;
        int perRound = n / rounds;
        int passed = 0;
        double[] byRound = new double[rounds];
        for (int i = 0; i < n; i++) {
            if (passes[i]) {
                passed++;
                byRound[i / perRound] += 1.0 / perRound;
            }
        }
        double value = (double) passed / n;
        if (rounds == 1 || Math.min(passed, n - passed) < FEW) {
            return new Chance(value, exactLow(passed, n), 1 - exactLow(n - passed, n), n);
        }
        double t = new TDistribution(null, rounds - 1).inverseCumulativeProbability((1 + CONFIDENCE) / 2);
        double half = t * standardError(byRound);
        return new Chance(value, Math.max(0, value - half), Math.min(1, value + half), n);
    }

    /** Lower end for independent samples (Clopper and Pearson). */
    private static double exactLow(int passed, int n) {
        return passed == 0
                ? 0
                : Math.min(
                        (double) passed / n,
                        new BetaDistribution(null, passed, n - passed + 1.0)
                                .inverseCumulativeProbability((1 - CONFIDENCE) / 2));
    }

    /** Of the mean of rounds. */
    static double standardError(double[] byRound) {
        double mean = 0;
        for (double one : byRound) {
            mean += one / byRound.length;
        }
        double square = 0;
        for (double one : byRound) {
            square += (one - mean) * (one - mean);
        }
        return Math.sqrt(square / (byRound.length * (byRound.length - 1.0)));
    }
}
