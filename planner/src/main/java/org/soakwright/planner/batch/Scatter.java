package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.special.Erf;

/**
 * How a reading is distributed over pieces, by mass, when it is known at the classes. Along the variation that moves it most the reading
 * is followed as a curve, and the mass below a limit is that of the normal numbers where it lies below; over the other variations that is
 * summed at evenly spaced normal numbers, which is accurate because the sum is smooth as long as the curve is the steepest.
 */
final class Scatter {
    /** Normal numbers beyond this do not count: 6e-7 of the mass. */
    private static final double REACH = 5;

    /** Looks along a curve; in between it is a cubic through four of them. */
    private static final int LOOKS = 200;

    /** Numbers at which another variation is summed. */
    private static final int OTHERS = 20;

    private static final int MOST_STEPS = 200;

    /** Of the largest value: how closely a percentile is found, and what counts as all alike. */
    private static final double CLOSE = 1e-11;

    private final List<Curve> curves = new ArrayList<>();
    private final List<Lump> lumps = new ArrayList<>();
    private final int classes;
    private double low = Double.POSITIVE_INFINITY;
    private double high = Double.NEGATIVE_INFINITY;

    /**
     * The reading along one variation.
     *
     * @param seen at every look
     * @param part by variation, what each of its classes has of this curve; empty for the variation followed
     */
    private record Curve(double weight, Population population, int along, double[] seen, List<double[]> part) {}

    /** Pieces that are all alike. */
    private record Lump(double weight, int index, double value) {}

    /**
     * Prepares populations together.
     *
     * @param values by class of the whole lot; only those of the populations are looked at
     */
    Scatter(List<Population> populations, double[] values) {
        classes = values.length;
        double whole = populations.stream().mapToDouble(Population::share).sum();
        for (Population population : populations) {
            double share = population.share() / whole;
            if (population.varies()) {
                add(population, share, values);
            } else {
                double value = values[population.first()];
                lumps.add(new Lump(share, population.first(), value));
                widen(value, value);
            }
        }
    }

    private void add(Population population, double share, double[] values) {
        List<Variation> variations = population.variations();
        List<double[][]> tables = new ArrayList<>();
        int along = steepest(population, values);
        for (int v = 0; v < variations.size(); v++) {
            tables.add(variations.get(v).table(REACH, v == along ? LOOKS : OTHERS));
        }
        int combinations = 1;
        for (int v = 0; v < variations.size(); v++) {
            combinations *= v == along ? 1 : OTHERS + 1;
        }
        for (int c = 0; c < combinations; c++) {
            double weight = share;
            List<double[]> part = new ArrayList<>();
            int rest = c;
            for (int v = 0; v < variations.size(); v++) {
                if (v == along) {
                    part.add(new double[0]);
                } else {
                    int at = rest % (OTHERS + 1);
                    rest /= OTHERS + 1;
                    part.add(tables.get(v)[at]);
                    weight *= density(REACH * (2.0 * at / OTHERS - 1)) * 2 * REACH / OTHERS;
                }
            }
            double[] nodes = nodes(population, along, part, values);
            double[] seen = new double[LOOKS + 1];
            for (int i = 0; i <= LOOKS; i++) {
                seen[i] = dot(tables.get(along)[i], nodes);
                widen(seen[i], seen[i]);
            }
            curves.add(new Curve(weight, population, along, seen, part));
        }
    }

    private static double dot(double[] a, double[] b) {
        double sum = 0;
        for (int i = 0; i < a.length; i++) {
            sum += a[i] * b[i];
        }
        return sum;
    }

    /** The variation whose classes, all else median, lie farthest apart, each counted as one standard deviation. */
    private static int steepest(Population population, double[] values) {
        List<Variation> variations = population.variations();
        int best = 0;
        double most = -1;
        for (int v = 0; v < variations.size(); v++) {
            List<double[]> median = new ArrayList<>();
            for (int u = 0; u < variations.size(); u++) {
                median.add(u == v ? new double[0] : variations.get(u).between(0));
            }
            double[] nodes = nodes(population, v, median, values);
            Variation variation = variations.get(v);
            double effect = Math.abs(dot(variation.between(1), nodes) - dot(variation.between(-1), nodes));
            if (effect > most) {
                most = effect;
                best = v;
            }
        }
        return best;
    }

