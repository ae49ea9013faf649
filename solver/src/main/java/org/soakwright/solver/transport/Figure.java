package org.soakwright.solver.transport;

import java.math.BigDecimal;
import java.math.MathContext;

/** Numbers within messages: five digits, with their unit. */
final class Figure {
    private static final MathContext FIVE_DIGITS = new MathContext(5);
    private static final int MOST_ZEROS = 6;

    private Figure() {}

    static String shown(double value, String unit) {
        return unit.equals("1") ? shown(value) : shown(value) + " " + unit;
    }

    private static String shown(double value) {
        if (!Double.isFinite(value)) {
            return Double.toString(value);
        }
        BigDecimal rounded = BigDecimal.valueOf(value).round(FIVE_DIGITS).stripTrailingZeros();
        int power = rounded.precision() - rounded.scale() - 1;
        return Math.abs(power) > MOST_ZEROS ? rounded.toString().replace("E+", "E") : rounded.toPlainString();
    }
}
