package org.soakwright.planner.report.picture;

import java.util.OptionalDouble;
import java.util.stream.Stream;

/** From where to where readings are shown: the curves, and each limit that is not so far off that the curves would become a line. */
record Reach(double low, double high) {
    /** The least share of the field that curves beside a limit have. */
    private static final double LEAST_CURVES = 0.3;

    /** Readings that differ by less than this share of themselves are shown as alike. */
    private static final double ALIKE = 0.01;

    private static final double MARGIN = 0.05;

    static Reach of(Spreading spreading) {
        double least = Double.POSITIVE_INFINITY;
        double most = Double.NEGATIVE_INFINITY;
        for (Spreading.Pieces pieces : spreading.pieces()) {
            least = Math.min(least, pieces.values()[0]);
            most = Math.max(most, pieces.values()[pieces.values().length - 1]);
        }
        double lacking = ALIKE * Math.max(Math.abs(least), Math.abs(most)) - (most - least);
        if (lacking > 0) {
            least -= lacking / 2;
            most += lacking / 2;
        }
        double span = most > least ? most - least : 1;
        double low = least;
        double high = most > least ? most : least + 1;
        for (double limit : Stream.of(spreading.atLeast(), spreading.atMost())
                .flatMapToDouble(OptionalDouble::stream)
                .toArray()) {
            if (span >= LEAST_CURVES * (Math.max(most, limit) - Math.min(least, limit))) {
                low = Math.min(low, limit);
                high = Math.max(high, limit);
            }
        }
        return new Reach(low - MARGIN * span, high + MARGIN * span);
    }

    boolean holds(double value) {
        return value >= low && value <= high;
    }

    /** Where a limit lies, in words, that is not shown: {@code ; 12 far right}. */
    String beyond(OptionalDouble limit) {
        if (limit.isEmpty() || holds(limit.getAsDouble())) {
            return "";
        }
        return "; " + Words.written(limit.getAsDouble()) + (limit.getAsDouble() > high ? " far right" : " far left");
    }
}
