package org.soakwright.planner.report;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.time.LocalDateTime;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.soakwright.planner.batch.Durations;
import org.soakwright.planner.batch.TargetState;
import org.soakwright.planner.batch.Totals;
import org.soakwright.recipes.model.LiquorPrice;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Step;

/** Targets, totals and quantities in words. */
public final class Wording {
    private static final double DAY = 86400;

    private Wording() {}

    /** {@code at most 25 g/kg}, {@code at least 2 %}, {@code 20 to 25 g/kg}. */
    public static String limit(TargetState state) {
        if (state.atMost().isPresent() && state.atLeast().isPresent()) {
            return Figures.written(state.atLeast().getAsDouble()) + " to "
                    + Figures.written(state.atMost().getAsDouble()) + " " + state.unit();
        }
        return state.atMost().isPresent()
                ? "at most " + Figures.written(state.atMost().getAsDouble()) + " " + state.unit()
                : "at least " + Figures.written(state.atLeast().orElseThrow()) + " " + state.unit();
    }

    /** The limit nearest to failing, or failed. */
    public static double side(TargetState state) {
        if (state.atMost().isEmpty() || state.atLeast().isEmpty()) {
            return state.atMost().orElseGet(() -> state.atLeast().orElseThrow());
        }
        double most = state.atMost().getAsDouble();
        double least = state.atLeast().getAsDouble();
        return state.value() - least < most - state.value() ? least : most;
    }

    /** The value, with as many digits as show on which side of the limit it lies where it fails. */
    public static String value(TargetState state) {
        String number = state.met() ? Figures.measured(state.value()) : Figures.apart(state.value(), side(state));
        return number + " " + state.unit();
    }

    /** {@code salt mean, thick ends at 27.41 g/kg, 2.410 g/kg above its limit of 25 g/kg}. */
    public static String miss(TargetState state) {
        double side = side(state);
        double by = state.value() - side;
        return state.name() + " is " + value(state) + ", " + Figures.measured(Math.abs(by)) + " " + state.unit()
                + (by > 0 ? " above" : " below") + " its limit of " + Figures.written(side) + " " + state.unit();
    }

    /** {@code 2 d 9 h 45 min (57:45 on the clock)}. */
    public static String lasting(double seconds) {
        String practical = Durations.practical(seconds);
        return seconds < DAY ? practical : practical + " (" + Durations.clock(seconds) + " on the clock)";
    }

    /**
     * A moment on the running clock by the clock on the wall, to the minute, with the year where it is another than at the start:
     * {@code Mon 2 Mar 15:45}.
     */
    public static String wall(LocalDateTime start, double seconds) {
        LocalDateTime moment = start.truncatedTo(ChronoUnit.MINUTES).plusMinutes(Math.round(seconds / 60));
        return wall(moment, moment.getYear() != start.getYear());
    }

    /** {@code Mon 2 Mar 2026 15:45}. Put together by hand: formatters of the library read locale data first, which takes long. */
    public static String wall(LocalDateTime moment, boolean year) {
        return brief(moment.getDayOfWeek().name()) + " " + moment.getDayOfMonth() + " "
                + brief(moment.getMonth().name()) + (year ? " " + moment.getYear() : "") + " "
                + two(moment.getHour()) + ":" + two(moment.getMinute());
    }

    private static String brief(String name) {
        return name.charAt(0) + name.substring(1, 3).toLowerCase(Locale.ROOT);
    }

    private static String two(int number) {
        return (number < 10 ? "0" : "") + number;
    }

    /** {@code 2 d 9 h 45 min, 3600 L, 118.20 EUR}. */
    public static String totals(Totals totals, Recipe recipe) {
        List<String> parts = new ArrayList<>(List.of(Durations.practical(totals.seconds())));
        totals.liquorM3().ifPresent(volume -> parts.add(Figures.made(volume * 1000) + " L"));
        totals.cost().ifPresent(cost -> parts.add(money(cost, recipe)));
        return String.join(", ", parts);
    }

    public static String money(double amount, Recipe recipe) {
        return money(amount, currency(recipe).orElse(""));
    }

    /** To the hundredth, in a currency or in none. */
    public static String money(double amount, String currency) {
        String number =
                BigDecimal.valueOf(amount).setScale(2, RoundingMode.HALF_EVEN).toPlainString();
        return currency.isEmpty() ? number : number + " " + currency;
    }

    /** The currency that the recipe's prices are in; a recipe has one or none. */
    public static Optional<String> currency(Recipe recipe) {
        if (recipe.prices() != null) {
            return Optional.of(recipe.prices().currency());
        }
        for (Step step : recipe.steps()) {
            LiquorPrice price = step.head().price();
            if (price != null) {
                Quantity any = price.supply() != null ? price.supply() : price.disposal();
                return any == null
                        ? Optional.empty()
                        : Optional.of(any.unit().symbol().split("/", -1)[0]);
            }
        }
        return Optional.empty();
    }

    /** {@code a, b and c}. */
    public static String list(List<String> parts) {
        int last = parts.size() - 1;
        return last < 1
                ? String.join("", parts)
                : String.join(", ", parts.subList(0, last)) + " and " + parts.get(last);
    }

    /** As written, degrees as people read them: {@code 4 °C}. */
    public static String temperature(Step step) {
        Quantity temperature = step.temperature();
        return temperature == null ? "" : quantity(temperature);
    }

    /** As people write it: {@code 4 °C}, {@code 8e-10 m²/s}. */
    public static String quantity(Quantity quantity) {
        String unit = quantity.unit()
                .symbol()
                .replace("Cel", "°C")
                .replace("m2", "m²")
                .replace("m3", "m³");
        BigDecimal value = quantity.value();
        int exponent = value.precision() - value.scale() - 1;
        String number = value.signum() != 0 && exponent < -4
                ? value.stripTrailingZeros().movePointLeft(exponent).toPlainString() + "e" + exponent
                : value.toPlainString();
        return number + " " + unit;
    }
}
