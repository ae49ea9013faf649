package org.soakwright.planner.cli;

import java.util.List;
import org.soakwright.recipes.model.line.Line;

/** Who checks a schedule against the rules of its line. */
interface Verifying {
    /** Nobody yet. */
    Verifying NOBODY = (line, json) -> {
        throw new Refusal(Exit.BAD_INPUT, "--verify is not computed yet; leave it out to plan the line again");
    };

    /** The rules that a result breaks, a sentence each. */
    List<String> broken(Line line, String json) throws Refusal;
}
