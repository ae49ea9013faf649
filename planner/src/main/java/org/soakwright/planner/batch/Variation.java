package org.soakwright.planner.batch;

import java.util.Arrays;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;

/**
 * One thing in which pieces differ, as a standard normal number: the classes that stand for all of them (Gauss-Hermite nodes), what part of
 * the mass each stands for, and how a reading known at the classes is known in between.
 *
 * @param sigma standard deviation of the natural logarithm of what differs
 * @param nodes standard normal numbers, rising, odd in number, so that the middle one is the median
 * @param weights shares of the mass, summing to 1
 * @param factorwise whether a reading is a polynomial of exp(sigma times the number) rather than of the number itself: so it is for
 *     the start content, in which it is a straight line
 */
record Variation(double sigma, double[] nodes, double[] weights, boolean factorwise) {
    /** Beyond the outermost class a reading goes on straight: there lies less than a thousandth of the mass. */
    private static final int FEWEST = 7;

    private static final int OF_START = 3;

    /** Of a size, or of the logarithm of a rate: readings bend with it. */
    static Variation ofSize(double sigma) {
        return ofSize(sigma, classes(sigma));
    }

    static Variation ofSize(double sigma, int count) {
        return gaussHermite(sigma, count, false);
    }

    static Variation ofStart(double sigma) {
        return gaussHermite(sigma, OF_START, true);
    }

    /**
     * How many classes keep percentiles from 2 % to 98 % within 2e-5 of the driving difference up to a spread of 30 %, within 2e-3 up to 60 %;
     * the tests hold it against twice as many.
     */
    static int classes(double sigma) {
        return FEWEST + 2 * (int) Math.ceil(Math.max(0, sigma - 0.08) / 0.05);
    }

    private static Variation gaussHermite(double sigma, int count, boolean factorwise) {
        GaussIntegrator rule = new GaussIntegratorFactory().hermite(count);
        double[] nodes = new double[count];
        double[] weights = new double[count];
        for (int i = 0; i < count; i++) {
            // The middle is the median itself, not within rounding of it.
            nodes[i] = 2 * i + 1 == count ? 0 : Math.sqrt(2) * rule.getPoint(i);
            weights[i] = rule.getWeight(i) / Math.sqrt(Math.PI);
        }
        double sum = Arrays.stream(weights).sum();
        for (int i = 0; i < count; i++) {
            weights[i] /= sum;
        }
        return new Variation(sigma, nodes, weights, factorwise);
    }

    int count() {
        return nodes.length;
    }

    /** What differs at a class, over its median. */
    double factor(int node) {
        return Math.exp(sigma * nodes[node]);
    }

    private double place(double number) {
        return factorwise ? Math.exp(sigma * number) : number;
    }

    /** The same at evenly spaced numbers from minus to plus a reach; by number. */
    double[][] table(double reach, int steps) {
        double[][] table = new double[steps + 1][];
        for (int i = 0; i <= steps; i++) {
            table[i] = between(reach * (2.0 * i / steps - 1));
        }
        return table;
    }

    /** What each class contributes to a reading at a standard normal number (Lagrange's polynomials); straight beyond the outermost. */
    double[] between(double number) {
        double low = nodes[0];
        double high = nodes[count() - 1];
        double inside = Math.min(high, Math.max(low, number));
        double[] at = lagrange(place(inside));
        if (inside == number || factorwise) {
            return factorwise ? lagrange(place(number)) : at;
        }
        double step = 0.05;
        double[] inner = lagrange(place(inside + (number > high ? -step : step)));
        double reach = (number - inside) / (number > high ? step : -step);
        for (int i = 0; i < at.length; i++) {
            at[i] += reach * (at[i] - inner[i]);
        }
        return at;
    }

    private double[] lagrange(double x) {
        double[] values = new double[count()];
        for (int i = 0; i < values.length; i++) {
            values[i] = 1;
            for (int j = 0; j < values.length; j++) {
                if (j != i) {
                    values[i] *= (x - place(nodes[j])) / (place(nodes[i]) - place(nodes[j]));
                }
            }
        }
        return values;
    }
}
