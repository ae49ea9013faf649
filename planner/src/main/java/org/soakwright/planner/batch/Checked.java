package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.soakwright.planner.conditions.Conversion;
import org.soakwright.planner.conditions.Known;
import org.soakwright.recipes.library.Entry;
import org.soakwright.recipes.library.Library;
import org.soakwright.recipes.model.Diffusivity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;

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
     * A value that a recipe takes from the library.
     *
     * @param what such as {@code diffusivity of salt}
     * @param used the value that is computed with
     * @param entry what the library says
     * @param others what it says of the same species in the same material elsewhere
     */
    public record Published(String what, Diffusivity used, Entry entry, List<Entry> others) {
        public Published {
            others = List.copyOf(others);
        }
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
                published(recipe),
                Cautions.of(recipe).shown());
    }

    private static List<Published> published(Recipe recipe) {
        List<Published> published = new ArrayList<>();
        for (Species species : recipe.species()) {
            List<Diffusivity> stated = new ArrayList<>(species.diffusivity().all());
            Optional.ofNullable(species.traits().inLiquor()).ifPresent(stated::add);
            for (Diffusivity one : stated) {
                String from = one.from();
                if (from != null) {
                    Library library = Shelf.LIBRARY;
                    Entry entry = library.find(from).orElseThrow();
                    published.add(new Published("diffusivity of " + species.name(), one, entry, library.alike(entry)));
                }
            }
        }
        return published;
    }

    /** Read only where a recipe takes something from it. */
    private static final class Shelf {
        static final Library LIBRARY = Library.load();
    }
}
