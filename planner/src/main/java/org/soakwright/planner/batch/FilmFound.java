package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import org.soakwright.recipes.model.Film;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Step;
import org.soakwright.solver.transport.Caution;
import org.soakwright.solver.transport.Correlation;
import org.soakwright.solver.transport.Estimate;

/**
 * A film that was worked out, for one species around one grade's pieces.
 *
 * @param reynolds 0 where no speed is part of it
 * @param schmidt kinematic viscosity of the liquor over the diffusivity of the solute in it
 * @param grashof 0 where no difference in density is part of it
 * @param sherwood coefficient times length over that diffusivity
 * @param coefficient on the liquor's side, m/s
 * @param within how far measured films lie from it, as a share
 * @param denser how much the density beside the pieces differs on average, kg/m3; empty where it moves nothing
 * @param worthSeconds how much of its step the film takes: so much shorter the step could be without it, to the same mean of the lot; empty
 *     where the step changes nothing
 * @param stepSeconds of the step that this was found for
 * @param correlations by which it was found
 * @param cautions what lies outside their ranges
 */
public record FilmFound(
        String step,
        String species,
        String piece,
        double reynolds,
        double schmidt,
        double grashof,
        double sherwood,
        double coefficient,
        double within,
        OptionalDouble denser,
        OptionalDouble worthSeconds,
        double stepSeconds,
        String correlations,
        List<String> cautions) {
    /** Of the step: how much longer it is made to see what a second in it is worth. */
    private static final double LONGER = 0.01;

    public FilmFound {
        cautions = List.copyOf(cautions);
    }

    /** Every film that is worked out, in the order of steps, species and grades. */
    static List<FilmFound> of(Batch batch, double[] seconds) {
        Recipe recipe = batch.recipe();
        List<FilmFound> found = new ArrayList<>();
        for (int i = 0; i < seconds.length; i++) {
            if (recipe.steps().get(i) instanceof Step.Wet wet && wet.film() instanceof Film.Computed) {
                Batch bare = new Batch(without(batch.written(), i));
                for (int s = 0; s < recipe.species().size(); s++) {
                    OptionalDouble worth = worth(batch, bare, seconds, i, s);
                    for (int j = 0; j < recipe.lot().grades().size(); j++) {
                        one(batch, seconds, i, s, j, worth).ifPresent(found::add);
                    }
                }
            }
        }
        return List.copyOf(found);
    }

    private static Optional<FilmFound> one(
            Batch batch, double[] seconds, int step, int s, int grade, OptionalDouble worth) {
        Recipe recipe = batch.recipe();
        Species species = recipe.species().get(s);
        return batch.films()
                .estimate(step, species, grade)
                .map(estimate -> new FilmFound(
                        recipe.steps().get(step).name(),
                        species.name(),
                        recipe.lot().grades().get(grade).name(),
                        estimate.groups().reynolds(),
                        estimate.groups().schmidt(),
                        estimate.groups().grashof(),
                        estimate.groups().sherwood(),
                        estimate.coefficient(),
                        estimate.within(),
                        batch.films().difference(step, grade),
                        worth,
                        seconds[step],
                        estimate.correlations().stream().map(Correlation::title).collect(Collectors.joining(", ")),
                        cautions(estimate)));
    }

    static List<String> cautions(Estimate estimate) {
        return estimate.cautions().stream().map(Caution::text).toList();
    }

    private static Recipe without(Recipe recipe, int step) {
        List<Step> steps = new ArrayList<>(recipe.steps());
        steps.set(step, ((Step.Wet) steps.get(step)).with(new Film.Negligible()));
        return recipe.withSteps(steps);
    }

    /** What the mean of the lot is behind, over what a second more brings. */
    private static OptionalDouble worth(Batch batch, Batch bare, double[] seconds, int step, int species) {
        double[] longer = seconds.clone();
        longer[step] *= 1 + LONGER;
        double with = mean(batch, seconds, step, species);
        double rate = (mean(batch, longer, step, species) - with) / (LONGER * seconds[step]);
        double worth = (mean(bare, seconds, step, species) - with) / rate;
        return Double.isFinite(worth) && worth >= 0 ? OptionalDouble.of(worth) : OptionalDouble.empty();
    }

    private static double mean(Batch batch, double[] seconds, int step, int species) {
        return batch.follow(seconds).end(step).means().get(species).value();
    }
}
