package org.soakwright.planner.line.shop;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;

/**
 * Solute that leaves quickly from one part of a piece and slowly from another, at rates that differ by phase: what is left is a sum of exponentials
 * of what the phases last, and its logarithm must be below a limit.
 */
final class Washing implements Physics {
    private static final double[] SHARES = {0.4, 0.6};

    private final double[][] rates;
    private final double limit;
    private final List<long[]> styles;

    private Washing(double[][] rates, double limit, List<long[]> styles) {
        this.rates = rates;
        this.limit = limit;
        this.styles = styles;
    }

    /** One that durations of some steps meet just so. */
    static Washing drawn(SplittableRandom random, List<Phase> phases) {
        int n = phases.size();
        double[][] rates = new double[SHARES.length][n];
        for (double[] row : rates) {
            for (int k = 0; k < n; k++) {
                row[k] = (0.05 + 0.3 * random.nextDouble()) / TinyShop.STEP;
            }
        }
        long[] planned = new long[2 * n - 1];
        for (int k = 0; k < n; k++) {
            planned[2 * k] = phases.get(k).shortest() + TinyShop.STEP * (1 + random.nextInt(3));
        }
        double limit = new Washing(rates, 0, List.of()).left(planned);
        List<long[]> styles = new ArrayList<>();
        styles.add(beyond(phases, planned, -1));
        for (int k = 0; k < n; k++) {
            styles.add(beyond(phases, planned, k));
        }
        return new Washing(rates, limit, styles);
    }

    /** All phases as planned, or only one longer than its shortest: directions to share the work in. */
    private static long[] beyond(List<Phase> phases, long[] planned, int only) {
        long[] style = new long[phases.size()];
        for (int k = 0; k < style.length; k++) {
            style[k] = only < 0
                    ? planned[2 * k]
                    : only == k
                            ? phases.get(k).shortest() + 4 * TinyShop.STEP
                            : phases.get(k).shortest();
        }
        return style;
    }

    /** The logarithm of what is left. */
    private double left(long[] times) {
        double sum = 0;
        for (int i = 0; i < SHARES.length; i++) {
            sum += part(i, times);
        }
        return Math.log(sum);
    }

    private double part(int i, long[] times) {
        double exponent = 0;
        for (int k = 0; k < rates[i].length; k++) {
            exponent += rates[i][k] * times[2 * k];
        }
        return SHARES[i] * Math.exp(-exponent);
    }

    @Override
    public Reading read(long[] times) {
        double[] slopes = new double[times.length];
        double sum = 0;
        for (int i = 0; i < SHARES.length; i++) {
            double part = part(i, times);
            sum += part;
            for (int k = 0; k < rates[i].length; k++) {
                slopes[2 * k] -= rates[i][k] * part;
            }
        }
        for (int i = 0; i < slopes.length; i++) {
            slopes[i] /= sum;
        }
        return new Reading(new double[] {Math.log(sum) - limit}, new double[][] {slopes});
    }

    @Override
    public List<long[]> styles() {
        return styles;
    }
}
