package org.soakwright.solver.finitevolume;

/**
 * What sets a body's surface apart from the others': its film is so many times the step's, and it may have a skin besides.
 *
 * @param speed its film coefficient over the step's
 * @param skin permeance of the skin, m/s; infinite where there is none
 */
record Coat(double speed, double skin) {
    static final Coat NONE = new Coat(1, Double.POSITIVE_INFINITY);

    /** Whether nothing resists at the surface. */
    boolean open(Step step) {
        return step.open() && Double.isInfinite(skin);
    }

    /** All resistance at the surface as one coefficient, m/s; infinite where it is open. */
    double film(Step step) {
        return open(step) ? Double.POSITIVE_INFINITY : 1 / (1 / (speed * step.film()) + 1 / skin);
    }
}
