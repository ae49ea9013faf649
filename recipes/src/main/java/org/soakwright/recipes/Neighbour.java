package org.soakwright.recipes;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.Map;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Shown;
import org.soakwright.recipes.text.Source;
import org.soakwright.recipes.text.Unsound;

/**
 * A file that another one names: it lies in the folder of that one or below it, never elsewhere.
 *
 * @param what it is, for messages
 * @param whose what names it
 * @param example a name of one
 */
record Neighbour(String what, String whose, String example) {
    /** Where it lies. */
    Path path(Path of, String name, Place place) {
        try {
            Path relative = Path.of(name);
            boolean leaves = relative.getRoot() != null;
            for (Path part : relative) {
                leaves |= part.toString().equals("..");
            }
            Path path = of.resolveSibling(relative);
            if (!leaves && !Files.exists(path)) {
                throw new Unsound(
                        place,
                        "there is no such " + what + " beside the " + whose + ": found " + Shown.quoted(name)
                                + "; check the name");
            }
            if (leaves || !path.toRealPath().startsWith(of.resolveSibling("").toRealPath())) {
                throw elsewhere(name, place);
            }
            return path;
        } catch (InvalidPathException | IOException e) {
            throw elsewhere(name, place);
        }
    }

    private Unsound elsewhere(String name, Place place) {
        return new Unsound(
                place,
                "a " + what + " lies in the folder of its " + whose + " or below it: found " + Shown.quoted(name)
                        + "; write its name, such as " + example);
    }

    /** Of a file and all that it names. */
    static String sha256(Source source, Map<String, String> others) {
        StringBuilder sums = new StringBuilder(source.sha256()).append('\n');
        others.forEach((name, sum) -> sums.append(sum).append("  ").append(name).append('\n'));
        return Source.sha256(sums.toString().getBytes(StandardCharsets.UTF_8));
    }
}
