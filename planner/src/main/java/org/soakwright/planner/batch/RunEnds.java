package org.soakwright.planner.batch;

import java.util.List;
import org.soakwright.recipes.library.RecipeFacts;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Reading;
import org.soakwright.recipes.model.Recipe;

/** What the pieces of a run hold at its end, for the cautions to be tested on. */
final class RunEnds implements RecipeFacts.Ends {
    private final Run run;

    RunEnds(Run run) {
        this.run = run;
    }

    @Override
    public List<Double> piece(String species, Reading reading) {
        Recipe recipe = run.batch().recipe();
        Quantity density = recipe.lot().density();
        if (density == null) {
            return List.of();
        }
        StepEnd end = run.end(recipe.steps().size() - 1);
        return end.pieces().stream()
                .flatMap(piece -> piece.species().stream())
                .filter(content -> content.species().equals(species))
                .map(content -> content.value(reading) / recipe.lot().express(density.si(), content.unit()))
                .toList();
    }

    @Override
    public List<Double> waterPhase(String species, Reading reading) {
        return List.of();
    }
}
