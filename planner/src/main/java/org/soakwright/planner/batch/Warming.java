package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Objects;
import java.util.function.DoubleUnaryOperator;
import org.soakwright.planner.conditions.Lag;
import org.soakwright.planner.conditions.Warmth;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.Product;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Start;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.text.Unsound;

/**
 * What it is worth that pieces come to a step from another temperature. Warmth spreads a hundred times quicker than solutes do, so a step's
 * diffusivity is taken to be that of its temperature, and its time is corrected by a {@link Lag}: of a uniform piece in its first step
 * for the thin layer in which its solute begins to move, later for the whole piece. The grade that makes the step longest decides.
 */
final class Warming {
    /** m2/s, low for moist foods, gels and plastics (1e-7 to 1.5e-7, from memory, common practice): warming is not made quicker than it is. */
    private static final double THERMAL_DIFFUSIVITY = 1e-7;

    /** Of a step's shortest time: what warming may be worth and still be left out. */
    private static final double NEGLIGIBLE = 0.01;

    /** Nobody times a step to less, s. */
    private static final double SHORT = 10;

    /** What holds water and is colder holds ice, K (common practice: moist foods begin to freeze at -1 to -2 Cel); solvents may be colder. */
    private static final double FROZEN = 271.15;

    private final Recipe recipe;
    private final List<List<Lag>> lags = new ArrayList<>();
    private final List<String> said = new ArrayList<>();

    private Warming(Recipe recipe) {
        this.recipe = recipe;
        double[] arriving = arriving();
        List<Lag> none = java.util.Collections.nCopies(recipe.steps().size(), Lag.NONE);
        recipe.species().forEach(species -> lags.add(new ArrayList<>(none)));
        for (int i = 0; i < arriving.length; i++) {
            Quantity there = recipe.steps().get(i).temperature();
            if (there != null && arriving[i] != there.si()) {
                requireThawed(recipe.steps().get(i), arriving[i]);
                step(i, arriving[i] - there.si());
            }
        }
    }

    static Warming of(Recipe recipe) {
        return new Warming(recipe);
    }

    /** Of one species in one step. */
    Lag lag(int species, int step) {
        return lags.get(species).get(step);
    }

    /** Whether any step's time differs for anything. */
    boolean matters() {
        return lags.stream().flatMap(List::stream).anyMatch(lag -> lag != Lag.NONE);
    }

    /** What was included or left out; empty where no step changes the temperature of its pieces, or nothing comes of it. */
    List<String> said() {
        return List.copyOf(said);
    }

    /** Ice holds back both the warmth and the solute: nothing here knows how. */
    private void requireThawed(Step step, double arriving) {
        Quantity there = Objects.requireNonNull(step.temperature());
        if (!recipe.products().contains(Product.FLAMMABLE) && Math.min(arriving, there.si()) < FROZEN) {
            Quantity lot = recipe.lot().temperature();
            throw new Unsound(
                    lot != null && lot.si() == arriving ? lot.place() : there.place(),
                    "freezing and thawing are not computed: the pieces come to " + step.name() + " at "
                            + celsius(arriving) + ", which is at " + there
                            + "; thaw the lot first and write its temperature then");
        }
    }

    private static String celsius(double kelvin) {
        return String.format(Locale.ROOT, "%.1f °C", kelvin - 273.15);
    }

    private void step(int index, double difference) {
        Step step = recipe.steps().get(index);
        double shortest = step.time().seconds(0);
        List<Lag> own = new ArrayList<>();
        double worth = 0;
        double most = 0;
        for (Species species : recipe.species()) {
            Lag lag = slowest(species, index, difference, false, shortest);
            own.add(lag);
            worth = Math.max(worth, Math.abs(lag.of(shortest)));
            most = Math.max(
                    most,
                    Math.abs(slowest(species, index, difference, true, shortest).of(shortest)));
        }
        boolean matters = worth > Math.max(NEGLIGIBLE * shortest, SHORT);
        if (matters) {
            for (int s = 0; s < own.size(); s++) {
                lags.get(s).set(index, own.get(s));
            }
        }
        if (matters || (index == 0 && recipe.lot().temperature() != null)) {
            said.add((matters ? "Included: " : "Left out: ") + words(step, difference, worth, most));
        }
    }

    private String words(Step step, double difference, double worth, double most) {
        double warmed = recipe.lot().grades().stream()
                .mapToDouble(grade -> warmth(recipe, grade).within(0.05))
                .max()
                .orElseThrow();
        Quantity there = step.temperature();
        return "the pieces come to " + step.name() + " at " + celsius(there == null ? 0 : there.si() + difference)
                + ", which is at " + there
                + ": their mean is within a twentieth of that after about " + minutes(warmed) + ", worth "
                + minutes(worth) + " of the step"
                + (most > worth + NEGLIGIBLE * step.time().seconds(0)
                        ? ", and at most " + minutes(most) + " if the whole piece decided"
                        : "")
                + ".";
    }

    /** Of the grade that makes the step longest. */
    private Lag slowest(Species species, int index, double difference, boolean most, double seconds) {
        Step step = recipe.steps().get(index);
        double kelvin = Objects.requireNonNull(step.temperature()).si();
        double there = Translation.diffusivity(species, step);
        boolean fresh = index == 0 && species.start() instanceof Start.Uniform;
        DoubleUnaryOperator slowed = warmer -> 1 - Translation.diffusivity(species, step, kelvin + warmer) / there;
        Lag slowest = Lag.NONE;
        for (Grade grade : recipe.lot().grades()) {
            Warmth warmth = warmth(recipe, grade);
            Lag lag = most
                    ? Lag.most(warmth, difference, slowed)
                    : fresh ? Lag.fresh(warmth, there, difference, slowed) : Lag.through(warmth, difference, slowed);
            if (slowest == Lag.NONE || lag.of(seconds) > slowest.of(seconds)) {
                slowest = lag;
            }
        }
        return slowest;
    }

    /** The mean temperature with which the pieces come to each step, K; the step's own where none is known. */
    private double[] arriving() {
        double[] arriving = new double[recipe.steps().size()];
        Quantity lot = recipe.lot().temperature();
        double now = lot == null ? Double.NaN : lot.si();
        for (int i = 0; i < arriving.length; i++) {
            Step step = recipe.steps().get(i);
            Quantity there = step.temperature();
            if (there == null) {
                continue;
            }
            arriving[i] = Double.isNaN(now) ? there.si() : now;
            now = arriving[i] == there.si() ? there.si() : there.si() + (arriving[i] - there.si()) * left(step);
        }
        return arriving;
    }

    private double left(Step step) {
        return recipe.lot().grades().stream()
                .mapToDouble(grade -> warmth(recipe, grade).left(step.time().seconds(0)))
                .max()
                .orElseThrow();
    }

    static Warmth warmth(Recipe recipe, Grade grade) {
        Quantity stated = recipe.lot().thermalDiffusivity();
        return new Warmth(Translation.sides(grade), stated == null ? THERMAL_DIFFUSIVITY : stated.si());
    }

    /** To the second below a minute, to the minute above. */
    private static String minutes(double seconds) {
        double whole = Math.abs(seconds) < 60 ? Math.ceil(Math.abs(seconds)) : 60 * Math.ceil(Math.abs(seconds) / 60);
        return Durations.practical(whole);
    }
}
