package org.soakwright.planner.batch;

import org.soakwright.recipes.model.Goal;

/**
 * One side of one target for one grade or the lot, in SI. Its miss is above zero while it is not met; it is the logarithm of value over limit, in
 * which residuals are nearly straight lines of time, continued linearly below a hundredth of the limit so that zero and rounding
 * noise do no harm.
 */
sealed interface Requirement {
    int target();

    double limit();

    /** Whether the value must not exceed the limit; else it must not fall short. */
    boolean upper();

    /** What a species' chain reads at the end of a stage. */
    record OfContent(int target, int species, int stage, Gauge gauge, double limit, boolean upper, double scale)
            implements Requirement {}

    /** What is worked out of several readings, or of the mass, at the end of a stage; limit and scale alike. */
    record OfState(int target, int stage, Measure measure, double limit, boolean upper) implements Requirement {}

    /**
     * What a total adds up to: linear in the durations, and so is its miss. A total is a sum of what was written, so equal to the
     * limit is within it, rounding or not.
     */
    record OfTotal(int target, Goal goal, double limit) implements Requirement {
        static final double SUMMED = 1e-10;

        @Override
        public boolean upper() {
            return true;
        }

        @Override
        public double miss(double value) {
            return value / limit - 1 - SUMMED;
        }

        @Override
        public double missSlope(double value) {
            return 1 / limit;
        }
    }

    /** The grade read, from 0; -1 where it is the lot, a liquor or a total. */
    default int grade() {
        if (this instanceof OfState state) {
            return state.measure().grade();
        }
        return this instanceof OfContent content ? content.gauge().grade() : -1;
    }

    /** The stage at whose end it is read; -1 for a total. */
    default int stage() {
        return -1;
    }

    /** Whether it is read off the pieces, and not off a liquor or a clock. */
    default boolean ofPieces() {
        return this instanceof OfState
                || (this instanceof OfContent content && !(content.gauge() instanceof Gauge.OfLiquor));
    }

    double KNEE = 0.01;

    /** Of the largest content met: what rounding may make of a value that is just the limit. */
    double ROUNDING = 1e-11;

    /** Whether a value is within the limit. */
    default boolean allows(double value) {
        if (this instanceof OfTotal) {
            return miss(value) <= 0;
        }
        double slack = this instanceof OfContent content ? ROUNDING * content.scale() : ROUNDING * limit();
        return upper() ? value <= limit() + slack : value >= limit() - slack;
    }

    default double miss(double value) {
        double ratio = value / divisor();
        double offset = limit() > 0 ? 0 : 1;
        double logarithm =
                ratio + offset >= KNEE ? Math.log(ratio + offset) : Math.log(KNEE) + (ratio + offset - KNEE) / KNEE;
        return upper() ? logarithm : -logarithm;
    }

    /** d miss / d value. */
    default double missSlope(double value) {
        double ratio = value / divisor() + (limit() > 0 ? 0 : 1);
        double slope = 1 / (divisor() * Math.max(ratio, KNEE));
        return upper() ? slope : -slope;
    }

    /** The limit, or where that is zero the scale of what is read. */
    private double divisor() {
        if (limit() > 0) {
            return limit();
        }
        return this instanceof OfContent content && content.scale() > 0 ? content.scale() : 1;
    }
}
