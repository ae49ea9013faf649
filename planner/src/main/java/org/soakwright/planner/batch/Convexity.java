package org.soakwright.planner.batch;

import org.soakwright.recipes.model.Counted;
import org.soakwright.recipes.model.Film;
import org.soakwright.recipes.model.Medium;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Start;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.Target;

/**
 * Where the best choice can be proven best. In unlimited liquor without the solute, from a uniform start, with one Biot number
 * of each side throughout, every mean is a sum of positive exponentials of sums over the steps; the logarithm of such a sum is convex in the
 * durations, so its tangents bound it everywhere.
 */
final class Convexity {
    private Convexity() {}

    /** Whether every target of the recipe is of that kind. */
    static boolean holds(Recipe recipe) {
        if (recipe.gapSeconds(0, recipe.steps().size()) > 0 || !uniformLiquor(recipe)) {
            return false;
        }
        for (Target target : recipe.targets()) {
            if (recipe.confidence(target).isPresent()) {
                // A percentile over samples is no sum of exponentials.
                return false;
            }
            if (target instanceof Target.OfPieces pieces) {
                Species species = recipe.species(pieces.species().name()).orElseThrow();
                boolean mean = pieces.reading() == org.soakwright.recipes.model.Reading.MEAN
                        && pieces.limits().atLeast() == null
                        && pieces.counted().equals(Counted.AS_LOADED)
                        // A share's percentile belongs to other pieces as durations change: no sum of exponentials.
                        && pieces.share() == null;
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
        boolean skins =
                species.traits().skin() != null || !species.traits().skins().isEmpty();
        if (skins || recipe.steps().stream().anyMatch(step -> ((Step.Wet) step).film() instanceof Film.Computed)) {
            return false;
        }
        double[] ratios = recipe.steps().stream()
                .mapToDouble(step -> ((Step.Wet) step).film() instanceof Film.Coefficient film
                        ? film.value().si()
                                / (Translation.diffusivity(species, step) * Translation.partition(species, step))
                        : Double.POSITIVE_INFINITY)
                .distinct()
                .toArray();
        boolean anyFilm = Double.isFinite(ratios[0]) || ratios.length > 1;
        boolean oneGrain = recipe.steps().stream()
                        .map(step -> Translation.grain(species, step))
                        .distinct()
                        .count()
                == 1;
        return ratios.length == 1 && (oneGrain || !anyFilm);
    }

    /**
     * A lower bound on a goal over all durations in a box that meet the requirements, grid or not: the least of goal plus multipliers
     * times tangents, valid for any multipliers at or above zero.
     *
     * @param at where the tangents are taken
     */
    static double bound(Box box, Linear goal, double[] at, double[] misses, double[][] slopes, double[] multipliers) {
        double sum = 0;
        double[] rate = goal.weights().clone();
        for (int i = 0; i < misses.length; i++) {
            double m = Math.max(0, multipliers[i]);
            sum += m * misses[i];
            for (int a = 0; a < at.length; a++) {
                rate[a] += m * slopes[i][a];
                sum -= m * slopes[i][a] * at[a];
            }
        }
        for (int a = 0; a < at.length; a++) {
            sum += Math.min(rate[a] * box.low(a), rate[a] * box.high(a));
        }
        return sum;
    }
}
