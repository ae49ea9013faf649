package org.soakwright.recipes;

import java.util.List;
import org.soakwright.recipes.model.line.Line;
import org.soakwright.recipes.text.Problem;

/** What came of reading a line. */
public sealed interface LineOutcome {
    /**
     * A line all of whose parts agree.
     *
     * @param sha256 in lower-case hexadecimal, of a text of one line each: the sum of the line's own bytes, then the sum,
     *     two spaces and the name of each file that it names, in its order; of a recipe the sum that {@link Outcome.Accepted} gives
     */
    record Accepted(Line line, String sha256) implements LineOutcome {}

    /** Every problem found in the line and what it names, unknown keys first, then in the order of each file; at least one. */
    record Refused(List<Problem> problems) implements LineOutcome {
        public Refused {
            problems = List.copyOf(problems);
            if (problems.isEmpty()) {
                throw new IllegalArgumentException("a refusal has a reason");
            }
        }
    }
}
