package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Diffusivities;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Spread;
import org.soakwright.recipes.model.Target;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problem;
import org.soakwright.recipes.text.Unsound;

/** What a recipe can say and the solver cannot compute yet: refused at its place, never ignored. */
final class NotYet {
    private NotYet() {}

    static void check(Recipe recipe) {
        List<Problem> problems = new ArrayList<>();
        recipe.lot().grades().forEach(grade -> {
            if (grade.sides().size() > 1) {
                problems.add(problem(grade.place(), "a " + grade.shape().word()));
            }
            problems.addAll(spread(grade.spread(), "spread"));
        });
        recipe.species().forEach(species -> {
            if (species.diffusivity() instanceof Diffusivities.ByGrain byGrain) {
                problems.add(problem(byGrain.place(), "a diffusivity by direction"));
            }
            problems.addAll(spread(species.startVaries(), "varies"));
            problems.addAll(spread(species.diffusivityVaries(), "varies"));
        });
        recipe.steps()
                .forEach(step -> step.head().overrides().diffusivity().values().stream()
                        .filter(Diffusivities.ByGrain.class::isInstance)
                        .forEach(own -> problems.add(problem(own.place(), "a diffusivity by direction"))));
        recipe.targets().forEach(target -> {
            if (target instanceof Target.OfPieces pieces && pieces.share() != null) {
                problems.add(problem(pieces.share().place(), "share"));
            }
        });
        if (!problems.isEmpty()) {
            throw new Unsound(problems);
        }
    }

    private static List<Problem> spread(@Nullable Spread spread, String what) {
        return spread == null ? List.of() : List.of(problem(spread.place(), what));
    }

    private static Problem problem(Place place, String what) {
        return new Problem(place, what + ": not computed yet by this version; remove it");
    }
}
