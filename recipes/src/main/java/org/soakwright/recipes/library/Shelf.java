package org.soakwright.recipes.library;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.function.Supplier;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Source;
import org.soakwright.recipes.text.Tree;
import org.soakwright.recipes.text.Unsound;
import org.soakwright.recipes.text.YamlReader;

/** The data files packaged beside these classes. */
final class Shelf {
    private Shelf() {}

    static Source source(String file) {
        try (InputStream in = Shelf.class.getResourceAsStream(file)) {
            if (in == null) {
                throw new IllegalStateException("the library lacks " + file);
            }
            return Source.of(file, in.readAllBytes());
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    static Tree tree(Source source) {
        Problems problems = new Problems();
        Tree tree = YamlReader.read(source.file(), source.text(), problems);
        if (tree == null || !problems.isEmpty()) {
            throw new Unsound(problems.sorted());
        }
        return tree;
    }

    /** A number without a unit where a whole one belongs. */
    static int whole(String key, Tree tree) {
        String text = Card.text(key, tree);
        try {
            return Integer.parseInt(text);
        } catch (NumberFormatException e) {
            throw new Unsound(tree.place(), key + " is a whole number: found \"" + text + "\"; write such as 2010");
        }
    }

    /** What the supplier reads. Data that cannot be read are a fault of the build, not of any recipe. */
    static <T> T sound(Supplier<T> supplier) {
        try {
            return supplier.get();
        } catch (Unsound unsound) {
            throw new IllegalStateException("the library cannot be read: " + unsound.getMessage(), unsound);
        }
    }
}
