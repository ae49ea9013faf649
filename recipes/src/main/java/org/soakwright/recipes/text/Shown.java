package org.soakwright.recipes.text;

import java.math.BigDecimal;

/** Text from a file as it may appear in a message: one line, quoted, of bounded length, nothing a terminal would obey. */
public final class Shown {
    private static final int LONGEST = 60;

    private Shown() {}

    public static String quoted(String text) {
        return "\"" + plain(text, LONGEST) + "\"";
    }

    /** Without quotes, cut after as many characters. */
    static String plain(String text, int longest) {
        StringBuilder shown = new StringBuilder();
        text.codePoints().limit(longest).forEach(c -> {
            if (isPlain(c)) {
                shown.appendCodePoint(c);
            } else {
                shown.append(String.format("\\u%04x", c));
            }
        });
        boolean cut = text.codePointCount(0, text.length()) > longest;
        return shown.append(cut ? "…" : "").toString();
    }

    /** A number as one would write it: {@code 1e300}, {@code 8e-10}. */
    public static String number(BigDecimal value) {
        return value.toString().replace("E+", "e").replace('E', 'e');
    }

    /** A finite number as one would write it: {@code 0}, {@code 0.8}. */
    public static String number(double value) {
        return number(BigDecimal.valueOf(value).stripTrailingZeros());
    }

    /** Whether every character is one that prints on a line. */
    public static boolean isOneLine(String text) {
        return text.codePoints().allMatch(Shown::isPlain);
    }

    private static boolean isPlain(int c) {
        int type = Character.getType(c);
        return type != Character.CONTROL
                && type != Character.FORMAT
                && type != Character.SURROGATE
                && type != Character.LINE_SEPARATOR
                && type != Character.PARAGRAPH_SEPARATOR
                && type != Character.UNASSIGNED;
    }
}
