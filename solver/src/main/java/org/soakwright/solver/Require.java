package org.soakwright.solver;

/** Range checks shared by the records of the solver: each message names the variable, the value and the limit. */
public final class Require {
    private Require() {}

    /** Refuses all but finite values above 0. */
    public static void positive(String name, double value, String unit) {
        if (!(value > 0) || Double.isInfinite(value)) {
            throw new IllegalArgumentException(name + " must be above 0 and finite, found " + value + " " + unit);
        }
    }

    /** Refuses NaN and infinities. */
    public static void finite(String name, double value, String unit) {
        if (!Double.isFinite(value)) {
            throw new IllegalArgumentException(name + " must be finite, found " + value + " " + unit);
        }
    }

    /** Refuses all but finite values at or above 0. */
    public static void notNegative(String name, double value, String unit) {
        if (!(value >= 0) || Double.isInfinite(value)) {
            throw new IllegalArgumentException(name + " must be at least 0 and finite, found " + value + " " + unit);
        }
    }
}
