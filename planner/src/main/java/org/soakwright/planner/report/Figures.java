package org.soakwright.planner.report;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** Numbers with as many digits as a person can use. */
public final class Figures {
    private static final int DIGITS = 4;

    /** Rounding noise of contents that are zero in truth lies below this; so does whatever no assay could find. */
    private static final double NOTHING = 1e-9;

    private static final double SMALLEST_PLAIN = 1e-4;

    private Figures() {}

    /** Four significant digits, trailing zeros kept, whole numbers from a thousand on: {@code 25.00}. */
    public static String measured(double value) {
        if (value == 0) {
            return "0";
        }
        if (Math.abs(value) < NOTHING) {
            return "~0";
        }
        return rounded(value, DIGITS);
    }

    /** Four significant digits without trailing zeros: {@code 600}. */
    public static String made(double value) {
        String text = measured(value);
        return text.contains(".") && !text.contains("e") ? strip(new BigDecimal(text)) : text;
    }

    /** As someone wrote it. */
    public static String written(double value) {
        return strip(BigDecimal.valueOf(value));
    }

    /** With a sign, for a change. */
    public static String change(double value) {
        return value > 0 ? "+" + measured(value) : measured(value);
    }

    /** Four digits, or as many more as it takes to see that the value is not the limit it fails. */
    public static String apart(double value, double limit) {
        for (int digits = DIGITS; digits < 17; digits++) {
            String text = rounded(value, digits);
            if (new BigDecimal(text).compareTo(BigDecimal.valueOf(limit)) == Double.compare(value, limit)) {
                return text;
            }
        }
        return Double.toString(value);
    }

    /** So many significant digits, whole numbers from as many on; powers of ten below 1e-4. */
    public static String rounded(double value, int digits) {
        if (value == 0) {
            return "0";
        }
        BigDecimal rounded = new BigDecimal(value).round(new MathContext(digits, RoundingMode.HALF_EVEN));
        int exponent = rounded.precision() - rounded.scale() - 1;
        if (Math.abs(value) < SMALLEST_PLAIN) {
            BigDecimal mantissa = rounded.movePointLeft(exponent).setScale(digits - 1, RoundingMode.HALF_EVEN);
            return mantissa.toPlainString() + "e" + exponent;
        }
        int scale = Math.max(0, digits - 1 - exponent);
        return new BigDecimal(value).setScale(scale, RoundingMode.HALF_EVEN).toPlainString();
    }

    private static String strip(BigDecimal value) {
        return value.signum() == 0 ? "0" : value.stripTrailingZeros().toPlainString();
    }
}
