package org.soakwright.planner.line.verify;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.List;

/** Whatever was found, a sentence each, in the order in which it was found. */
final class Faults {
    private static final MathContext SHOWN = new MathContext(10);
    private static final int PLAIN = 12;

    private final List<String> all = new ArrayList<>();

    void add(String sentence) {
        if (!all.contains(sentence)) {
            all.add(sentence);
        }
    }

    /** A number as one would write it. */
    static String number(double number) {
        if (!Double.isFinite(number)) {
            return String.valueOf(number);
        }
        BigDecimal shown = new BigDecimal(number).round(SHOWN).stripTrailingZeros();
        return Math.abs(shown.scale()) > PLAIN ? shown.toString() : shown.toPlainString();
    }

    /** {@code 1 head}, {@code 2 heads}. */
    static String count(long number, String what) {
        return number + " " + what + (number == 1 ? "" : "s");
    }

    boolean isEmpty() {
        return all.isEmpty();
    }

    List<String> all() {
        return List.copyOf(all);
    }
}
