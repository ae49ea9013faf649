package org.soakwright.recipes.parsing;

import java.util.Objects;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Tree;

/**
 * That a grade's sizes were measured: in which list, and how many grades it is to make.
 *
 * @param file as the recipe names it; null where it could not be read
 * @param grades 1, or how many were asked for; 0 where that could not be read
 */
record Measured(Place place, @Nullable String file, int grades) {
    private static final String EXAMPLE = "thickness.csv";
    private static final int MOST_GRADES = 20;

    static @Nullable Measured read(Values values, @Nullable Tree tree) {
        if (tree == null) {
            return null;
        }
        if (!(tree instanceof Tree.Entries)) {
            return new Measured(tree.place(), values.name("measured", tree, EXAMPLE), 1);
        }
        Fields fields = Fields.of(tree, Section.MEASURED, values.problems());
        if (fields == null) {
            return new Measured(tree.place(), null, 0);
        }
        Tree file = fields.need("file", EXAMPLE);
        Tree grades = fields.get("grades");
        return new Measured(
                file == null ? fields.place() : file.place(),
                values.name("file", file, EXAMPLE),
                grades == null ? 1 : count(values, grades));
    }

    private static int count(Values values, Tree tree) {
        Long count = values.count("grades", tree, "3");
        if (count != null && (count < 2 || count > MOST_GRADES)) {
            values.problems()
                    .add(
                            tree.place(),
                            "a list makes 2 to " + MOST_GRADES + " grades: found " + count
                                    + "; write such as 3, or leave grades out for one");
            return 0;
        }
        return count == null ? 0 : count.intValue();
    }

    boolean isWhole() {
        return file != null && grades > 0;
    }

    /** The file, of a whole one. */
    String named() {
        return Objects.requireNonNull(file);
    }
}
