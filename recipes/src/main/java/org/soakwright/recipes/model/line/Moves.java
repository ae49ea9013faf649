package org.soakwright.recipes.model.line;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problem;
import org.soakwright.recipes.text.Unsound;

/**
 * What lifting a lot into, between or out of vessels needs.
 *
 * @param takes how long, whole minutes, from 0
 * @param atOnce how many lots are on the move at any time at most: the hoists, 1 to 999
 * @param heads of the crew that each needs while it lasts, 1 to 999
 * @param hangsAtMost how much longer than {@code takes} pieces may hang in the air, whole minutes; null is not at all
 */
public record Moves(
        Place place,
        Quantity takes,
        int atOnce,
        int heads,
        @Nullable Quantity hangsAtMost) {
    /** Needed where nothing is stated. */
    public static final int USUAL_HEADS = 1;

    private static final int MOST = 999;

    public Moves {
        List<Problem> problems = new ArrayList<>(Minutes.ifNone("a move", takes, "15 min"));
        problems.addAll(Minutes.ifNone("the time that pieces hang", hangsAtMost, "10 min"));
        if (atOnce < 1 || atOnce > MOST) {
            problems.add(new Problem(
                    place, "1 to " + MOST + " moves happen at once: found " + atOnce + "; write such as at-once: 1"));
        }
        if (heads < 1 || heads > MOST) {
            problems.add(new Problem(
                    place, "a move needs 1 to " + MOST + " heads: found " + heads + "; write such as heads: 1"));
        }
        if (!problems.isEmpty()) {
            throw new Unsound(problems);
        }
    }

    public long seconds() {
        return Math.round(takes.si());
    }

    public long hangsSeconds() {
        return hangsAtMost == null ? 0 : Math.round(hangsAtMost.si());
    }
}
