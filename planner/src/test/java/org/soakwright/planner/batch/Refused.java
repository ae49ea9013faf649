package org.soakwright.planner.batch;

import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.stream.Collectors;
import org.soakwright.recipes.Outcome;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.text.Problem;
import org.soakwright.recipes.text.Unsound;

/** Recipes that must be refused, when they are read or when they are made ready: with problems that have places, and nothing else. */
final class Refused {
    private Refused() {}

    /** What is said of it, each problem in a line. */
    static String said(String... lines) {
        String text = Arrays.stream(lines).collect(Collectors.joining("\n", "", "\n"));
        Outcome outcome = org.soakwright.recipes.Recipes.read("test.yaml", text);
        if (outcome instanceof Outcome.Refused refused) {
            return said(refused.problems());
        }
        Recipe recipe = ((Outcome.Accepted) outcome).recipe();
        Unsound unsound = assertThrows(Unsound.class, () -> used(recipe), text);
        return said(unsound.problems());
    }

    /** All that a check and a plan do. */
    static void used(Recipe recipe) {
        Checked.of(recipe);
        Batch batch = new Batch(recipe);
        Run run = batch.follow(StepTimes.nominal(recipe));
        for (int i = 0; i < recipe.steps().size(); i++) {
            run.end(i);
        }
        run.targets();
        Cautions.of(run);
    }

    private static String said(List<Problem> problems) {
        assertFalse(problems.isEmpty());
        for (Problem problem : problems) {
            assertTrue(problem.toString().matches("(?s)test\\.yaml:[1-9][0-9]*:[1-9][0-9]*: .+"), problem.toString());
        }
        return problems.stream().map(Problem::toString).collect(Collectors.joining("\n"));
    }
}
