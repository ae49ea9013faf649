package org.soakwright.planner.conditions;

import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.soakwright.solver.shape.Axis;
import org.soakwright.solver.shape.Side;

/**
 * How much of a difference in temperature a piece still has on average, its surface held at the new temperature. Sides
 * multiply. Terms of a side's series are added until they are below {@link #ROUNDING}; before {@link #EARLY} the law of the root
 * stands in for them, to 1e-6.
 *
 * @param thermalDiffusivity m2/s; above 0
 */
public record Warmth(List<Side> sides, double thermalDiffusivity) {
    private static final double ROUNDING = 1e-12;
    private static final double EARLY = 1e-4;

    /** Terms needed at {@link #EARLY}: pi^2 n^2 1e-4 reaches the logarithm of {@link #ROUNDING} before n = 168. */
    private static final int MOST_TERMS = 170;

    /** The frequencies of each axis, found once. */
    private static final class Roots {
        static final Map<Axis, double[]> OF = Arrays.stream(Axis.values())
                .collect(Collectors.toUnmodifiableMap(
                        axis -> axis,
                        axis -> IntStream.rangeClosed(1, MOST_TERMS)
                                .mapToDouble(axis::waveZero)
                                .toArray()));
    }

    public Warmth {
        sides = List.copyOf(sides);
    }

    /** The share of the difference left after so many seconds: 1 at first, then falling. */
    public double left(double seconds) {
        double left = 1;
        for (Side side : sides) {
            left *= left(side, thermalDiffusivity * seconds / (side.length() * side.length()));
        }
        return left;
    }

    /** When the slowest of what is left has fallen to {@link #ROUNDING}, s. */
    public double over() {
        double rate = 0;
        for (Side side : sides) {
            double root = side.axis().waveZero(1) / side.length();
            rate += root * root * thermalDiffusivity;
        }
        return -Math.log(ROUNDING) / rate;
    }

    /** The gradient at the surface over the difference, averaged over the surface, 1/m: what the mean loses passes there. */
    double gradient(double seconds) {
        double surfacePerVolume = 0;
        double loss = 0;
        double whole = left(seconds);
        for (Side side : sides) {
            double perSecond = thermalDiffusivity / (side.length() * side.length());
            surfacePerVolume += (side.axis().power() + 1) / side.length();
            loss += whole / left(side, perSecond * seconds) * perSecond * loss(side, perSecond * seconds);
        }
        return loss / (thermalDiffusivity * surfacePerVolume);
    }

    /** Minus the derivative of {@link #left(Side, double)} by the Fourier number. */
    private static double loss(Side side, double fourier) {
        int power = side.axis().power();
        if (fourier < EARLY) {
            return (power + 1) * (1 / Math.sqrt(Math.PI * fourier) - power / 2.0);
        }
        double sum = 0;
        for (double root : Objects.requireNonNull(Roots.OF.get(side.axis()))) {
            double term = 2 * (power + 1) * Math.exp(-root * root * fourier);
            sum += term;
            if (term < ROUNDING) {
                break;
            }
        }
        return sum;
    }

    /** When no more than a share of the difference is left, s; by bisection to a thousandth. */
    public double within(double share) {
        double low = 0;
        double high = over();
        while (high - low > 1e-3 * high) {
            double middle = (low + high) / 2;
            if (left(middle) > share) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return high;
    }

    private static double left(Side side, double fourier) {
        int power = side.axis().power();
        if (fourier < EARLY) {
            double depth = 2 * Math.sqrt(fourier / Math.PI);
            return 1 - (power + 1) * (depth - power * fourier / 2);
        }
        double sum = 0;
        for (double root : Objects.requireNonNull(Roots.OF.get(side.axis()))) {
            double term = 2 * (power + 1) / (root * root) * Math.exp(-root * root * fourier);
            sum += term;
            if (term < ROUNDING) {
                break;
            }
        }
        return sum;
    }
}
