package org.soakwright.recipes.model;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Kind;
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

    /** Gels that swell hold some hundred times their own mass. */
    private static final double MOST_PER_DRY = 1000;

    /** Water itself has 55 mol/L. */
    private static final double MOST_MOL_PER_M3 = 100e3;

    private static final double MOST_GAIN = 100;
    private static final double MOST_KELVINS = 100;

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
        if (content != null && Basis.of(content.unit()) == Basis.OF_SATURATION && content.si() > 1) {
            return found(
                    content,
                    what + " is no more than what dissolves, 100 % of saturation",
                    "; write such as 75 % of saturation");
        }
        if (content != null && Basis.of(content.unit()) == Basis.PER_AMOUNT) {
            return content.si() > MOST_MOL_PER_M3
                    ? found(content, what + " by amount is at most 100 mol/L", "; write such as 2 mol/L")
                    : ifNegative(what, content);
        }
        if (content != null && content.si() > MOST_KG_PER_M3) {
            return found(content, what + " by volume is at most 25000 kg/m3 (25000 g/L)", "; write such as 30 g/L");
        }
        return ifNegative(what, content);
    }

    /** Per dry mass there may be many times as much. */
    static List<Problem> ifNoDryContent(Quantity content) {
        return content.si() > MOST_PER_DRY
                ? found(content, "a content per dry mass is at most 1000 kg/kg", "; write such as 1.8 kg/kg")
                : ifNegative("a content", content);
    }

    /** A limit can be many times the dry mass, or the water; what it is against stands elsewhere. */
    static List<Problem> ifNoLimit(String what, @Nullable Quantity limit) {
        if (limit == null || Basis.of(limit.unit()) != Basis.PER_MASS || limit.si() <= 1) {
            return ifNoContent(what, limit);
        }
        return limit.si() > MOST_PER_DRY
                ? found(limit, what + " per dry mass is at most 1000 kg/kg", "; write such as 1.8 kg/kg")
                : List.of();
    }

    /** A part that is neither nothing nor the whole. */
    static List<Problem> ifNotWithin(String what, Quantity part, String example) {
        return part.si() > 0 && part.si() < 1
                ? List.of()
                : found(part, what + " lies above 0 % and below 100 %", "; write such as " + example);
    }

    /** What is less sure than a coin's toss is no confidence. */
    static void confidence(@Nullable Quantity confidence) {
        require(
                confidence == null || (confidence.si() > 0.5 && confidence.si() < 1)
                        ? List.of()
                        : found(confidence, "a confidence lies above 50 % and below 100 %", "; write such as 90 %"));
    }

    /** A lot may lose all but nothing, and soak up a good deal. */
    static void gain(@Nullable Quantity gain) {
        require(
                gain == null || (gain.si() > -1 && gain.si() <= MOST_GAIN)
                        ? List.of()
                        : found(gain, "a gain lies above -100 % and up to 10000 %", "; write such as 12 % or -8 %"));
    }

    /** A give-or-take is a share, or kelvins of a temperature; nothing has none. */
    static List<Problem> ifNoGiveOrTake(Quantity quantity) {
        Quantity known = quantity.giveOrTake();
        if (known == null) {
            return List.of();
        }
        if (quantity.isTemperature()) {
            return Kind.TEMPERATURE_DIFFERENCE.has(known.unit()) && known.si() > 0 && known.si() <= MOST_KELVINS
                    ? List.of()
                    : found(
                            known,
                            "give-or-take of a temperature lies above 0 K and up to 100 K",
                            "; write such as 2 K");
        }
        if (quantity.si() == 0) {
            return found(known, "a value of nothing has no give-or-take", "; remove it");
        }
        return Kind.FRACTION.has(known.unit()) && known.si() > 0 && known.si() <= 1
                ? List.of()
                : found(known, "give-or-take lies above 0 % and up to 100 %", "; write such as 20 %");
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
