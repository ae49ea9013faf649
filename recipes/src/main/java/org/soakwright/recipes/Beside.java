package org.soakwright.recipes;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
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
        Source source = Source.list(below(recipe, name, place));
        read.put(name, source);
        return source;
    }

    private static Path below(Path recipe, String name, Place place) {
        try {
            Path relative = Path.of(name);
            boolean leaves = relative.getRoot() != null;
            for (Path part : relative) {
                leaves |= part.toString().equals("..");
            }
            Path list = recipe.resolveSibling(relative);
            if (!leaves && !Files.exists(list)) {
                throw new Unsound(
                        place,
                        "there is no such list beside the recipe: found " + Shown.quoted(name) + "; check the name");
            }
            if (leaves
                    || !list.toRealPath().startsWith(recipe.resolveSibling("").toRealPath())) {
                throw elsewhere(name, place);
            }
            return list;
        } catch (InvalidPathException | IOException e) {
            throw elsewhere(name, place);
        }
    }

    private static Unsound elsewhere(String name, Place place) {
        return new Unsound(
                place,
                "a list lies in the folder of its recipe or below it: found " + Shown.quoted(name)
                        + "; write its name, such as thickness.csv");
    }

    /** Of the recipe, and of every list that was read. */
    String sha256(Source source) {
        if (read.isEmpty()) {
            return source.sha256();
        }
        StringBuilder sums = new StringBuilder(source.sha256()).append('\n');
        read.forEach((name, list) ->
                sums.append(list.sha256()).append("  ").append(name).append('\n'));
        return Source.sha256(sums.toString().getBytes(StandardCharsets.UTF_8));
    }
}
