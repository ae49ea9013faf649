package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.text.Problem;
import org.soakwright.recipes.text.Unsound;

/** The durations a recipe itself names: one for each step, s. */
public final class StepTimes {
    private StepTimes() {}

    /**
     * The fixed or planned duration of every step.
     *
     * @throws Unsound where steps leave their time open, with one problem for each
     */
    public static double[] definite(Recipe recipe) {
        List<Problem> problems = new ArrayList<>();
        double[] seconds = new double[recipe.steps().size()];
        for (int i = 0; i < seconds.length; i++) {
            Step step = recipe.steps().get(i);
            Optional<Quantity> time = step.time().definite();
            if (time.isPresent()) {
                seconds[i] = time.get().si();
            } else {
                problems.add(new Problem(
                        step.time().place(),
                        "to follow a recipe every time is definite: found the time of " + step.name()
                                + " left free; add planned to it, such as planned: "
                                + Durations.practical(step.time().seconds(0)) + ", or plan the recipe"));
            }
        }
        if (!problems.isEmpty()) {
            throw new Unsound(problems);
        }
        return seconds;
    }

    /** The fixed or planned duration of every step, or where there is none the middle of its range, by logarithm. */
    static double[] nominal(Recipe recipe) {
        return recipe.steps().stream()
                .mapToDouble(step -> step.time()
                        .definite()
                        .map(Quantity::si)
                        .orElse(Math.sqrt(step.time().seconds(0)
                                * step.time().seconds(step.time().choices() - 1))))
                .toArray();
    }

    /** The shortest choice of every step: the hardest durations to compute. */
    public static double[] shortest(Recipe recipe) {
        return recipe.steps().stream()
                .mapToDouble(step -> step.time().seconds(0))
                .toArray();
    }

    /** The longest choice of every step. */
    static double[] longest(Recipe recipe) {
        return recipe.steps().stream()
                .mapToDouble(step -> step.time().seconds(step.time().choices() - 1))
                .toArray();
    }
}
