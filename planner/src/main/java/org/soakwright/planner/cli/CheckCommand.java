package org.soakwright.planner.cli;

import java.util.List;
import org.soakwright.planner.batch.AsInfinite;
import org.soakwright.planner.batch.Batch;
import org.soakwright.planner.batch.Cautions;
import org.soakwright.planner.batch.Groups;
import org.soakwright.planner.batch.StepTimes;
import org.soakwright.planner.conditions.Known;
import org.soakwright.planner.report.CheckJson;
import org.soakwright.planner.report.CheckSheet;
import org.soakwright.planner.report.Stamp;
import org.soakwright.recipes.model.Recipe;
import picocli.CommandLine.Model.CommandSpec;

/** {@code check}: whether a recipe is sound, and what decides each of its steps. */
final class CheckCommand extends RecipeCommand {
    CheckCommand(Session session) {
        super(session, false);
    }

    @Override
    CommandSpec described(CommandSpec spec) {
        return Help.describe(
                spec,
                "check",
                "check loin-desalting.yaml",
                "Finds every problem of a recipe and shows what decides each step: film or inside, early or late.",
                "Exit status: 0 the recipe is sound, 2 it has problems or the command has, 3 internal error");
    }

    @Override
    Finding find(Recipe written, Stamp stamp, Session session) {
        Recipe recipe = Known.of(written).recipe();
        // What is too short to be computed shows now rather than when it is followed.
        new Batch(recipe).follow(StepTimes.shortest(recipe));
        List<Groups.Group> groups = Groups.of(recipe);
        List<AsInfinite> shapes = AsInfinite.of(recipe);
        List<String> cautions = Cautions.of(recipe).shown();
        return new Finding(
                Exit.DONE,
                () -> CheckSheet.of(recipe, groups, shapes, cautions, session.style()),
                () -> CheckJson.of(stamp, recipe, groups, shapes, cautions));
    }
}
