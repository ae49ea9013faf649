package org.soakwright.planner.batch;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.soakwright.planner.conditions.Known;
import org.soakwright.recipes.model.Moisture;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Reading;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Step;

/**
 * What the pieces weigh while things leave and enter them, and how much of that is water, per mass as loaded. A stated gain goes first;
 * else a stated moisture gives the mass, since all that is neither water nor a species stays; else the water is a species, and
 * the mass is what was loaded and what all species changed.
 */
final class Weighing {
    private final Recipe recipe;
    private final double density;

    private Weighing(Recipe recipe, double density) {
        this.recipe = recipe;
        this.density = density;
    }

    /** Empty where the recipe does not say how the mass changes. */
    static Optional<Weighing> of(Recipe recipe) {
        Quantity density = recipe.lot().density();
        boolean told = gains(recipe)
                || recipe.lot().moisture() != null
                || recipe.water().isPresent();
        return told && density != null ? Optional.of(new Weighing(recipe, density.si())) : Optional.empty();
    }

    private static boolean gains(Recipe recipe) {
        return recipe.steps().stream().anyMatch(step -> step.head().gain() != null);
    }

    /**
     * Mass over mass as loaded.
     *
     * @param grade -1 for the lot
     */
    Dual mass(State state, int grade) {
        if (gains(recipe)) {
            double gained = 0;
            for (int i = 0; i < recipe.steps().size(); i++) {
                Step step = recipe.steps().get(i);
                Quantity gain = step.head().gain();
                gained += gain != null && state.past(i) ? gain.si() : 0;
            }
            return state.number(1 + gained);
        }
        Dual changed = state.number(0);
        for (int s = 0; s < recipe.species().size(); s++) {
            changed = changed.plus(perLoaded(state, s, grade, Reading.MEAN).plus(-started(s, grade)));
        }
        Moisture moisture = recipe.lot().moisture();
        if (moisture == null) {
            return changed.plus(1);
        }
        Dual dry = changed.plus(1 - moisture.start().si());
        return dry.over(share(state, moisture).times(-1).plus(1));
    }

    /**
     * Water over mass as loaded.
     *
     * @param reading of the pieces, where the water is a species; a moisture is the same everywhere
     */
    Dual water(State state, int grade, Reading reading) {
        Moisture moisture = recipe.lot().moisture();
        if (moisture != null) {
            return share(state, moisture).times(mass(state, grade));
        }
        return perLoaded(state, waterSpecies().orElseThrow(), grade, reading);
    }

    /** Whether the recipe says how much water there is. */
    boolean tellsWater() {
        return recipe.lot().moisture() != null || recipe.water().isPresent();
    }

    /** The water's place among the species, where it is one. */
    Optional<Integer> waterSpecies() {
        return recipe.water().map(recipe.species()::indexOf);
    }

    /** Whether a species and the water tell pieces apart by size alone, so that a class of one is the same pieces as a class of the other. */
    boolean sharesClasses(int species) {
        return Stream.of(species, waterSpecies().orElse(species))
                .map(recipe.species()::get)
                .allMatch(one -> one.diffusivityVaries() == null && one.startVaries() == null);
    }

    /** A reading of a species, kg per kg of piece as loaded. */
    Dual perLoaded(State state, int species, int grade, Reading reading) {
        List<Population> populations = state.batch().classes(species).populations();
        Gauge gauge = grade < 0 ? new Gauge.OfLot() : new Gauge.Average(grade, populations.get(grade), reading);
        return perLoaded(state.read(species, gauge));
    }

    /** kg/m3 of piece as loaded, as kg per kg of it. */
    Dual perLoaded(Dual kgPerM3) {
        return kgPerM3.times(1 / density);
    }

    private double started(int species, int grade) {
        Species one = recipe.species().get(species);
        return StartContent.of(recipe, one, grade) / density;
    }

    /** Water in the mass at present: as stated at both ends, and straight in time between. */
    private static Dual share(State state, Moisture moisture) {
        double start = moisture.start().si();
        return state.elapsed().times(moisture.end().si() - start).plus(start);
    }

    /** Water in the mass as loaded, where the recipe tells. */
    double waterAsLoaded() {
        return Known.waterAsLoaded(recipe).orElseThrow();
    }
}
