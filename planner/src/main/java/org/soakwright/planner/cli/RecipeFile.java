package org.soakwright.planner.cli;

import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/** The name of a file of input. */
final class RecipeFile {
    private RecipeFile() {}

    /**
     * The path it names.
     *
     * @param label of the parameter it was given as
     */
    static Path path(String label, @Nullable String given) {
        if (given == null || given.isBlank()) {
            throw notAFile(label);
        }
        try {
            return Path.of(given);
        } catch (InvalidPathException e) {
            throw notAFile(label);
        }
    }

    private static Unsound notAFile(String label) {
        return new Unsound(Place.of(label), "this is no file name; name a file");
    }
}
