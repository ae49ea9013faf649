package org.soakwright.solver.transport;

import org.soakwright.solver.Require;

/** Why a number may be farther off than its source says. */
public sealed interface Caution {
    /** The caution in words. */
    String text();

    /**
     * Something lies outside the range that a source covers.
     *
     * @param what what lies outside, as "temperature"
     * @param value its value, in unit
     * @param low lower end of the range, in unit; may be negative infinity
     * @param high upper end of the range, in unit; may be positive infinity
     * @param unit of all three; "1" for a pure number
     * @param source whose range it is
     */
    record Outside(String what, double value, double low, double high, String unit, String source) implements Caution {
        public Outside {
            Require.finite(what, value, unit);
            if (value >= low && value <= high) {
                throw new IllegalArgumentException(what + " " + value + " " + unit + " is not outside its range");
            }
        }

        @Override
        public String text() {
            String found = what + " " + Figure.shown(value, unit);
            if (Double.isInfinite(high)) {
                return found + " is below " + Figure.shown(low, unit) + ", where " + source + " begins";
            }
            if (Double.isInfinite(low)) {
                return found + " is above " + Figure.shown(high, unit) + ", where " + source + " ends";
            }
            return found + " is outside " + Figure.shown(low, "1") + " to " + Figure.shown(high, unit)
                    + ", the range of " + source;
        }
    }

    /** Something that is not a range. */
    record Note(String text) implements Caution {}
}
