package org.soakwright.planner.cli;

import java.nio.file.Path;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import org.soakwright.planner.line.LinePlan;
import org.soakwright.planner.line.LinePlanner;
import org.soakwright.planner.line.Options;
import org.soakwright.planner.line.verify.Verification;
import org.soakwright.planner.report.Figures;
import org.soakwright.planner.report.Stamp;
import org.soakwright.planner.report.line.LineFindings;
import org.soakwright.planner.report.line.LineJson;
import org.soakwright.planner.report.line.LineReport;
import org.soakwright.planner.report.line.LineSheet;
import org.soakwright.planner.report.line.VerifiedSheet;
import org.soakwright.recipes.LineOutcome;
import org.soakwright.recipes.Lines;
import org.soakwright.recipes.model.line.Line;
import org.soakwright.recipes.text.Document;
import org.soakwright.recipes.text.Shown;
import org.soakwright.recipes.text.Source;
import org.soakwright.recipes.text.Unsound;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.Model.PositionalParamSpec;

/** {@code line}: schedules many lots on the vessels of a plant. */
final class LineCommand implements Callable<Integer> {
    static final String NAME = "line";

    private static final String LABEL = "LINE";

    private final Session session;
    private final Outputs outputs;
    private final PositionalParamSpec line = PositionalParamSpec.builder()
            .type(String.class)
            .index("0")
            .arity("1")
            .required(true)
            .paramLabel(LABEL)
            .description("the line, a YAML file; recipes and the list of lots lie beside it")
            .build();
    private final OptionSpec effort = OptionSpec.builder("--effort")
            .type(String.class)
            .paramLabel("N")
            .description("how much work to spend on a better schedule, some seconds each, 0 to "
                    + Figures.written(Options.MOST_EFFORT) + "; " + Figures.written(Options.USUAL_EFFORT)
                    + " if not given")
            .build();
    private final OptionSpec decoupled = Help.flag(
                    "--decoupled", "plan each recipe alone and keep its times: for comparison")
            .build();
    private final OptionSpec verify = OptionSpec.builder("--verify")
            .type(String.class)
            .paramLabel("RESULT")
            .description("plan nothing: check a result of line, written with --json, against every rule of the line")
            .build();

    LineCommand(Session session) {
        this.session = session;
        outputs = new Outputs(session, true);
    }

    CommandSpec spec() {
        CommandSpec spec = Help.describe(
                CommandSpec.wrapWithoutInspection(this),
                NAME,
                "line quayside-hall.yaml --report week-10",
                "Schedules many lots on vessels, crew and hoists, with what goes on in the pieces inside.",
                "Exit status: 0 every lot is in time and meets its targets, or a result checked breaks no rule,",
                "1 a lot is late or misses a target and the best schedule is shown, a caution stops the plan",
                "until somebody answers for it, or a result checked breaks a rule,",
                "2 bad input or usage, 3 internal error");
        spec.usageMessage().parameterListHeading("%n");
        spec.addPositional(line);
        outputs.addTo(spec);
        spec.addOption(effort).addOption(decoupled).addOption(verify);
        return Help.withHelpAndVersion(spec);
    }

    @Override
    public Integer call() {
        return outputs.of(this::answer);
    }

    private Finding answer() throws Refusal {
        Options options = options();
        LineOutcome outcome = Lines.read(RecipeFile.path(LABEL, line.getValue()));
        if (outcome instanceof LineOutcome.Refused refused) {
            throw new Unsound(refused.problems());
        }
        LineOutcome.Accepted accepted = (LineOutcome.Accepted) outcome;
        Stamp stamp = new Stamp(Version.current(), accepted.sha256());
        String result = verify.getValue();
        return result == null ? planned(accepted.line(), options, stamp) : verified(accepted.line(), result, stamp);
    }

    private Finding planned(Line read, Options options, Stamp stamp) {
        LinePlan plan = LinePlanner.plan(read, options, session.line());
        return new Finding(
                LineFindings.of(plan).met() ? Exit.DONE : Exit.NO_PLAN,
                () -> LineSheet.of(plan, session.style()),
                () -> LineJson.of(stamp, plan),
                () -> LineReport.of(plan, stamp));
    }

    private Finding verified(Line read, String result, Stamp stamp) throws Refusal {
        if (outputs.wantsReport()) {
            throw new Refusal(Exit.BAD_INPUT, "--verify writes no report; leave --report out");
        }
        Path path = RecipeFile.path("RESULT", result);
        Verification.Verdict verdict =
                Verification.of(read, Source.of(path, Document.RESULT).text());
        return new Finding(
                verdict.isFine() ? Exit.DONE : Exit.NO_PLAN,
                () -> VerifiedSheet.of(read, verdict, session.style()),
                () -> VerifiedSheet.json(stamp, read, verdict));
    }

    private Options options() throws Refusal {
        return new Options(seconds(effort.getValue()), Boolean.TRUE.equals(decoupled.<Boolean>getValue()));
    }

    static double seconds(@Nullable String given) throws Refusal {
        if (given == null) {
            return Options.USUAL_EFFORT;
        }
        double number;
        try {
            number = Double.parseDouble(given.strip());
        } catch (NumberFormatException e) {
            throw refuse(given, e);
        }
        if (!(number >= 0 && number <= Options.MOST_EFFORT)) {
            throw refuse(given, null);
        }
        return number;
    }

    private static Refusal refuse(String given, @Nullable Throwable cause) {
        String message = "--effort " + Shown.quoted(given) + " is no number from 0 to "
                + Figures.written(Options.MOST_EFFORT) + ", such as 30";
        return cause == null ? new Refusal(Exit.BAD_INPUT, message) : new Refusal(Exit.BAD_INPUT, message, cause);
    }
}
