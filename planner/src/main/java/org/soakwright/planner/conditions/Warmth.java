package org.soakwright.planner.conditions;

import java.util.List;
import org.soakwright.solver.shape.Side;

/**
 * How much of a difference in temperature a piece still has on average, its surface held at the new temperature. Sides
 * multiply. Terms of a side's series are added until they are below {@link #ROUNDING}; before {@link #EARLY} the law of the root
 * stands in for them, to 1e-6.
 *
 * @param thermalDiffusivity m2/s; above 0
 */
record Warmth(List<Side> sides, double thermalDiffusivity) {
    private static final double ROUNDING = 1e-12;
    private static final double EARLY = 1e-4;

    Warmth {
        sides = List.copyOf(sides);
    }

    /** The share of the difference left after so many seconds: 1 at first, then falling. */
    double left(double seconds) {
        double left = 1;
        for (Side side : sides) {
            left *= left(side, thermalDiffusivity * seconds / (side.length() * side.length()));
        }
        return left;
    }

    /** When the slowest of what is left has fallen to {@link #ROUNDING}, s. */
    double over() {
        double rate = 0;
        for (Side side : sides) {
            double root = side.axis().waveZero(1) / side.length();
            rate += root * root * thermalDiffusivity;
        }
        return -Math.log(ROUNDING) / rate;
    }

    private static double left(Side side, double fourier) {
        int power = side.axis().power();
        if (fourier < EARLY) {
            double depth = 2 * Math.sqrt(fourier / Math.PI);
            return 1 - (power + 1) * (depth - power * fourier / 2);
        }
        double sum = 0;
        for (int n = 1; ; n++) {
            double root = side.axis().waveZero(n);
            double term = 2 * (power + 1) / (root * root) * Math.exp(-root * root * fourier);
            sum += term;
            if (term < ROUNDING) {
                return sum;
            }
        }
    }
}
