package org.soakwright.recipes.model;

import java.math.BigDecimal;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unit;
import org.soakwright.recipes.text.Unsound;

/** A number with its unit, exactly as written, at its place. Money and prices are quantities too. */
public record Quantity(BigDecimal value, Unit unit, Place place) {
    public Quantity {
        if (!Double.isFinite(unit.toSi(value))) {
            throw new Unsound(
                    place, "the value is too large: found \"" + value + " " + unit + "\"; write a finite one");
        }
    }

    /** From an SI value, to be shown in the unit. */
    public static Quantity ofSi(double si, Unit unit, Place place) {
        return new Quantity(BigDecimal.valueOf(unit.fromSi(si)), unit, place);
    }

    /** In SI units: seconds, metres, kilograms, kelvins, joules; fractions as parts of one; money per SI unit. */
    public double si() {
        return unit.toSi(value);
    }

    /**
     * This quantity, if it is above zero.
     *
     * @param what to call it in the message
     * @throws Unsound otherwise
     */
    public Quantity positive(String what) {
        Rules.positive(what, this);
        return this;
    }

    /**
     * This quantity, if it is zero or more.
     *
     * @param what to call it in the message
     * @throws Unsound otherwise
     */
    public Quantity notNegative(String what) {
        Rules.notNegative(what, this);
        return this;
    }

    /**
     * This temperature, if it lies above absolute zero.
     *
     * @throws Unsound otherwise
     */
    public Quantity possible() {
        Rules.aboveAbsoluteZero(this);
        return this;
    }

    /** As one would write it: {@code 6 h}. */
    @Override
    public String toString() {
        return value.toString().replace('E', 'e') + " " + unit;
    }
}
