package org.soakwright.recipes.model;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problem;

/**
 * One liquor goes and the next one comes while the pieces stay in the vessel, drained.
 *
 * @param drain until the old liquor is out, 0 or more
 * @param refill until the new one is in, 0 or more; not both are 0
 */
public record Changeover(Place place, Quantity drain, Quantity refill) {
    public Changeover {
        List<Problem> problems = new ArrayList<>();
        problems.addAll(Rules.ifNegative("`drain`", drain));
        problems.addAll(Rules.ifNegative("`refill`", refill));
        problems.addAll(Rules.ifTooLong(drain));
        problems.addAll(Rules.ifTooLong(refill));
        if (drain.si() == 0 && refill.si() == 0) {
            problems.add(new Problem(
                    place,
                    "a changeover takes time: found \"" + drain + "\" and \"" + refill
                            + "\"; write a time above zero for one of them, or remove changeover"));
        }
        Rules.require(problems);
    }

    /** How long the pieces stay drained, s; above 0. */
    public double seconds() {
        return drain.si() + refill.si();
    }
}
