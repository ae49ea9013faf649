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
    /** A century. */
    private static final int MOST_DAYS = 36_525;

    private static final double COLDEST = 100;
    private static final double HOTTEST = 3000;

    /** Diffusion in what is soaked takes some tens of kJ/mol; far more was most likely meant as J/mol. */
    private static final double MOST_JOULES_PER_MOLE = 500e3;

    /** The heaviest element weighs 22 600 kg/m3. */
    private static final double MOST_KG_PER_M3 = 25e3;

    /** What edges, crusts and a density in round numbers may make of a weight. */
    private static final double WEIGHT_TOLERANCE = 0.1;

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
        boolean vanishes = quantity.value().signum() > 0;
        return found(quantity, what + (vanishes ? " is too small to be told from zero" : " must be above zero"), "");
    }

    static void notNegative(String what, @Nullable Quantity quantity) {
        require(ifNegative(what, quantity));
    }

    static List<Problem> ifNegative(String what, @Nullable Quantity quantity) {
        return quantity == null || quantity.si() >= 0 ? List.of() : found(quantity, what + " must be zero or more", "");
    }

    /** A time of a step lies above zero and within a century. */
    static List<Problem> ifNoTime(String what, @Nullable Quantity time) {
        List<Problem> problems = ifNotPositive(what, time);
        return problems.isEmpty() ? ifTooLong(time) : problems;
    }

    static List<Problem> ifTooLong(@Nullable Quantity time) {
        return time == null || time.si() <= MOST_DAYS * 86_400.0
                ? List.of()
                : found(time, "a time is at most " + MOST_DAYS + " d", "; write a shorter one, such as 6 h");
    }

    static void temperature(@Nullable Quantity temperature) {
        require(ifNoTemperature(temperature));
    }

    /** Matter is solid or liquid, and Arrhenius' law means something, only so far. */
    static List<Problem> ifNoTemperature(@Nullable Quantity temperature) {
        if (temperature == null || (temperature.si() >= COLDEST && temperature.si() <= HOTTEST)) {
            return List.of();
        }
        return temperature.si() > 0
                ? found(
                        temperature,
                        "a temperature lies from -173.15 Cel to 2726.85 Cel (100 K to 3000 K)",
                        "; write such as 4 Cel")
                : found(temperature, "a temperature lies above absolute zero, -273.15 Cel", "");
    }

    static List<Problem> ifNoActivationEnergy(@Nullable Quantity energy) {
        return energy == null || energy.si() <= MOST_JOULES_PER_MOLE
                ? ifNegative("an activation energy", energy)
                : found(
                        energy,
                        "an activation energy is at most 500 kJ/mol",
                        "; write such as 22 kJ/mol, or J/mol if that was meant");
    }

    /** A content lies from nothing to the whole; by volume to more than any matter weighs. */
    static List<Problem> ifNoContent(String what, @Nullable Quantity content) {
        if (content != null && Basis.of(content.unit()) == Basis.PER_MASS && content.si() > 1) {
            return found(
                    content,
                    what + " by mass is no more than the whole, 1000 g/kg (100 %)",
                    "; write such as 190 g/kg");
        }
        if (content != null && content.si() > MOST_KG_PER_M3) {
            return found(content, what + " by volume is at most 25000 kg/m3 (25000 g/L)", "; write such as 30 g/L");
        }
        return ifNegative(what, content);
    }

    /** A weight is near what sizes and density make. */
    static List<Problem> ifNotWeighing(Quantity weight, double kg) {
        return Math.abs(weight.si() - kg) <= WEIGHT_TOLERANCE * kg
                ? List.of()
                : found(
                        weight,
                        "a weight that contradicts the sizes",
                        " where sizes and density make " + Quantity.derived(kg, weight.unit(), weight.place())
                                + "; correct one of them, they may differ by 10 %");
    }

    private static List<Problem> found(Quantity quantity, String rule, String remedy) {
        return List.of(new Problem(quantity.place(), rule + ": found \"" + quantity + "\"" + remedy));
    }

    static void requireAll(List<List<Problem>> problems) {
        require(problems.stream().flatMap(List::stream).toList());
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
