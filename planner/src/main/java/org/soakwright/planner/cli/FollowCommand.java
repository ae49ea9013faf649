package org.soakwright.planner.cli;

import java.time.LocalDateTime;
import java.util.Optional;
import org.soakwright.planner.batch.Batch;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.StepTimes;
import org.soakwright.planner.report.BatchSheet;
import org.soakwright.planner.report.ResultJson;
import org.soakwright.planner.report.Stamp;
import org.soakwright.planner.report.page.Report;
import org.soakwright.recipes.model.Recipe;
import picocli.CommandLine.Model.CommandSpec;

/** {@code follow}: computes a recipe as written. */
final class FollowCommand extends RecipeCommand {
    private final Start start = new Start();

    FollowCommand(Session session) {
        super(session, true);
    }

    @Override
    CommandSpec described(CommandSpec spec) {
        return Help.describe(
                        spec,
                        "follow",
                        "follow loin-desalting.yaml --report loin-followed",
                        "Computes a recipe as written: what pieces and liquors hold at the end of each step.",
                        "Exit status: 0 done, also when targets are missed, 2 bad input or usage, 3 internal error")
                .addOption(start.option());
    }

    @Override
    Finding find(Recipe recipe, Stamp stamp, Session session) throws Refusal {
        Optional<LocalDateTime> moment = start.moment();
        Run run = new Batch(recipe).follow(StepTimes.definite(recipe)).judged(session.line());
        return new Finding(
                Exit.DONE,
                () -> BatchSheet.of(run, moment, session.style()),
                () -> ResultJson.of(stamp, run),
                () -> Report.of(run, stamp, moment));
    }
}
