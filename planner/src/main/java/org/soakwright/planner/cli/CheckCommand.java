package org.soakwright.planner.cli;

import org.soakwright.planner.batch.Checked;
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
    Finding find(Recipe recipe, Stamp stamp, Session session) {
        Checked checked = Checked.of(recipe);
        return new Finding(
                Exit.DONE, () -> CheckSheet.of(checked, session.style()), () -> CheckJson.of(stamp, checked));
    }
}
