package org.soakwright.planner.cli;

import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.function.Supplier;
import org.soakwright.planner.report.Stamp;
import org.soakwright.recipes.Outcome;
import org.soakwright.recipes.Recipes;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problem;
import org.soakwright.recipes.text.Unsound;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.Model.PositionalParamSpec;

/** A command that reads one recipe and answers with a sheet and JSON. */
abstract class RecipeCommand implements Callable<Integer> {
    private final Session session;
    private final PositionalParamSpec recipe = PositionalParamSpec.builder()
            .type(String.class)
            .index("0")
            .arity("1")
            .required(true)
            .paramLabel("RECIPE")
            .description("the recipe, a YAML file")
            .build();
    private final OptionSpec json = OptionSpec.builder("--json")
            .type(String.class)
            .paramLabel("FILE")
            .description("write the result as JSON; - is standard output, then nothing else goes there")
            .build();
    private final OptionSpec quiet =
            Help.flag("--quiet", "print nothing but problems").build();

    RecipeCommand(Session session) {
        this.session = session;
    }

    /** The command with its name and its help, but without parameters. */
    abstract CommandSpec described(CommandSpec spec);

    final CommandSpec spec() {
        CommandSpec spec = described(CommandSpec.wrapWithoutInspection(this));
        spec.usageMessage().parameterListHeading("%n");
        spec.addPositional(recipe).addOption(json).addOption(quiet);
        return Help.withHelpAndVersion(spec);
    }

    /**
     * What a command found out.
     *
     * @param status the exit status
     * @param sheet for people
     * @param json for programs
     */
    record Finding(int status, Supplier<String> sheet, Supplier<String> json) {}

    /**
     * Does the work.
     *
     * @throws Unsound where the recipe cannot be computed
     */
    abstract Finding find(Recipe recipe, Stamp stamp, Session session);

    @Override
    public final Integer call() {
        try {
            return answer();
        } catch (Unsound unsound) {
            return refuse(unsound.problems());
        } catch (Refusal refusal) {
            session.say(String.valueOf(refusal.getMessage()));
            return refusal.status();
        }
    }

    private int answer() throws Refusal {
        String file = json.getValue();
        boolean toOut = JsonTarget.STANDARD_OUTPUT.equals(file);
        JsonTarget target = file == null || toOut ? null : JsonTarget.of(file);
        Outcome outcome = Recipes.read(path());
        if (outcome instanceof Outcome.Refused refused) {
            return refuse(refused.problems());
        }
        Outcome.Accepted accepted = (Outcome.Accepted) outcome;
        Finding finding = find(accepted.recipe(), new Stamp(Version.current(), accepted.sha256()), session);
        session.line().erase();
        if (target != null) {
            String text = finding.json().get();
            session.write(target.name(), () -> target.write(text));
        }
        if (toOut) {
            session.out().print(finding.json().get());
        } else if (!isQuiet()) {
            session.out().print(finding.sheet().get());
        }
        return finding.status();
    }

    private boolean isQuiet() {
        Boolean given = quiet.getValue();
        return Boolean.TRUE.equals(given);
    }

    private Path path() {
        String given = recipe.getValue();
        if (given == null || given.isBlank()) {
            throw notAFile();
        }
        try {
            return Path.of(given);
        } catch (InvalidPathException e) {
            throw notAFile();
        }
    }

    private static Unsound notAFile() {
        return new Unsound(Place.of("RECIPE"), "this is no file name; name a recipe file");
    }

    private int refuse(List<Problem> problems) {
        session.line().erase();
        problems.forEach(session.err()::println);
        session.say(problems.size() + (problems.size() == 1 ? " problem" : " problems") + "; nothing was computed");
        return Exit.BAD_INPUT;
    }
}
