package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.soakwright.recipes.library.Entry;
import org.soakwright.recipes.library.Library;
import org.soakwright.recipes.model.Diffusivity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;

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

    /** In the order of the recipe. */
    static List<Published> of(Recipe recipe) {
        List<Published> published = new ArrayList<>();
        for (Species species : recipe.species()) {
            add("diffusivity of " + species.name(), species.diffusivity().all(), published);
            Optional.ofNullable(species.traits().inLiquor())
                    .ifPresent(
                            one -> add("diffusivity of " + species.name() + " in the liquor", List.of(one), published));
        }
        return List.copyOf(published);
    }

    private static void add(String what, List<Diffusivity> stated, List<Published> published) {
        for (Diffusivity one : stated) {
            String from = one.from();
            if (from != null) {
                Entry entry = Shelf.LIBRARY.find(from).orElseThrow();
                published.add(new Published(what, one, entry, Shelf.LIBRARY.alike(entry)));
            }
        }
    }

    /** That the recipe computes with another value than its source gives; empty where it does not. */
    Optional<String> overruled() {
        double value = used.value().si();
        boolean inside =
                value >= entry.figure().least() && value <= entry.figure().most();
        return inside
                ? Optional.empty()
                : Optional.of("The " + what + " is computed with " + used.value() + ", which " + entry.name()
                        + " does not cover: it gives " + entry.figure() + " ("
                        + entry.origin().publication() + ").");
    }

    /** Read only where a recipe takes something from it. */
    private static final class Shelf {
        static final Library LIBRARY = Library.load();
    }
}
