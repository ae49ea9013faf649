package org.soakwright.planner.cli;

import java.time.LocalDateTime;
import java.util.Optional;
import org.soakwright.planner.batch.Plan;
import org.soakwright.planner.batch.Planner;
import org.soakwright.planner.report.BatchSheet;
import org.soakwright.planner.report.ResultJson;
import org.soakwright.planner.report.Stamp;
import org.soakwright.planner.report.page.Report;
import org.soakwright.recipes.model.Recipe;
import picocli.CommandLine.Model.CommandSpec;

/** {@code plan}: chooses what a recipe leaves free. */
final class PlanCommand extends RecipeCommand {
    private final Start start = new Start();

    PlanCommand(Session session) {
        super(session, true);
    }

    @Override
    CommandSpec described(CommandSpec spec) {
        return Help.describe(
                        spec,
                        "plan",
                        "plan loin-desalting.yaml --start 2026-03-02T06:00 --report loin-plan",
                        "Chooses the free times of a recipe so that every target is met in the least time or cost.",
                        "Exit status: 0 every target is met, 1 no choice meets them and the nearest miss is shown,",
                        "or a caution stops the plan until somebody answers for it,",
                        "2 bad input or usage, 3 internal error")
                .addOption(start.option());
    }

    @Override
    Finding find(Recipe recipe, Stamp stamp, Session session) throws Refusal {
        Optional<LocalDateTime> moment = start.moment();
        Plan plan = Planner.plan(recipe, session.line());
        return new Finding(
                plan.mayBeUsed() ? Exit.DONE : Exit.NO_PLAN,
                () -> BatchSheet.of(plan, moment, session.style()),
                () -> ResultJson.of(stamp, plan),
                () -> Report.of(plan, stamp, moment));
    }
}
