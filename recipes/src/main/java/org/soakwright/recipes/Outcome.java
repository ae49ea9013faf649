package org.soakwright.recipes;

import java.util.List;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.text.Problem;

/** What came of reading a recipe. */
public sealed interface Outcome {
    /**
     * A recipe all of whose parts agree.
     *
     * @param sha256 of the bytes read, in lower-case hexadecimal; with lists, of a text of one line each: the recipe's
     *     own sum, then the sum, two spaces and the name of each list in the order of the recipe
     */
    record Accepted(Recipe recipe, String sha256) implements Outcome {}

    /** Every problem found, unknown keys first, then in the order of the file; at least one. */
    record Refused(List<Problem> problems) implements Outcome {
        public Refused {
            problems = List.copyOf(problems);
            if (problems.isEmpty()) {
                throw new IllegalArgumentException("a refusal has a reason");
            }
        }
    }
}
