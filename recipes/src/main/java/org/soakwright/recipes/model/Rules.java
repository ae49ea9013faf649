package org.soakwright.recipes.model;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problem;
import org.soakwright.recipes.text.Unsound;

/** The rules several records share, with one wording each. */
final class Rules {
    private Rules() {}

    static void named(String what, String name, Place place) {
        if (name.isBlank()) {
            throw new Unsound(place, what + " has no name; write one");
        }
    }

    static void positive(String what, @Nullable Quantity quantity) {
        require(ifNotPositive(what, quantity));
    }

    static List<Problem> ifNotPositive(String what, @Nullable Quantity quantity) {
        if (quantity == null || quantity.si() > 0) {
            return List.of();
        }
        return List.of(new Problem(quantity.place(), what + " must be above zero: found \"" + quantity + "\""));
    }

    static void notNegative(String what, @Nullable Quantity quantity) {
        if (quantity != null && quantity.si() < 0) {
            throw new Unsound(quantity.place(), what + " must be zero or more: found \"" + quantity + "\"");
        }
    }

    static void aboveAbsoluteZero(@Nullable Quantity temperature) {
        if (temperature != null && !(temperature.si() > 0)) {
            throw new Unsound(
                    temperature.place(),
                    "a temperature lies above absolute zero, -273.15 Cel: found \"" + temperature + "\"");
        }
    }

    static void require(List<Problem> problems) {
        if (!problems.isEmpty()) {
            throw new Unsound(problems);
        }
    }

    static String percent(double fraction) {
        if (!Double.isFinite(fraction)) {
            return Double.toString(fraction);
        }
        BigDecimal percent = BigDecimal.valueOf(fraction).movePointRight(2);
        return percent.setScale(9, RoundingMode.HALF_EVEN).stripTrailingZeros().toPlainString() + " %";
    }
}
