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

    /** Of a liquor that nothing changes: of its own content, the one last met. */
    static Sensitivity ofStillLiquor(Chain chain, int stage) {
        double[] byContent = new double[stage + 1];
        for (int k = stage; k >= 0; k--) {
            if (chain.stage(k).wets()) {
                byContent[k] = 1;
                break;
            }
        }
        return new Sensitivity(new double[stage + 1], byContent, new double[stage + 1]);
    }

    Sensitivity times(double factor) {
        return new Sensitivity(times(bySeconds, factor), times(byContent, factor), times(byFeed, factor));
    }

    private static double[] times(double[] a, double factor) {
        double[] product = a.clone();
        for (int i = 0; i < product.length; i++) {
            product[i] *= factor;
        }
        return product;
    }

    Sensitivity plus(Sensitivity other) {
        return minus(other.times(-1));
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
