package org.soakwright.planner.cli;

import org.soakwright.planner.batch.Batch;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.StepTimes;
import org.soakwright.planner.report.BatchSheet;
import org.soakwright.planner.report.ResultJson;
import org.soakwright.planner.report.Stamp;
import org.soakwright.recipes.model.Recipe;
import picocli.CommandLine.Model.CommandSpec;

/** {@code follow}: computes a recipe as written. */
final class FollowCommand extends RecipeCommand {
    FollowCommand(Session session) {
        super(session);
    }

    @Override
    CommandSpec described(CommandSpec spec) {
        return Help.describe(
                spec,
                "follow",
                "follow loin-desalting.yaml",
                "Computes a recipe as written: what pieces and liquors hold at the end of each step.",
                "Exit status: 0 done, also when targets are missed, 2 bad input or usage, 3 internal error");
    }

    @Override
    Finding find(Recipe recipe, Stamp stamp, Session session) {
        Run run = new Batch(recipe).follow(StepTimes.definite(recipe));
        return new Finding(Exit.DONE, () -> BatchSheet.of(run, session.style()), () -> ResultJson.of(stamp, run));
    }
}
