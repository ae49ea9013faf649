package org.soakwright.planner.conditions;

import java.util.List;
import org.soakwright.recipes.model.Moisture;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Start;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problem;

/** Whether pieces can be what a recipe makes of them all together: nothing holds more than it weighs, or weighs less than nothing. */
final class Whole {
    private static final double ROUNDING = 1e-9;

    private Whole() {}

    /**
     * Adds what cannot be.
     *
     * @param species with their starts per mass as loaded
     */
    static void of(Recipe recipe, List<Species> species, List<Problem> problems) {
        starts(recipe, species, problems);
        gains(recipe, problems);
    }

    private static void starts(Recipe recipe, List<Species> species, List<Problem> problems) {
        Quantity density = recipe.lot().density();
        if (density == null) {
            return;
        }
        Moisture moisture = recipe.lot().moisture();
        double together = moisture == null ? 0 : moisture.start().si();
        for (Species one : species) {
            together += least(recipe, one) / density.si();
            if (together > 1 + ROUNDING) {
                problems.add(new Problem(
                        place(one),
                        "the pieces as loaded hold more than they weigh: found " + Math.round(1000 * together) / 10.0
                                + " % of their mass together with " + one.name() + "; write less of one of them"));
                return;
            }
        }
    }

    /** Of a profile the place that holds least: what is too much even so is too much everywhere. */
    private static double least(Recipe recipe, Species species) {
        return species.start() instanceof Start.Uniform uniform
                ? recipe.lot().kgPerM3(uniform.content())
                : ((Start.Profile) species.start())
                        .points().stream()
                                .mapToDouble(point -> recipe.lot().kgPerM3(point.content()))
                                .min()
                                .orElse(0);
    }

    private static Place place(Species species) {
        return species.start() instanceof Start.Uniform uniform
                ? uniform.content().place()
                : species.place();
    }

    private static void gains(Recipe recipe, List<Problem> problems) {
        double left = 1;
        for (Step step : recipe.steps()) {
            Quantity gain = step.head().gain();
            left += gain == null ? 0 : gain.si();
            if (gain != null && left < ROUNDING) {
                problems.add(new Problem(
                        gain.place(),
                        "the gains so far leave nothing of the lot: found \"" + gain + "\" after which "
                                + Math.round(1000 * left) / 10.0
                                + " % of its mass as loaded would be left; each counts against the mass as loaded"));
                return;
            }
        }
    }
}
