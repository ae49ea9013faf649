package org.soakwright.planner.batch;

import java.util.Optional;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.text.Unsound;

/**
 * What it is worth that the lot starts at another temperature than its first step. Warming is not computed: every step is taken to be at
 * its own temperature throughout. Where that could matter the recipe is refused, else it is stated with the number.
 */
public final class Warming {
    /** m2/s, low for moist foods, gels and plastics (1e-7 to 1.5e-7, from memory, common practice): warming is not made quicker than it is. */
    private static final double THERMAL_DIFFUSIVITY = 1e-7;

    /** Fourier number at which the middle of a slab between two faces has made 95 % of the change: ln(4/(0.05 pi)) 4/pi^2. */
    private static final double WARMED = 1.31;

    /** Of the first step's shortest time: what warming may be worth and still be left out. */
    private static final double NEGLIGIBLE = 0.01;

    private Warming() {}

    /**
     * The statement; empty where the lot states no temperature of its own.
     *
     * @throws Unsound where leaving warming out would be wrong, at the lot's temperature
     */
    public static Optional<String> of(Recipe recipe) {
        Quantity lot = recipe.lot().temperature();
        Step first = recipe.steps().get(0);
        Quantity step = first.temperature();
        if (lot == null || step == null || lot.si() == step.si()) {
            return Optional.empty();
        }
        double deepest =
                recipe.lot().grades().stream().mapToDouble(Grade::depth).max().orElseThrow();
        double warming = WARMED * deepest * deepest / THERMAL_DIFFUSIVITY;
        double worth = 0;
        for (Species species : recipe.species()) {
            double there = Translation.diffusivity(species, first);
            double here =
                    Translation.diffusivity(species, first.with(first.head().withTemperature(lot)));
            worth = Math.max(worth, warming * Math.abs(here / there - 1));
        }
        String said = "the lot starts at " + lot + ", " + first.name() + " is at " + step
                + ": warming through takes about " + minutes(warming) + " and is worth at most "
                + minutes(worth) + " of that step";
        if (worth > NEGLIGIBLE * first.time().seconds(0)) {
            throw new Unsound(
                    lot.place(),
                    "temperature of the lot: warming is not computed yet by this version, and here it matters: " + said
                            + "; bring the lot to the step's temperature first, or remove it and allow for it");
        }
        return Optional.of("Left out: " + said + ".");
    }

    private static String minutes(double seconds) {
        return Durations.practical(60 * Math.ceil(seconds / 60));
    }
}
