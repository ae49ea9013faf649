package org.soakwright.planner.cli;

import java.util.concurrent.Callable;
import org.soakwright.planner.report.Stamp;
import org.soakwright.recipes.Outcome;
import org.soakwright.recipes.Recipes;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.text.Unsound;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.PositionalParamSpec;

/** A command that reads one recipe and answers with a sheet, JSON and perhaps a report. */
abstract class RecipeCommand implements Callable<Integer> {
    private static final String LABEL = "RECIPE";

    private final Session session;
    private final Outputs outputs;
    private final PositionalParamSpec recipe = PositionalParamSpec.builder()
            .type(String.class)
            .index("0")
            .arity("1")
            .required(true)
            .paramLabel(LABEL)
            .description("the recipe, a YAML file")
            .build();

    /**
     * A command.
     *
     * @param reports whether it has a report to write
     */
    RecipeCommand(Session session, boolean reports) {
        this.session = session;
        outputs = new Outputs(session, reports);
    }

    /** The command with its name and its help, but without the parameters that all have. */
    abstract CommandSpec described(CommandSpec spec);

    final CommandSpec spec() {
        CommandSpec spec = described(CommandSpec.wrapWithoutInspection(this));
        spec.usageMessage().parameterListHeading("%n");
        spec.addPositional(recipe);
        outputs.addTo(spec);
        return Help.withHelpAndVersion(spec);
    }

    /**
     * Does the work.
     *
     * @throws Unsound where the recipe cannot be computed
     * @throws Refusal where the command cannot be obeyed
     */
    abstract Finding find(Recipe recipe, Stamp stamp, Session session) throws Refusal;

    @Override
    public final Integer call() {
        return outputs.of(this::answer);
    }

    private Finding answer() throws Refusal {
        Outcome outcome = Recipes.read(RecipeFile.path(LABEL, recipe.getValue()));
        if (outcome instanceof Outcome.Refused refused) {
            throw new Unsound(refused.problems());
        }
        Outcome.Accepted accepted = (Outcome.Accepted) outcome;
        return find(accepted.recipe(), new Stamp(Version.current(), accepted.sha256()), session);
    }
}
