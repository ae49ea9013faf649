package org.soakwright.planner.cli;

import java.util.List;
import org.soakwright.recipes.model.line.Line;

/** Where the independent checker of schedules is asked. */
final class Verifying {
    private Verifying() {}

    /**
     * The rules that a result breaks, a sentence each.
     *
     * @throws Refusal until there is a checker
     */
    static List<String> of(Line line, String json) throws Refusal {
        throw new Refusal(
                Exit.BAD_INPUT,
                "--verify is not computed yet; leave it out to plan " + line.title() + " again (a result of "
                        + json.length() + " characters was read)");
    }
}
