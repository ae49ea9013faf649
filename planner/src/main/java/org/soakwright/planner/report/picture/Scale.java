package org.soakwright.planner.report.picture;

import java.util.ArrayList;
import java.util.List;

/** Where a value lies on an axis, as a share of its length, and where the axis is marked. Values beyond its ends lie at its ends. */
interface Scale {
    /** A marked value; the label may be empty. */
    record Tick(double value, String label) {}

    double at(double value);

    List<Tick> ticks();

    /** From one value to another, marked at round ones. */
    static Scale linear(double from, double to, int mostTicks) {
        double step = Rounds.step(to - from, mostTicks);
        List<Tick> ticks = new ArrayList<>();
        for (long i = (long) Math.ceil(from / step - 1e-9); i * step <= to + 1e-9 * step; i++) {
            ticks.add(new Tick(i * step, Words.plain(i * step, step)));
        }
        return new Placed(ticks, value -> (value - from) / (to - from));
    }

    /** From zero to a value that is marked itself, whether it is round or not. */
    static Scale full(double to, int mostTicks) {
        List<Tick> ticks = new ArrayList<>(linear(0, to, mostTicks).ticks());
        ticks.removeIf(tick -> tick.value() > to - 0.09 * to);
        ticks.add(new Tick(
                to,
                Words.written(new java.math.BigDecimal(to)
                        .round(new java.math.MathContext(4))
                        .doubleValue())));
        return new Placed(ticks, value -> value / to);
    }

    /** From zero, or from near the least where that is far from zero, to a round value that is not below the most. */
    static Scale holding(double least, double most, int mostTicks) {
        double top = most > 0 ? most : 1;
        double step = Rounds.step(least > top / 2 ? top - least : top, mostTicks);
        double from = least > top / 2 ? step * Math.floor(least / step + 1e-9) : 0;
        double to = step * Math.ceil(top / step - 1e-9);
        return linear(Math.min(from, to - step), to, mostTicks);
    }

    /** By orders of magnitude between two values above zero. */
    static Scale logarithmic(double least, double most) {
        int from = (int) Math.floor(Math.log10(least) + 1e-9);
        int to = (int) Math.ceil(Math.log10(most) - 1e-9);
        List<Tick> ticks = new ArrayList<>();
        for (int i = from; i <= to; i++) {
            ticks.add(new Tick(Math.pow(10, i), Words.plain(Math.pow(10, i), Math.pow(10, i))));
        }
        return new Placed(ticks, value -> value <= 0 ? 0 : (Math.log10(value) - from) / Math.max(1, to - from));
    }

    /** The other way round. */
    default Scale reversed() {
        return new Placed(ticks(), value -> 1 - at(value));
    }

    /** A scale by a function to shares. */
    record Placed(List<Tick> ticks, java.util.function.DoubleUnaryOperator share) implements Scale {
        public Placed {
            ticks = List.copyOf(ticks);
        }

        @Override
        public double at(double value) {
            return Math.max(0, Math.min(1, share.applyAsDouble(value)));
        }
    }
}
