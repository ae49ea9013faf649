package org.soakwright.planner.report.picture;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.List;
import java.util.Locale;

/** Numbers and phrases of pictures. */
final class Words {
    private static final MathContext FOUR = new MathContext(4, RoundingMode.HALF_EVEN);
    private static final double NOTHING = 1e-9;

    private Words() {}

    /** Four significant digits, as the sheets have them; whole numbers from a thousand on. */
    static String number(double value) {
        if (Math.abs(value) < NOTHING) {
            return "0";
        }
        BigDecimal rounded = new BigDecimal(value).round(FOUR);
        if (rounded.abs().compareTo(new BigDecimal("0.0001")) < 0) {
            return String.format(Locale.ROOT, "%.3e", value);
        }
        int scale = Math.max(0, 3 - (rounded.precision() - rounded.scale() - 1));
        return new BigDecimal(value).setScale(scale, RoundingMode.HALF_EVEN).toPlainString();
    }

    /** As someone wrote it. */
    static String written(double value) {
        return value == 0 ? "0" : BigDecimal.valueOf(value).stripTrailingZeros().toPlainString();
    }

    /** As many decimals as a step needs. */
    static String plain(double value, double step) {
        int decimals = Math.max(0, (int) -Math.floor(Math.log10(step) + 1e-9));
        return new BigDecimal(value).setScale(decimals, RoundingMode.HALF_EVEN).toPlainString();
    }

    static String capital(String text) {
        int first = text.offsetByCodePoints(0, 1);
        return text.substring(0, first).toUpperCase(Locale.ROOT) + text.substring(first);
    }

    /** {@code a, b and c}. */
    static String list(List<String> parts) {
        int last = parts.size() - 1;
        return last < 1
                ? String.join("", parts)
                : String.join(", ", parts.subList(0, last)) + " and " + parts.get(last);
    }

    /** Lower-case letters, digits and hyphens. */
    static String identifier(String name) {
        StringBuilder id = new StringBuilder();
        name.toLowerCase(Locale.ROOT).codePoints().forEach(c -> {
            if ((c >= 'a' && c <= 'z') || (c >= '0' && c <= '9')) {
                id.appendCodePoint(c);
            } else if (id.length() > 0 && id.charAt(id.length() - 1) != '-') {
                id.append('-');
            }
        });
        String trimmed = id.toString().replaceAll("-$", "");
        return trimmed.isEmpty() ? "x" : trimmed;
    }
}
