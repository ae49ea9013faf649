package org.soakwright.recipes.model;

/**
 * How well lognormals describe the sizes that were measured.
 *
 * @param file the list, as the recipe names it
 * @param pieces how many of its pieces are in this grade; one on the border of two grades counts in both
 * @param worth how many pieces of equal weight would tell as much as the whole list (Kish's effective sample size)
 * @param median of this grade by mass: the weighted geometric mean
 * @param cv coefficient of variation in this grade; 0 where all sizes are one
 * @param worst the largest gap between the share of mass up to a size in the whole list and in all its grades together as
 *     fitted (Kolmogorov's distance)
 */
public record Fit(String file, int pieces, double worth, Quantity median, double cv, double worst) {
    public Fit {
        if (!(pieces > 0 && worth > 0 && cv >= 0 && worst >= 0 && worst <= 1)) {
            throw new IllegalArgumentException("a fit stands on pieces, its spread and gap on nothing below zero");
        }
    }

    /** What is to be thought of the fit. */
    public enum Verdict implements Word {
        /** The gap is one that chance alone makes. */
        LOGNORMAL,
        /** Chance alone makes such a gap less than once in twenty times: the pieces may be of several kinds. */
        DOUBTFUL
    }

    /**
     * The gap that chance alone passes once in twenty times. Median and spread are fitted, so Kolmogorov's own limits would
     * be far too wide; this is Lilliefors' limit (1967) in the form Stephens (1974) gave it for every number of pieces.
     */
    public double limit() {
        double root = Math.sqrt(worth);
        return 0.895 / (root - 0.01 + 0.85 / root);
    }

    public Verdict verdict() {
        return worst > limit() ? Verdict.DOUBTFUL : Verdict.LOGNORMAL;
    }
}
