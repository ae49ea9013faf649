package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import org.soakwright.recipes.model.Goal;
import org.soakwright.recipes.model.Recipe;

/**
 * Chooses the free durations of a recipe: the best point of their grid that meets every target. Small grids are gone through whole;
 * larger ones by descents from fixed starts, then on the grid around the best of their ends. Deterministic.
 */
public final class Planner {
    private static final int SEEDED_STARTS = 5;
    private static final long SEED = 20_260_301;
    /** Ends whose goals differ by less, as shares of the goal's span over the grid, are the same end. */
    private static final double AGREED = 1e-5;

    private final Batch batch;
    private final Grid grid;
    private final Merit merit;
    private final Landscape landscape;
    private final GridSearch search;

    private Planner(Recipe recipe) {
        batch = new Batch(recipe);
        grid = new Grid(recipe);
        merit = new Merit(batch, grid);
        landscape = new Landscape(batch, grid);
        search = new GridSearch(grid, landscape, merit);
    }

    /**
     * The best durations on the grid or, where none meet the targets, the nearest miss and changes that would help.
     *
     * @throws org.soakwright.recipes.text.Unsound when a step is too short to be computed
     */
    public static Plan plan(Recipe recipe, Progress progress) {
        progress.at("choosing durations", 0);
        Planner planner = new Planner(recipe);
        Choice choice = planner.choose();
        Run run = planner.landscape.run(choice.free());
        boolean met = choice.met();
        Explanation explanation = new Explanation(planner.batch, planner.grid, run);
        List<String> binds = met ? explanation.binding() : explanation.missed();
        return new Plan(
                run,
                met,
                choice.proof(),
                met ? binds : List.of(),
                explanation.perHour(binds),
                met ? Optional.empty() : explanation.nearestMiss(),
                met ? List.of() : Remedies.of(recipe, progress));
    }

    /** Only the choice, without explanations; empty where no choice meets the targets. */
    static Optional<Run> best(Recipe recipe) {
        Planner planner = new Planner(recipe);
        Choice choice = planner.choose();
        return choice.met() ? Optional.of(planner.landscape.run(choice.free())) : Optional.empty();
    }

    private record Choice(double[] free, boolean met, Plan.Proof proof) {}

    private Choice choose() {
        if (grid.points() <= GridSearch.WHOLE) {
            GridSearch.Found found = search.whole();
            OptionalDouble bound = found.met() && merit.first() == Goal.TIME
                    ? OptionalDouble.of(merit.first(found.free()))
                    : OptionalDouble.empty();
            return choice(found, Plan.Claim.EXHAUSTIVE, 1, 1, bound);
        }
        List<double[]> starts = starts();
        List<Descent.End> ends = new ArrayList<>();
        Descent descent = new Descent(grid, landscape, merit.weights(), false, Double.POSITIVE_INFINITY);
        for (double[] start : starts) {
            ends.add(descent.from(start));
        }
        Optional<Descent.End> best =
                ends.stream().filter(Descent.End::met).min(java.util.Comparator.comparingDouble(Descent.End::cost));
        Descent.End inside = inside(starts, best);
        if (best.isPresent()) {
            Descent.End relaxed = best.get();
            int agreed = (int) ends.stream()
                    .filter(end -> end.met() && end.cost() <= relaxed.cost() + AGREED)
                    .count();
            Optional<GridSearch.Found> found = search.around(relaxed.free(), inside.free());
            if (found.isPresent()) {
                return proven(found.get(), relaxed, starts.size(), agreed);
            }
        }
        GridSearch.Found miss = search.closest(inside.free());
        return choice(miss, Plan.Claim.LOCAL, starts.size(), agreeing(ends), OptionalDouble.empty());
    }

    private static int agreeing(List<Descent.End> ends) {
        double least = ends.stream().mapToDouble(Descent.End::miss).min().orElse(0);
        return (int) ends.stream()
                .filter(end -> end.miss() <= least + AGREED * Math.max(1, Math.abs(least)))
                .count();
    }

    private Choice proven(GridSearch.Found found, Descent.End relaxed, int starts, int agreed) {
        if (Convexity.holds(batch.recipe())) {
            Optional<Double> bound = Convexity.proveBest(grid, landscape, merit, relaxed, found.free());
            if (bound.isPresent()) {
                return choice(found, Plan.Claim.GLOBAL, starts, agreed, secondsOf(bound.get(), found));
            }
        }
        return choice(found, Plan.Claim.LOCAL, starts, agreed, OptionalDouble.empty());
    }

    /** A bound on the blended goal as one on the total time, where time is what is minimised. */
    private OptionalDouble secondsOf(double blended, GridSearch.Found found) {
        if (merit.first() != Goal.TIME) {
            return OptionalDouble.empty();
        }
        double perSecond = merit.weights()[0];
        return OptionalDouble.of(merit.first(found.free()) + (blended - merit.blended(found.free())) / perSecond);
    }

    private Choice choice(GridSearch.Found found, Plan.Claim claim, int starts, int agreed, OptionalDouble bound) {
        return new Choice(found.free(), found.met(), new Plan.Proof(claim, starts, agreed, bound, batch.evaluations()));
    }

    /** The place with most room: from the longest durations, the middle, or the best descent's end. */
    private Descent.End inside(List<double[]> starts, Optional<Descent.End> best) {
        Descent towards = new Descent(grid, landscape, merit.weights(), true, Double.POSITIVE_INFINITY);
        Descent.End inside = towards.from(starts.get(0));
        int tries = best.isPresent() ? 2 : starts.size();
        for (int i = 1; i < tries; i++) {
            Descent.End other = towards.from(starts.get(i));
            inside = other.miss() < inside.miss() ? other : inside;
        }
        return inside;
    }

    /** Shares of the ranges: the longest, the middle, the shortest, and some drawn from a fixed seed. */
    private List<double[]> starts() {
        SplittableRandom random = new SplittableRandom(SEED);
        List<double[]> starts = new ArrayList<>();
        for (double share : new double[] {1, 0.5, 0.02}) {
            double[] start = new double[grid.size()];
            java.util.Arrays.fill(start, share);
            starts.add(start);
        }
        for (int i = 0; i < SEEDED_STARTS; i++) {
            double[] start = new double[grid.size()];
            for (int a = 0; a < start.length; a++) {
                start[a] = random.nextDouble();
            }
            starts.add(start);
        }
        return starts;
    }
}