    /** The reading at the classes of one variation, the others held. */
    private static double[] nodes(Population population, int along, List<double[]> part, double[] values) {
        double[] nodes = new double[population.variations().get(along).count()];
        for (int i = 0; i < population.count(); i++) {
            nodes[population.node(i, along)] += share(population, along, part, i) * values[population.first() + i];
        }
        return nodes;
    }

    private static double share(Population population, int along, List<double[]> part, int index) {
        double share = 1;
        for (int v = 0; v < part.size(); v++) {
            share *= v == along ? 1 : part.get(v)[population.node(index, v)];
        }
        return share;
    }

    private void widen(double least, double most) {
        low = Math.min(low, least);
        high = Math.max(high, most);
    }

    private static double number(double look) {
        return REACH * (2 * look / LOOKS - 1);
    }

    private static double density(double number) {
        return Math.exp(-0.5 * number * number) / Math.sqrt(2 * Math.PI);
    }

    private static double normal(double number) {
        return 0.5 * Erf.erfc(-number / Math.sqrt(2));
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
            for (double look : crossings(curve.seen, limit)) {
                double at = number(look);
                inside += under ? normal(at) - normal(from) : 0;
                under = !under;
                from = at;
            }
            inside += under ? normal(REACH) - normal(from) : 0;
            sum += curve.weight * inside / (normal(REACH) - normal(-REACH));
        }
        return sum;
    }

    /** Where a curve crosses a limit, in looks. */
    private static List<Double> crossings(double[] seen, double limit) {
        List<Double> all = new ArrayList<>();
        for (int i = 1; i <= LOOKS; i++) {
            boolean before = seen[i - 1] <= limit;
            if (before != seen[i] <= limit) {
                double a = 0;
                double b = 1;
                for (int step = 0; step < 40; step++) {
                    double middle = 0.5 * (a + b);
                    if (cubic(seen, i - 1, middle) <= limit == before) {
                        a = middle;
                    } else {
                        b = middle;
                    }
                }
                all.add(i - 1 + 0.5 * (a + b));
            }
        }
        return all;
    }

    /** Between a look and the next, through their neighbours too. */
    private static double cubic(double[] seen, int look, double t) {
        int first = Math.min(Math.max(look - 1, 0), LOOKS - 3);
        double x = look + t - first;
        return seen[first] * (x - 1) * (x - 2) * (x - 3) / -6
                + seen[first + 1] * x * (x - 2) * (x - 3) / 2
                + seen[first + 2] * x * (x - 1) * (x - 3) / -2
                + seen[first + 3] * x * (x - 1) * (x - 2) / 6;
    }

    /** The least value at or below which so much of the mass lies. */
    double percentile(double share) {
        double close = CLOSE * Math.max(Math.abs(low), Math.abs(high));
        double a = low;
        double b = high;
        double fa = below(a) - share;
        if (b - a <= close || fa >= 0) {
            return a;
        }
        double fb = 1 - share;
        int side = 0;
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
    double[] answers(double percentile) {
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
            for (double look : crossings(curve.seen, percentile)) {
                int i = (int) Math.min(LOOKS - 1, look);
                double slope = Math.abs(curve.seen[i + 1] - curve.seen[i]);
                double density = curve.weight * density(number(look)) / Math.max(slope, close);
                add(answers, density, curve, number(look));
                sum += density;
            }
        }
        if (sum == 0) {
            // All alike: the average answers for them.
            for (Curve curve : curves) {
                add(answers, curve.weight, curve, 0);
                sum += curve.weight;
            }
        }
        for (int i = 0; i < classes; i++) {
            answers[i] /= sum;
        }
        return answers;
    }

    private static void add(double[] answers, double weight, Curve curve, double number) {
        Population population = curve.population;
        double[] between = population.variations().get(curve.along).between(number);
        for (int i = 0; i < population.count(); i++) {
            answers[population.first() + i] +=
                    weight * between[population.node(i, curve.along)] * share(population, curve.along, curve.part, i);
        }
    }
}
