package org.soakwright.planner.report;

import java.util.Optional;
import org.soakwright.planner.batch.TargetState;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Target;

/** A target in words for tables and pictures, in which its grade and its confidence stand in places of their own. */
public final class TargetWords {
    private TargetWords() {}

    /** What is read, without the grade and the confidence: {@code salt mean in the water phase after drain}. */
    public static String name(Recipe recipe, TargetState state) {
        return name(recipe, state.target(), state.name(), state.grade());
    }

    /** The same of a name as {@link TargetState#name} has it. */
    static String name(Recipe recipe, Target target, String whole, Optional<String> grade) {
        String name = without(whole, grade.map(one -> ", " + one).orElse(""));
        return without(
                name,
                recipe.confidence(target)
                        .map(sure -> " with " + sure + " confidence")
                        .orElse(""));
    }

    private static String without(String text, String tail) {
        return text.endsWith(tail) ? text.substring(0, text.length() - tail.length()) : text;
    }

    /** {@code at least 3.5 %, 90 % sure}. */
    public static String limit(Recipe recipe, TargetState state) {
        return Wording.limit(state) + sure(recipe, state.target());
    }

    /** {@code , 90 % sure}; nothing where no confidence is asked for. */
    public static String sure(Recipe recipe, Target target) {
        return recipe.confidence(target).map(TargetWords::sure).orElse("");
    }

    private static String sure(Quantity confidence) {
        return ", " + confidence + " sure";
    }
}
