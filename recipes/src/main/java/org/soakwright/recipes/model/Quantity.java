package org.soakwright.recipes.model;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Objects;
import java.util.function.UnaryOperator;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Shown;
import org.soakwright.recipes.text.Unit;
import org.soakwright.recipes.text.Unsound;

/**
 * A number with its unit, exactly as written, at its place. Money and prices are quantities too. Not a record, so that
 * the SI value is worked out once, and the decimals of a changed one only where somebody asks for them.
 */
public final class Quantity {
    /** What is said of a number that no quantity holds. */
    public static final String TOO_LARGE = "larger than anything a recipe holds";

    /** The largest magnitude in SI: far beyond any real lot, and near enough that its powers stay finite. */
    private static final double MOST = 1e12;

    private static final MathContext DERIVED = new MathContext(4);

    private final @Nullable BigDecimal value;
    private final Unit unit;
    private final Place place;
    private final String written;
    private final @Nullable Quantity giveOrTake;
    private final double si;

    /**
     * A value as written.
     *
     * @param written the number in the characters of the file, or what is shown of one that was worked out
     * @param giveOrTake how well it is known: a share, the coefficient of variation of a lognormal whose median is the
     *     value; of a temperature kelvins; null where it is taken for exact
     */
    public Quantity(BigDecimal value, Unit unit, Place place, String written, @Nullable Quantity giveOrTake) {
        this(value, unit, place, written, giveOrTake, unit.toSi(value));
    }

    public Quantity(BigDecimal value, Unit unit, Place place, String written) {
        this(value, unit, place, written, null);
    }

    public Quantity(BigDecimal value, Unit unit, Place place) {
        this(value, unit, place, Shown.number(value));
    }

    private Quantity(
            @Nullable BigDecimal value,
            Unit unit,
            Place place,
            String written,
            @Nullable Quantity giveOrTake,
            double si) {
        if (!(Math.abs(si) <= MOST)) {
            throw new Unsound(place, "a value is " + TOO_LARGE + ": found \"" + written + " " + unit + "\"");
        }
        this.value = value;
        this.unit = unit;
        this.place = place;
        this.written = written;
        this.giveOrTake = giveOrTake;
        this.si = si;
        Rules.require(Rules.ifNoGiveOrTake(this));
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
        return new Quantity(value, unit, place, rounded(value));
    }

    /** Every quantity of a recipe that may be missing goes through this when the recipe is changed. */
    static @Nullable Quantity each(@Nullable Quantity quantity, UnaryOperator<Quantity> change) {
        return quantity == null ? null : change.apply(quantity);
    }

    private static String rounded(BigDecimal value) {
        BigDecimal shown = value.round(DERIVED).stripTrailingZeros();
        return Math.abs(shown.scale()) > 9 ? Shown.number(shown) : shown.toPlainString();
    }

    /** The number in its unit. */
    public BigDecimal value() {
        return value == null ? BigDecimal.valueOf(unit.fromSi(si)) : value;
    }

    public Unit unit() {
        return unit;
    }

    public Place place() {
        return place;
    }

    /** The number in the characters of the file, or what is shown of one that was worked out. */
    public String written() {
        return isWritten() ? written : rounded(value());
    }

    /** How well it is known; null where it is taken for exact. */
    public @Nullable Quantity giveOrTake() {
        return giveOrTake;
    }

    /** In SI units: seconds, metres, kilograms, kelvins, joules; fractions as parts of one; money per SI unit. */
    public double si() {
        return si;
    }

    /** Whether it was written or worked out from what was, and not put in its place later. */
    boolean isWritten() {
        return !written.isEmpty();
    }

    /** Whether it is a temperature, whose give-or-take is kelvins. */
    public boolean isTemperature() {
        return Kind.TEMPERATURE.has(unit);
    }

    /** Another value at this one's place, shown in its unit and taken for exact. */
    public Quantity withSi(double other) {
        return new Quantity(null, unit, place, "", null, other);
    }

    /** This value times a factor, with its give-or-take. */
    public Quantity times(double factor) {
        return factor == 1 ? this : new Quantity(null, unit, place, "", giveOrTake, si * factor);
    }

    /** The same value, known so well. */
    public Quantity with(@Nullable Quantity otherGiveOrTake) {
        return new Quantity(value, unit, place, written, otherGiveOrTake, si);
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
     * This activation energy, if it lies from 0 to 500 kJ/mol.
     *
     * @throws Unsound otherwise
     */
    public Quantity activating() {
        Rules.require(Rules.ifNoActivationEnergy(this));
        return this;
    }

    /**
     * This confidence, if it lies above 50 % and below 100 %.
     *
     * @throws Unsound otherwise
     */
    public Quantity sure() {
        Rules.confidence(this);
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

    @Override
    public boolean equals(@Nullable Object other) {
        return other instanceof Quantity that
                && si == that.si
                && unit.equals(that.unit)
                && place.equals(that.place)
                && written.equals(that.written)
                && Objects.equals(giveOrTake, that.giveOrTake);
    }

    @Override
    public int hashCode() {
        return Objects.hash(si, unit, place, written, giveOrTake);
    }

    /** As one would write it: {@code 6 h}. */
    @Override
    public String toString() {
        return written() + " " + unit;
    }
}
