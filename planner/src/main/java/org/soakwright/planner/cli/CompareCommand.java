package org.soakwright.planner.cli;

import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import org.soakwright.planner.batch.Batch;
import org.soakwright.planner.batch.Plan;
import org.soakwright.planner.batch.Planner;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.StepTimes;
import org.soakwright.planner.report.BatchSheet;
import org.soakwright.planner.report.Findings;
import org.soakwright.planner.report.ResultJson;
import org.soakwright.planner.report.Stamp;
import org.soakwright.planner.report.compare.Comparison;
import org.soakwright.planner.report.compare.ComparisonFindings;
import org.soakwright.planner.report.compare.ComparisonJson;
import org.soakwright.planner.report.compare.Side;
import org.soakwright.planner.report.page.ComparisonReport;
import org.soakwright.recipes.Outcome;
import org.soakwright.recipes.Recipes;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.text.Source;
import org.soakwright.recipes.text.Unsound;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.PositionalParamSpec;

/** {@code compare}: two recipes or results side by side. */
final class CompareCommand implements Callable<Integer> {
    private static final Pattern RESULT = Pattern.compile("\\s*\\{\\s*\"soakwright\"\\s*:.*", Pattern.DOTALL);

    private final Session session;
    private final Outputs outputs;
    private final PositionalParamSpec first = parameter("A", 0);
    private final PositionalParamSpec second = parameter("B", 1);

    CompareCommand(Session session) {
        this.session = session;
        outputs = new Outputs(session, true);
    }

    private static PositionalParamSpec parameter(String label, int index) {
        return PositionalParamSpec.builder()
                .type(String.class)
                .index(Integer.toString(index))
                .arity("1")
                .required(true)
                .paramLabel(label)
                .description(
                        index == 0
                                ? "a recipe, or a result that follow or plan wrote with --json"
                                : "another one; a recipe is planned where it leaves a time open, else followed")
                .build();
    }

    CommandSpec spec() {
        CommandSpec spec = Help.describe(
                CommandSpec.wrapWithoutInspection(this),
                "compare",
                "compare three-waters.yaml four-waters.yaml",
                "Sets two recipes or results side by side: steps, totals, targets, contents and their differences.",
                "Exit status: 0 done, also when targets are missed, 2 bad input or usage, 3 internal error");
        spec.usageMessage().parameterListHeading("%n");
        spec.addPositional(first).addPositional(second);
        outputs.addTo(spec);
        return Help.withHelpAndVersion(spec);
    }

    @Override
    public Integer call() {
        return outputs.of(this::answer);
    }

    /** A side with, where it was computed here, what it was read off. */
    private record Computed(Side side, Optional<Run> run) {}

    private Finding answer() {
        Computed a = side("A", first.getValue());
        Computed b = side("B", second.getValue());
        Comparison comparison = Comparison.of(a.side(), b.side());
        Findings findings = ComparisonFindings.of(comparison);
        return new Finding(
                Exit.DONE,
                () -> BatchSheet.of(findings, session.style()),
                () -> ComparisonJson.of(Version.current(), comparison),
                () -> ComparisonReport.of(Version.current(), comparison, findings, a.run(), b.run()));
    }

    private Computed side(String label, @Nullable String given) {
        Path path = RecipeFile.path(label, given);
        Source source = Source.of(path);
        String name = String.valueOf(path.getFileName());
        if (RESULT.matcher(source.text()).matches()) {
            return new Computed(
                    Side.read(source.file(), "a result", source.text()).called(name), Optional.empty());
        }
        Outcome outcome = Recipes.read(path);
        if (outcome instanceof Outcome.Refused refused) {
            throw new Unsound(refused.problems());
        }
        Outcome.Accepted accepted = (Outcome.Accepted) outcome;
        Recipe recipe = accepted.recipe();
        Stamp stamp = new Stamp(Version.current(), accepted.sha256());
        boolean definite =
                recipe.steps().stream().allMatch(step -> step.time().definite().isPresent());
        if (definite) {
            Run run = new Batch(recipe).follow(StepTimes.definite(recipe)).judged(session.line());
            return new Computed(Side.read(name, "followed as written", ResultJson.of(stamp, run)), Optional.of(run));
        }
        Plan plan = Planner.plan(recipe, session.line());
        String how = plan.met() ? "planned" : "planned, nearest miss";
        return new Computed(Side.read(name, how, ResultJson.of(stamp, plan)), Optional.of(plan.run()));
    }
}
