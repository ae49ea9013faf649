package org.soakwright.planner.report;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.soakwright.planner.batch.Durations;
import org.soakwright.planner.batch.TargetState;
import org.soakwright.planner.batch.Totals;
import org.soakwright.recipes.model.LiquorPrice;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Step;

/** Targets, totals and quantities in words. */
final class Wording {
    private static final double DAY = 86400;

    private Wording() {}

    /** {@code at most 25 g/kg}, {@code at least 2 %}, {@code 20 to 25 g/kg}. */
    static String limit(TargetState state) {
        if (state.atMost().isPresent() && state.atLeast().isPresent()) {
            return Figures.written(state.atLeast().getAsDouble()) + " to "
                    + Figures.written(state.atMost().getAsDouble()) + " " + state.unit();
        }
        return state.atMost().isPresent()
                ? "at most " + Figures.written(state.atMost().getAsDouble()) + " " + state.unit()
                : "at least " + Figures.written(state.atLeast().orElseThrow()) + " " + state.unit();
    }

    /** The limit nearest to failing, or failed. */
    static double side(TargetState state) {
        if (state.atMost().isEmpty() || state.atLeast().isEmpty()) {
            return state.atMost().orElseGet(() -> state.atLeast().orElseThrow());
        }
        double most = state.atMost().getAsDouble();
        double least = state.atLeast().getAsDouble();
        return state.value() - least < most - state.value() ? least : most;
    }

    /** The value, with as many digits as show on which side of the limit it lies where it fails. */
    static String value(TargetState state) {
        String number = state.met() ? Figures.measured(state.value()) : Figures.apart(state.value(), side(state));
        return number + " " + state.unit();
    }

    /** {@code salt mean, thick ends at 27.41 g/kg, 2.410 g/kg above its limit of 25 g/kg}. */
    static String miss(TargetState state) {
        double side = side(state);
        double by = state.value() - side;
        return state.name() + " is " + value(state) + ", " + Figures.measured(Math.abs(by)) + " " + state.unit()
                + (by > 0 ? " above" : " below") + " its limit of " + Figures.written(side) + " " + state.unit();
    }

    /** {@code 2 d 9 h 45 min (57:45 on the clock)}. */
    static String lasting(double seconds) {
        String practical = Durations.practical(seconds);
        return seconds < DAY ? practical : practical + " (" + Durations.clock(seconds) + " on the clock)";
    }

    /** {@code 2 d 9 h 45 min, 3600 L, 118.20 EUR}. */
    static String totals(Totals totals, Recipe recipe) {
        List<String> parts = new ArrayList<>(List.of(Durations.practical(totals.seconds())));
        totals.liquorM3().ifPresent(volume -> parts.add(Figures.made(volume * 1000) + " L"));
        totals.cost().ifPresent(cost -> parts.add(money(cost, recipe)));
        return String.join(", ", parts);
    }

    static String money(double amount, Recipe recipe) {
        return BigDecimal.valueOf(amount).setScale(2, RoundingMode.HALF_EVEN).toPlainString()
                + currency(recipe).map(code -> " " + code).orElse("");
    }

    /** The currency that the recipe's prices are in; a recipe has one or none. */
    static Optional<String> currency(Recipe recipe) {
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

    /** As written, degrees as people read them: {@code 4 °C}. */
    static String temperature(Step step) {
        Quantity temperature = step.temperature();
        return temperature == null ? "" : temperature.toString().replace("Cel", "°C");
    }
}
