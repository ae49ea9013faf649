package org.soakwright.recipes.parsing;

/** The normal distribution of mean 0 and standard deviation 1. */
final class Normal {
    /** Beyond it less than 1e-18 is left, nothing beside 1. */
    private static final double FARTHEST = 9;

    private Normal() {}

    /**
     * The share up to x, by Marsaglia's series (J. Stat. Software 11(4), 2004): 1/2 + density times (x + x^3/3 + x^5/15 + ...),
     * all terms of one sign, until they add nothing.
     */
    static double upTo(double x) {
        if (Math.abs(x) > FARTHEST) {
            return x > 0 ? 1 : 0;
        }
        double sum = x;
        double before = 0;
        double term = x;
        for (int i = 3; sum != before; i += 2) {
            before = sum;
            term *= x * x / i;
            sum += term;
        }
        return 0.5 + sum * Math.exp(-0.5 * x * x) / Math.sqrt(2 * Math.PI);
    }
}
