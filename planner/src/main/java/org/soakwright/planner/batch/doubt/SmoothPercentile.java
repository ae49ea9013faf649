package org.soakwright.planner.batch.doubt;

import java.util.Arrays;
import java.util.Comparator;
import java.util.stream.IntStream;
import org.apache.commons.math3.special.Beta;

/**
 * A percentile that answers smoothly to its samples: the mean of ranked values, weighed by how likely each rank is the percentile's (F. E.
 * Harrell and C. E. Davis, A new distribution-free quantile estimator, Biometrika 69 (1982) 635-640). Where two samples change places they are equal, so
 * that value and derivatives fit together.
 */
public final class SmoothPercentile {
    private final double[] byRank;

    /**
     * For so many samples.
     *
     * @param level within 0 and 1
     */
    public SmoothPercentile(int samples, double level) {
        if (samples < 1 || !(level > 0 && level < 1)) {
            throw new IllegalArgumentException("no percentile of " + samples + " samples at " + level);
        }
        byRank = new double[samples];
        double a = (samples + 1) * level;
        double b = (samples + 1) * (1 - level);
        double before = 0;
        for (int i = 0; i < samples; i++) {
            double upTo = i + 1 == samples ? 1 : Beta.regularizedBeta((i + 1.0) / samples, a, b);
            byRank[i] = upTo - before;
            before = upTo;
        }
    }

    /** What each sample counts; sums to 1. */
    public double[] weights(double[] values) {
        if (values.length != byRank.length) {
            throw new IllegalArgumentException(byRank.length + " values wanted, found " + values.length);
        }
        Integer[] order = IntStream.range(0, values.length).boxed().toArray(Integer[]::new);
        Arrays.sort(order, Comparator.comparingDouble(i -> values[i]));
        double[] weights = new double[values.length];
        for (int rank = 0; rank < order.length; rank++) {
            weights[order[rank]] = byRank[rank];
        }
        return weights;
    }

    public double of(double[] values) {
        double[] weights = weights(values);
        double sum = 0;
        for (int i = 0; i < values.length; i++) {
            sum += weights[i] * values[i];
        }
        return sum;
    }
}
