package org.soakwright.planner.batch;

import java.util.List;
import org.soakwright.planner.conditions.Conversion;
import org.soakwright.planner.conditions.Known;
import org.soakwright.recipes.model.Recipe;

/**
 * What can be said of a sound recipe before it is followed.
 *
 * @param recipe in the bases that are computed in
 * @param conversions what was worked out of what is written
 * @param films that were worked out
 * @param published what the recipe takes from the library
 */
public record Checked(
        Recipe recipe,
        List<Groups.Group> groups,
        List<AsInfinite> shapes,
        List<Conversion> conversions,
        List<FilmFound> films,
        List<Published> published,
        List<String> cautions) {
    public Checked {
        groups = List.copyOf(groups);
        shapes = List.copyOf(shapes);
        conversions = List.copyOf(conversions);
        films = List.copyOf(films);
        published = List.copyOf(published);
        cautions = List.copyOf(cautions);
    }

    /**
     * Looks a recipe over.
     *
     * @throws org.soakwright.recipes.text.Unsound where it cannot be computed: what is too short shows now rather than when it is followed
     */
    public static Checked of(Recipe written) {
        Known known = Known.of(written);
        Recipe recipe = known.recipe();
        Batch batch = new Batch(written);
        batch.follow(StepTimes.shortest(recipe));
        double[] nominal = StepTimes.nominal(recipe);
        return new Checked(
                recipe,
                Groups.of(recipe),
                AsInfinite.of(recipe),
                known.conversions(),
                FilmFound.of(batch, nominal),
                Published.of(recipe),
                Cautions.of(recipe).shown());
    }
}
