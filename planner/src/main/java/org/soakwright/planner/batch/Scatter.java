package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.special.Erf;

/**
 * How a reading is distributed over pieces, by mass, when it is known at the classes. Along the first variation the reading is followed as
 * a curve and the mass below a limit is that of the normal numbers where it lies below; over the other variations that is summed with the
 * classes' weights, which is accurate because the sum is smooth.
 */
final class Scatter {
    /** Normal numbers beyond this do not count: 3e-7 of the mass. */
    private static final double REACH = 5;

    private static final int LOOKS = 100;
    private static final int MOST_STEPS = 200;

    /** Of the spread of the values: how closely a percentile is found. */
    private static final double CLOSE = 1e-12;

    private final List<Curve> curves = new ArrayList<>();
    private double low = Double.POSITIVE_INFINITY;
    private double high = Double.NEGATIVE_INFINITY;

    /** The reading along the first variation at fixed classes of the others. */
    private record Curve(double weight, Variation variation, int[] classes, double[] values, double[] seen) {}

    /** Pieces that are all alike. */
    private record Lump(double weight, int index, double value) {}

    private final List<Lump> lumps = new ArrayList<>();

    /**
     * Prepares populations together.
     *
     * @param values by class of the whole lot; only those of the populations are looked at
     */
    Scatter(List<Population> populations, double[] values) {
        double whole = populations.stream().mapToDouble(Population::share).sum();
        for (Population population : populations) {
            double share = population.share() / whole;
            if (!population.varies()) {
                double value = values[population.first()];
                lumps.add(new Lump(share, population.first(), value));
                widen(value);
                continue;
            }
            Variation first = population.variations().get(0);
            int others = population.count() / first.count();
            for (int o = 0; o < others; o++) {
                int[] classes = new int[first.count()];
                double[] along = new double[first.count()];
                for (int i = 0; i < classes.length; i++) {
                    classes[i] = population.first() + i * others + o;
                    along[i] = values[classes[i]];
                }
                double weight = share * population.weight(o) / first.weights()[0];
                curves.add(new Curve(weight, first, classes, along, looks(first, along)));
            }
        }
    }

    private double[] looks(Variation variation, double[] along) {
        double[] seen = new double[LOOKS + 1];
        for (int i = 0; i <= LOOKS; i++) {
            seen[i] = value(variation, along, number(i));
            widen(seen[i]);
        }
        return seen;
    }

    private void widen(double value) {
        low = Math.min(low, value);
        high = Math.max(high, value);
    }

    private static double number(int look) {
        return REACH * (2.0 * look / LOOKS - 1);
    }

    private static double value(Variation variation, double[] along, double number) {
        double[] parts = variation.between(number);
        double sum = 0;
        for (int i = 0; i < parts.length; i++) {
            sum += parts[i] * along[i];
        }
        return sum;
    }

    /** The share of the mass whose reading is at or below a limit. */
    double below(double limit) {
        double sum = 0;
        for (Lump lump : lumps) {
            sum += lump.value <= limit ? lump.weight : 0;
        }
        for (Curve curve : curves) {
            double inside = 0;
            double from = -REACH;
            boolean under = curve.seen[0] <= limit;
            for (double crossing : crossings(curve, limit)) {
                inside += under ? normal(crossing) - normal(from) : 0;
                under = !under;
                from = crossing;
            }
            inside += under ? normal(REACH) - normal(from) : 0;
            sum += curve.weight * inside / (normal(REACH) - normal(-REACH));
        }
        return sum;
    }

    private static double normal(double number) {
        return 0.5 * Erf.erfc(-number / Math.sqrt(2));
    }

    private static List<Double> crossings(Curve curve, double limit) {
        List<Double> all = new ArrayList<>();
        for (int i = 1; i <= LOOKS; i++) {
            boolean before = curve.seen[i - 1] <= limit;
            if (before != curve.seen[i] <= limit) {
                double a = number(i - 1);
                double b = number(i);
                double fa = curve.seen[i - 1] - limit;
                double fb = curve.seen[i] - limit;
                // Regula falsi with the Illinois rule; the curve is smooth between two looks.
                for (int step = 0; step < MOST_STEPS && b - a > 1e-13; step++) {
                    double x = Math.min(Math.max((a * fb - b * fa) / (fb - fa), a), b);
                    double f = value(curve.variation, curve.values, x) - limit;
                    if (f == 0 || x == a || x == b) {
                        a = x;
                        b = x;
                    } else if (f <= 0 == before) {
                        a = x;
                        fa = f;
                        fb /= 2;
                    } else {
                        b = x;
                        fb = f;
                        fa /= 2;
                    }
                }
                all.add(0.5 * (a + b));
            }
        }
        return all;
    }

    /** The least value at or below which so much of the mass lies. */
    double percentile(double share) {
        double a = low;
        double b = high;
        double fa = below(a) - share;
        double fb = 1 - share;
        if (fa >= 0) {
            return a;
        }
        int side = 0;
        double close = CLOSE * (high - low);
        for (int step = 0; step < MOST_STEPS && b - a > close; step++) {
            // Where lumps make the share jump, halving gets there; where it is smooth, false position is quicker.
            double x = step % 3 == 2 ? 0.5 * (a + b) : a - fa * (b - a) / (fb - fa);
            x = Math.min(b - 0.1 * close, Math.max(a + 0.1 * close, x));
            double f = below(x) - share;
            if (f < 0) {
                a = x;
                fa = f;
                fb = side == -1 ? fb / 2 : fb;
                side = -1;
            } else {
                b = x;
                fb = Math.max(f, Double.MIN_NORMAL);
                fa = side == 1 ? fa / 2 : fa;
                side = 1;
            }
        }
        return b;
    }

    /**
     * How a percentile answers to the reading of each class: weights that sum to 1. Those of the pieces that read just the percentile, by
     * how densely they lie there.
     */
    double[] answers(double percentile, int classes) {
        double[] answers = new double[classes];
        double close = 1e-9 * Math.max(high - low, Double.MIN_NORMAL);
        for (Lump lump : lumps) {
            if (Math.abs(lump.value - percentile) <= close) {
                answers[lump.index] = 1;
                return answers;
            }
        }
        double sum = 0;
        for (Curve curve : curves) {
            for (double crossing : crossings(curve, percentile)) {
                double step = 1e-4;
                double slope = Math.abs(value(curve.variation, curve.values, crossing + step)
                                - value(curve.variation, curve.values, crossing - step))
                        / (2 * step);
                double density = curve.weight * Math.exp(-0.5 * crossing * crossing) / Math.max(slope, close);
                double[] parts = curve.variation.between(crossing);
                for (int i = 0; i < parts.length; i++) {
                    answers[curve.classes[i]] += density * parts[i];
                }
                sum += density;
            }
        }
        for (int i = 0; i < classes; i++) {
            answers[i] = sum > 0 ? answers[i] / sum : 0;
        }
        return answers;
    }
}
