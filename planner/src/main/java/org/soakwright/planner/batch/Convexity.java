package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.soakwright.recipes.model.Film;
import org.soakwright.recipes.model.Medium;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Start;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.Target;

/**
 * Where the best choice can be proven best. In unlimited liquor without the solute, from a uniform start, with one Biot number
 * throughout, every mean is a sum of positive exponentials of sums over the steps; the logarithm of such a sum is convex in the
 * durations, so its tangents bound it everywhere.
 */
final class Convexity {
    /** Grid points looked at before a proof is given up. */
    private static final int MOST_POINTS = 200_000;

    private Convexity() {}

    /** Whether every target of the recipe is of that kind. */
    static boolean holds(Recipe recipe) {
        if ((recipe.between() != null && recipe.between().si() > 0) || !uniformLiquor(recipe)) {
            return false;
        }
        for (Target target : recipe.targets()) {
            if (target instanceof Target.OfPieces pieces) {
                Species species = recipe.species(pieces.species().name()).orElseThrow();
                boolean mean = pieces.reading() == org.soakwright.recipes.model.Reading.MEAN
                        && pieces.limits().atLeast() == null;
                if (!mean
                        || !(species.start() instanceof Start.Uniform)
                        || !species.exchangesWith(Medium.LIQUOR)
                        || !withoutSolute(recipe, species)
                        || !oneBiot(recipe, species)) {
                    return false;
                }
            } else if (!(target instanceof Target.OfTotal)) {
                return false;
            }
        }
        return true;
    }

    private static boolean uniformLiquor(Recipe recipe) {
        return recipe.steps().stream()
                .allMatch(step -> step instanceof Step.Wet wet && wet.liquor().isUnlimited());
    }

    private static boolean withoutSolute(Recipe recipe, Species species) {
        return recipe.steps().stream()
                .allMatch(step -> ((Step.Wet) step).liquor().kgPerM3(species.name()) == 0);
    }

    private static boolean oneBiot(Recipe recipe, Species species) {
        double[] ratios = recipe.steps().stream()
                .mapToDouble(step -> ((Step.Wet) step).film() instanceof Film.Coefficient film
                        ? film.value().si()
                                / (Translation.diffusivity(species, step) * Translation.partition(species, step))
                        : Double.POSITIVE_INFINITY)
                .distinct()
                .toArray();
        return ratios.length == 1;
    }

    /**
     * Tries to show that no grid point beats a known one: those the tangents allow are followed.
     *
     * @return a lower bound on the blended goal over all durations, grid or not; empty when the proof did not succeed
     */
    static Optional<Double> proveBest(
            Grid grid, Landscape landscape, Merit merit, Descent.End relaxed, double[] known) {
        double[] at = relaxed.free();
        Run run = landscape.run(at);
        double[] misses = landscape.misses(run);
        double[][] slopes = landscape.gradients(run);
        List<double[]> candidates = new ArrayList<>();
        if (!gather(grid, merit, at, misses, slopes, known, new int[grid.size()], 0, candidates, new int[1])) {
            return Optional.empty();
        }
        for (double[] candidate : candidates) {
            if (landscape.worst(candidate) <= -GridSearch.ROOM) {
                return Optional.empty();
            }
        }
        return Optional.of(bound(grid, merit, at, misses, slopes, relaxed.multipliers()));
    }

    /** Minimum over the ranges of goal plus multipliers times tangents: a lower bound for any multipliers at or above zero. */
    private static double bound(
            Grid grid, Merit merit, double[] at, double[] misses, double[][] slopes, double[] multipliers) {
        double sum = 0;
        double[] rate = merit.weights().clone();
        for (int i = 0; i < misses.length; i++) {
            double m = Math.max(0, multipliers[i]);
            sum += m * misses[i];
            for (int a = 0; a < at.length; a++) {
                rate[a] += m * slopes[i][a];
                sum -= m * slopes[i][a] * at[a];
            }
        }
        for (int a = 0; a < at.length; a++) {
            sum += Math.min(rate[a] * grid.low(a), rate[a] * grid.high(a));
        }
        return sum;
    }

    private static boolean gather(
            Grid grid,
            Merit merit,
            double[] at,
            double[] misses,
            double[][] slopes,
            double[] known,
            int[] choice,
            int depth,
            List<double[]> found,
            int[] looked) {
        if (++looked[0] > MOST_POINTS) {
            return false;
        }
        if (depth == choice.length) {
            double[] values = grid.values(choice);
            if (merit.compare(values, known) < 0) {
                found.add(values);
            }
            return true;
        }
        for (int c = 0; c < grid.choices(depth); c++) {
            choice[depth] = c;
            if (cheapest(grid, merit, choice, depth) > merit.blended(known)) {
                break;
            }
            if (possible(grid, at, misses, slopes, choice, depth)
                    && !gather(grid, merit, at, misses, slopes, known, choice, depth + 1, found, looked)) {
                return false;
            }
        }
        return true;
    }

    private static double cheapest(Grid grid, Merit merit, int[] choice, int depth) {
        double sum = 0;
        for (int a = 0; a < choice.length; a++) {
            sum += merit.weights()[a] * (a <= depth ? grid.value(a, choice[a]) : grid.low(a));
        }
        return sum;
    }

    private static boolean possible(
            Grid grid, double[] at, double[] misses, double[][] slopes, int[] choice, int depth) {
        for (int i = 0; i < misses.length; i++) {
            double least = misses[i];
            for (int a = 0; a < at.length; a++) {
                if (a <= depth) {
                    least += slopes[i][a] * (grid.value(a, choice[a]) - at[a]);
                } else {
                    least += Math.min(slopes[i][a] * (grid.low(a) - at[a]), slopes[i][a] * (grid.high(a) - at[a]));
                }
            }
            if (least > 0) {
                return false;
            }
        }
        return true;
    }
}
