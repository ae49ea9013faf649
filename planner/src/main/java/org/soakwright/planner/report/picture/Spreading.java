package org.soakwright.planner.report.picture;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.apache.commons.math3.special.Erf;
import org.soakwright.planner.batch.Distribution;
import org.soakwright.planner.batch.TargetState;
import org.soakwright.planner.report.TargetWords;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.Target;

/**
 * How what one target reads is spread over pieces that differ, in its own unit.
 *
 * @param name what is read, without grade and share
 * @param share of the pieces that must keep the limits, 1; empty where their average must
 * @param sure how surely, in words to be added to the limit; empty where no confidence is asked for
 */
record Spreading(
        String name,
        String unit,
        OptionalDouble atLeast,
        OptionalDouble atMost,
        OptionalDouble share,
        String sure,
        List<Pieces> pieces) {

    /** The normal numbers of nothing and of all are infinite. */
    private static final double INNER = 1 - 1e-12;

    /**
     * The pieces of one grade, or of the lot.
     *
     * @param values rising
     * @param below the share of the pieces, by mass, that reads so much or less, 1
     * @param read what the target reads
     */
    record Pieces(
            String grade, int series, double[] values, double[] below, double read, boolean met, boolean decides) {

        /** The share that reads a value or less, in straight lines. */
        double below(double value) {
            int last = values.length - 1;
            if (value < values[0]) {
                return 0;
            }
            if (value >= values[last]) {
                return 1;
            }
            int i = 1;
            while (values[i] <= value) {
                i++;
            }
            double part = (value - values[i - 1]) / (values[i] - values[i - 1]);
            return below[i - 1] + part * (below[i] - below[i - 1]);
        }

        /** What a share reads at most: straight by normal numbers, by which readings are nearly so. */
        double atMost(double share) {
            int i = 1;
            while (i < values.length - 1 && below[i] < share) {
                i++;
            }
            double before = normalNumber(below[i - 1]);
            double step = normalNumber(below[i]) - before;
            double part = step > 0 ? Math.max(0, Math.min(1, (normalNumber(share) - before) / step)) : 1;
            return values[i - 1] + part * (values[i] - values[i - 1]);
        }

        private static double normalNumber(double share) {
            return Math.sqrt(2) * Erf.erfInv(Math.max(-INNER, Math.min(INNER, 2 * share - 1)));
        }

        String verdict() {
            return met ? decides ? ", decides" : "" : ", missed";
        }
    }

    /** Every target on pieces that differ, in the order written. */
    static List<Spreading> of(History history, List<String> binds) {
        Map<String, TargetState> states = new LinkedHashMap<>();
        history.targets().forEach(state -> states.putIfAbsent(state.name(), state));
        Map<Target, List<Distribution>> byTarget = new LinkedHashMap<>();
        for (Distribution one : Distribution.of(history.run())) {
            TargetState state = states.get(one.target());
            if (state != null) {
                byTarget.computeIfAbsent(state.target(), target -> new ArrayList<>())
                        .add(one);
            }
        }
        List<Spreading> all = new ArrayList<>();
        byTarget.forEach((target, distributions) -> {
            List<Pieces> pieces = new ArrayList<>();
            for (Distribution one : distributions) {
                TargetState state = states.get(one.target());
                if (state != null) {
                    pieces.add(pieces(history, one, state, binds.contains(one.target())));
                }
            }
            Distribution first = distributions.get(0);
            all.add(new Spreading(
                    name((Target.OfPieces) target),
                    first.unit(),
                    first.atLeast(),
                    first.atMost(),
                    first.share(),
                    TargetWords.sure(history.recipe(), target),
                    List.copyOf(pieces)));
        });
        return all;
    }

    private static Pieces pieces(History history, Distribution one, TargetState state, boolean decides) {
        return new Pieces(
                one.grade(),
                series(history, one.grade()),
                one.curve().stream().mapToDouble(Distribution.Point::value).toArray(),
                one.curve().stream().mapToDouble(Distribution.Point::below).toArray(),
                state.value(),
                state.met(),
                decides);
    }

    /** As in other pictures; the lot comes after the grades. */
    private static int series(History history, String grade) {
        List<String> names = history.grades().stream().map(Grade::name).toList();
        return names.contains(grade) ? names.indexOf(grade) : names.size();
    }

    private static String name(Target.OfPieces target) {
        return target.species().name() + " " + target.reading().word()
                + (target.after() == null ? "" : " after " + target.after().name());
    }

    /** Whether the curve tells how many read so much or more: so it does where the limit is a lower one. */
    boolean isFromAbove() {
        return atLeast.isPresent() && atMost.isEmpty();
    }

    /** How far the limits must be kept on one side: of a band each side may be missed by half of the rest. */
    double inside() {
        double kept = share.orElseThrow();
        return isBand() ? (1 + kept) / 2 : kept;
    }

    boolean isBand() {
        return atLeast.isPresent() && atMost.isPresent();
    }

    /** The share of the pieces that keep every limit. */
    double kept(Pieces of) {
        double under = atMost.isPresent() ? of.below(atMost.getAsDouble()) : 1;
        double over = atLeast.isPresent() ? of.below(atLeast.getAsDouble()) : 0;
        return under - over;
    }

    /** {@code at least 15 g/kg}. */
    String limits() {
        if (isBand()) {
            return Words.written(atLeast.orElseThrow()) + " to " + Words.written(atMost.orElseThrow()) + " " + unit
                    + sure;
        }
        return (atMost.isPresent() ? "at most " : "at least ")
                + Words.written(atMost.isPresent() ? atMost.getAsDouble() : atLeast.orElseThrow()) + " " + unit
                + sure;
    }

    /** {@code 95 %}, of the pieces. */
    String many() {
        return Words.written(Math.round(1e6 * share.orElseThrow()) / 1e4) + " %";
    }

    /** {@code 15.13 or more}: what the share of the pieces reads that the target names; with a unit where one is given. */
    String read(Pieces of, String unit) {
        if (isBand()) {
            double low = of.atMost(1 - inside());
            double high = of.atMost(inside());
            // The target reads the end that is nearer to failing.
            boolean readsHigh = Math.abs(of.read() - high) < Math.abs(of.read() - low);
            return Words.number(readsHigh ? low : of.read()) + " to " + Words.number(readsHigh ? of.read() : high)
                    + unit;
        }
        return Words.number(of.read()) + unit + (isFromAbove() ? " or more" : " or less");
    }

    /** Of a share, in per cent. */
    static String percent(double share) {
        if (share > 0.9995) {
            return "over 99.9 %";
        }
        return share < 0.0005 ? "under 0.1 %" : Words.plain(100 * share, 0.1) + " %";
    }
}
