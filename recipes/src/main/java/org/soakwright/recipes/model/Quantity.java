package org.soakwright.recipes.model;

import java.math.BigDecimal;
import java.math.MathContext;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Shown;
import org.soakwright.recipes.text.Unit;
import org.soakwright.recipes.text.Unsound;

/**
 * A number with its unit, exactly as written, at its place. Money and prices are quantities too.
 *
 * @param written the number in the characters of the file, or what is shown of one that was worked out
 */
public record Quantity(BigDecimal value, Unit unit, Place place, String written) {
    /** What is said of a number that no quantity holds. */
    public static final String TOO_LARGE = "larger than anything a recipe holds";

    /** The largest magnitude in SI: far beyond any real lot, and near enough that its powers stay finite. */
    private static final double MOST = 1e12;

    private static final MathContext DERIVED = new MathContext(4);

    public Quantity {
        if (isTooLarge(value, unit)) {
            throw new Unsound(place, "a value is " + TOO_LARGE + ": found \"" + written + " " + unit + "\"");
        }
    }

    public Quantity(BigDecimal value, Unit unit, Place place) {
        this(value, unit, place, Shown.number(value));
    }

    /** Whether the number in the unit is beyond what a quantity holds: 1e12 in SI. */
    public static boolean isTooLarge(BigDecimal value, Unit unit) {
        return Math.abs(unit.toSi(value)) > MOST;
    }

    /** From an SI value, to be shown in the unit. */
    public static Quantity ofSi(double si, Unit unit, Place place) {
        return new Quantity(BigDecimal.valueOf(unit.fromSi(si)), unit, place);
    }

    /** What was worked out from other values, shown to four significant digits. */
    public static Quantity derived(double si, Unit unit, Place place) {
        BigDecimal value = BigDecimal.valueOf(unit.fromSi(si));
        BigDecimal shown = value.round(DERIVED).stripTrailingZeros();
        return new Quantity(
                value, unit, place, Math.abs(shown.scale()) > 9 ? Shown.number(shown) : shown.toPlainString());
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
     * This temperature, if it lies from 100 K to 3000 K.
     *
     * @throws Unsound otherwise
     */
    public Quantity possible() {
        Rules.temperature(this);
        return this;
    }

    /**
     * This weight, if it is within 10 % of what the sizes of the piece and its density make.
     *
     * @throws Unsound otherwise
     */
    public Quantity weighing(double kg) {
        Rules.require(Rules.ifNotWeighing(this, kg));
        return this;
    }

    /** As one would write it: {@code 6 h}. */
    @Override
    public String toString() {
        return written + " " + unit;
    }
}
