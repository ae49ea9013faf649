package org.soakwright.recipes.text;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.regex.Pattern;

/**
 * A unit by its UCUM symbol, with its exact size in SI: {@code si = value * numerator / denominator + offset}. Money has
 * no SI unit; a currency counts as its own, so that {@code EUR/h} is 1/3600 EUR/s.
 */
public record Unit(String symbol, BigDecimal numerator, BigDecimal denominator, BigDecimal offset) {
    /** The unit of a plain number. */
    public static final Unit ONE = of("1", "1");

    private static final Pattern CURRENCY = Pattern.compile("[A-Z]{3}");

    public Unit {
        if (symbol.isBlank() || numerator.signum() <= 0 || denominator.signum() <= 0) {
            throw new IllegalArgumentException("a unit has a symbol and a positive size: " + symbol);
        }
    }

    static Unit of(String symbol, String size) {
        return new Unit(symbol, new BigDecimal(size), BigDecimal.ONE, BigDecimal.ZERO);
    }

    /** This unit divided by another one; neither may have an offset. */
    public Unit per(Unit other) {
        if (offset.signum() != 0 || other.offset.signum() != 0) {
            throw new IllegalArgumentException("a unit with an offset has no quotient: " + symbol + "/" + other.symbol);
        }
        return new Unit(
                symbol + "/" + other.symbol,
                numerator.multiply(other.denominator),
                denominator.multiply(other.numerator),
                BigDecimal.ZERO);
    }

    /** Whether the text could be a currency: three capital letters. */
    public static boolean isCurrency(String code) {
        return CURRENCY.matcher(code).matches();
    }

    /** Money in the currency of a three-letter code. */
    public static Unit currency(String code) {
        if (!isCurrency(code)) {
            throw new IllegalArgumentException("a currency is three capital letters: " + code);
        }
        return of(code, "1");
    }

    /** The SI value of a number in this unit, rounded once. */
    public double toSi(BigDecimal value) {
        return value.multiply(numerator)
                .divide(denominator, MathContext.DECIMAL128)
                .add(offset)
                .doubleValue();
    }

    /** The number in this unit of an SI value. */
    public double fromSi(double si) {
        return BigDecimal.valueOf(si)
                .subtract(offset)
                .multiply(denominator)
                .divide(numerator, MathContext.DECIMAL128)
                .doubleValue();
    }

    @Override
    public String toString() {
        return symbol;
    }
}
