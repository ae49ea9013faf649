package org.soakwright.recipes;

import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.parsing.Lists;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Shown;
import org.soakwright.recipes.text.Source;
import org.soakwright.recipes.text.Unsound;

/** The lists beside a recipe: in its folder or below it, never elsewhere. Each is read once. */
final class Beside implements Lists {
    private static final Neighbour NEIGHBOUR = new Neighbour("list", "recipe", "thickness.csv");

    private final @Nullable Path recipe;
    private final Map<String, Source> read = new LinkedHashMap<>();

    private Beside(@Nullable Path recipe) {
        this.recipe = recipe;
    }

    static Beside of(Path recipe) {
        return new Beside(recipe);
    }

    /** For a recipe that has no folder. */
    static Beside nothing() {
        return new Beside(null);
    }

    @Override
    public Source list(String name, Place place) {
        if (recipe == null) {
            throw new Unsound(
                    place,
                    "a list lies beside a recipe file, and this recipe was read from no file: found "
                            + Shown.quoted(name) + "; state the size, such as thickness: 18 mm");
        }
        Source known = read.get(name);
        if (known != null) {
            return known;
        }
        Source source = Source.list(NEIGHBOUR.path(recipe, name, place));
        read.put(name, source);
        return source;
    }

    /** Of the recipe, and of every list that was read. */
    String sha256(Source source) {
        if (read.isEmpty()) {
            return source.sha256();
        }
        Map<String, String> sums = new LinkedHashMap<>();
        read.forEach((name, list) -> sums.put(name, list.sha256()));
        return Neighbour.sha256(source, sums);
    }
}
