package org.soakwright.solver.chain;

/** Derivatives of one reading by what each stage, from the first to the reading's own, lasts and holds. */
public final class Sensitivity {
    private final double[] bySeconds;
    private final double[] byContent;
    private final double[] byFeed;

    Sensitivity(double[] bySeconds, double[] byContent, double[] byFeed) {
        this.bySeconds = bySeconds;
        this.byContent = byContent;
        this.byFeed = byFeed;
    }

    /** By duration, kg/m3 per s. */
    public double[] bySeconds() {
        return bySeconds.clone();
    }

    /** By the content of the liquor as poured, or of the equilibrium in air; dimensionless. */
    public double[] byContent() {
        return byContent.clone();
    }

    /** By the content of the liquor running in; dimensionless, 0 where none does. */
    public double[] byFeed() {
        return byFeed.clone();
    }

    Sensitivity minus(Sensitivity other) {
        return new Sensitivity(
                minus(bySeconds, other.bySeconds), minus(byContent, other.byContent), minus(byFeed, other.byFeed));
    }

    private static double[] minus(double[] a, double[] b) {
        double[] difference = a.clone();
        for (int i = 0; i < difference.length; i++) {
            difference[i] -= b[i];
        }
        return difference;
    }
}
