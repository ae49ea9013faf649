package org.soakwright.recipes;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.function.Supplier;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.parsing.RecipeReader;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Source;
import org.soakwright.recipes.text.Tree;
import org.soakwright.recipes.text.YamlReader;

/** Reads recipes. Nothing here throws for what a file holds: bad input comes back as its problems. */
public final class Recipes {
    /** The resource with the JSON Schema of the recipe file, beside this class. */
    public static final String SCHEMA = "recipe.schema.json";

    private Recipes() {}

    /** Reads the recipe in a file of UTF-8 YAML, of 1 MiB at most, and the lists it names beside it. */
    public static Outcome read(Path file) {
        return read(() -> Source.of(file), Beside.of(file));
    }

    /**
     * Reads the recipe in a text. It has no folder, so a list it names is a problem.
     *
     * @param fileName what to call it in messages
     */
    public static Outcome read(String fileName, String text) {
        return read(() -> Source.of(fileName, text.getBytes(StandardCharsets.UTF_8)), Beside.nothing());
    }

    private static Outcome read(Supplier<Source> supplier, Beside beside) {
        Problems problems = new Problems();
        Source source = problems.attempt(supplier);
        Recipe recipe = source == null ? null : recipe(source, beside, problems);
        return source == null || recipe == null
                ? new Outcome.Refused(problems.sorted())
                : new Outcome.Accepted(recipe, beside.sha256(source));
    }

    private static @Nullable Recipe recipe(Source source, Beside beside, Problems problems) {
        Tree tree = YamlReader.read(source.file(), source.text(), problems);
        Recipe recipe = tree == null ? null : RecipeReader.read(tree, beside, problems);
        return problems.isEmpty() ? recipe : null;
    }
}
