package org.soakwright.planner.conditions;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.soakwright.recipes.model.Air;
import org.soakwright.recipes.model.Content;
import org.soakwright.recipes.model.Moisture;
import org.soakwright.recipes.model.Per;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Start;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.text.Problem;
import org.soakwright.recipes.text.Unsound;

/**
 * A recipe in the bases that are computed in: liquors in mass per volume, pieces per mass as loaded. What was written otherwise was
 * converted. A recipe that is in them already stays as it is.
 *
 * @param recipe the same recipe so
 * @param conversions what was worked out, in the order of the file
 */
public record Known(Recipe recipe, List<Conversion> conversions) {
    public Known {
        conversions = List.copyOf(conversions);
    }

    /**
     * Converts what needs it.
     *
     * @throws Unsound with everything that the recipe does not tell enough of
     */
    public static Known of(Recipe written) {
        List<Conversion> conversions = new ArrayList<>();
        List<Problem> problems = new ArrayList<>();
        List<Species> species = written.species().stream()
                .map(one -> loaded(written, one, conversions))
                .toList();
        List<Step> steps = new ArrayList<>();
        for (Step step : Strengths.resolved(written, conversions, problems)) {
            steps.add(step instanceof Step.Dry dry ? loaded(written, dry, conversions) : step);
        }
        Whole.of(written, species, problems);
        if (!problems.isEmpty()) {
            throw new Unsound(problems);
        }
        conversions.addAll(Movements.of(written));
        boolean same = species.equals(written.species()) && steps.equals(written.steps());
        return new Known(same ? written : written.with(species, steps), conversions);
    }

    /** The part of the pieces' mass as loaded that is water; empty where the recipe does not say. */
    public static OptionalDouble waterAsLoaded(Recipe recipe) {
        Moisture moisture = recipe.lot().moisture();
        if (moisture != null) {
            return OptionalDouble.of(moisture.start().si());
        }
        return recipe.water()
                .map(Species::start)
                .filter(Start.Uniform.class::isInstance)
                .map(start -> ((Start.Uniform) start).content())
                .map(content -> OptionalDouble.of(
                        content.per() == Per.DRY
                                ? content.si() / (1 + content.si())
                                : recipe.lot().kgPerM3(content) / density(recipe)))
                .orElse(OptionalDouble.empty());
    }

    private static double density(Recipe recipe) {
        Quantity density = recipe.lot().density();
        if (density == null) {
            throw new IllegalStateException("a recipe that counts by mass states the density of its lot");
        }
        return density.si();
    }

    private static Species loaded(Recipe recipe, Species species, List<Conversion> conversions) {
        if (species.start() instanceof Start.Uniform uniform
                && uniform.content().per() == Per.DRY) {
            Content content = loaded(recipe, uniform.content(), species.name() + " as loaded", conversions);
            return species.with(new Start.Uniform(content));
        }
        return species;
    }

    private static Step loaded(Recipe recipe, Step.Dry step, List<Conversion> conversions) {
        Map<String, Content> equilibrium = new LinkedHashMap<>(step.air().equilibrium());
        equilibrium.replaceAll((name, content) -> content.per() == Per.DRY
                ? loaded(recipe, content, name + " in equilibrium with the air of " + step.name(), conversions)
                : content);
        return new Step.Dry(step.head(), new Air(step.air().place(), equilibrium), step.film());
    }

    /** Per dry mass times the part of the mass as loaded that is dry. */
    private static Content loaded(Recipe recipe, Content content, String what, List<Conversion> conversions) {
        double dry = 1
                - waterAsLoaded(recipe)
                        .orElseThrow(() -> new Unsound(
                                content.place(),
                                "a content per dry mass needs the water of the pieces as loaded: found \"" + content
                                        + "\"; declare the species water with one start, or add moisture to the lot"));
        Quantity derived = Quantity.derived(content.si() * dry, content.unit(), content.place());
        conversions.add(new Conversion(
                what,
                content + " per dry mass",
                derived + " per mass as loaded",
                Quantity.derived(100 * dry, org.soakwright.recipes.text.Unit.ONE, content.place())
                                .written()
                        + " % of the mass as loaded is dry"));
        return new Content(derived.with(content.amount().giveOrTake()));
    }
}
