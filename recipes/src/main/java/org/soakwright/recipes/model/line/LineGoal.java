package org.soakwright.recipes.model.line;

import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Word;

/** What of a line is to be least. */
public enum LineGoal implements Word {
    /** Time after due, weighed by priority, over all lots. */
    LATENESS,
    /** From the start of the line until the last lot is done. */
    MAKESPAN,
    /** What the recipes' prices make of time and liquor. */
    COST,
    /** Moves that begin at night. */
    NIGHT_MOVES;

    /** Where nothing is stated: all that can be counted, in the order of this list; a cost in one currency. */
    public static List<LineGoal> defaults(Collection<Recipe> recipes) {
        List<LineGoal> goals = new ArrayList<>(List.of(values()));
        long currencies = recipes.stream()
                .flatMap(recipe -> recipe.currency().stream())
                .distinct()
                .count();
        if (currencies != 1) {
            goals.remove(COST);
        }
        return List.copyOf(goals);
    }
}
