package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import org.soakwright.recipes.model.Goal;
import org.soakwright.recipes.model.Recipe;

/**
 * Chooses the free durations of a recipe: the best point of their grid that meets every target. Small grids are gone through whole;
 * larger ones by descents from fixed starts and branching over the grid between their ends. Goals are taken one after the other, each
 * kept while the next is made least. Deterministic.
 */
public final class Planner {
    private static final int SEEDED_STARTS = 5;
    private static final long SEED = 20_260_301;
    /** Ends whose goals differ by less, as shares of the goal's span over the grid, are the same end. */
    private static final double AGREED = 1e-5;

    private static final int MOST_NUDGES = 400;

    /** Choices made again for films that belong to other durations. */
    private static final int MOST_ROUNDS = 5;

    private final Batch batch;
    private final Grid grid;
    private final Merit merit;
    private final Landscape landscape;
    private final Progress progress;

    Planner(Batch batch, Progress progress) {
        this.progress = progress;
        this.batch = batch;
        grid = new Grid(batch.recipe());
        merit = new Merit(batch, grid);
        landscape = new Landscape(batch, grid);
        // The shortest durations need most modes: what cannot be computed is refused here, not when a search happens on
        // it.
        landscape.run(grid.lowest());
    }

    /**
     * The best durations on the grid or, where none meet the targets, the nearest miss and changes that would help.
     *
     * @throws org.soakwright.recipes.text.Unsound when a step is too short to be computed
     */
    public static Plan plan(Recipe recipe, Progress progress) {
        Chosen chosen = settled(new Batch(recipe), progress);
        Run run = chosen.run();
        Explanation explanation = new Explanation(run.batch(), new Grid(recipe), run);
        List<String> binds = chosen.met() ? explanation.binding() : explanation.missed();
        return new Plan(
                run,
                chosen.met(),
                chosen.proof(),
                chosen.met() ? binds : List.of(),
                explanation.perHour(binds),
                chosen.met() ? Optional.empty() : explanation.nearestMiss(),
                chosen.met() ? List.of() : Remedies.of(run, progress));
    }

    /**
     * Where the liquor is moved by its own density, its film belongs to steps of certain durations: chosen again until the durations are
     * those the film belongs to, or the next would be within a grain.
     */
    private static Chosen settled(Batch batch, Progress progress) {
        Chosen chosen = Chosen.of(batch, progress);
        for (int round = 0; round < MOST_ROUNDS && batch.films().anyDriven(); round++) {
            double[] seconds = chosen.run().seconds();
            Chosen next = Chosen.of(batch.resettled(seconds), progress);
            boolean rests = Arrays.equals(next.run().seconds(), seconds);
            chosen = next;
            if (rests) {
                break;
            }
        }
        return chosen;
    }

    /** Only the choice, without explanations or judgement; empty where no choice meets the targets. */
    static Optional<Run> best(Batch batch) {
        Planner planner = new Planner(batch, Progress.NONE);
        Choice choice = planner.choose();
        return choice.met() ? Optional.of(planner.landscape.run(choice.free())) : Optional.empty();
    }

    /** The same; targets with a confidence are met as judged by many samples. */
    static Optional<Run> sure(Batch batch) {
        if (!batch.assurance().any()) {
            return best(batch);
        }
        Optional<Run> promising = best(batch);
        return promising.isPresent() ? Chosen.of(batch, Progress.NONE).ifMet() : promising;
    }

    record Choice(double[] free, boolean met, Plan.Proof proof) {}

    Run run(Choice choice) {
        return landscape.run(choice.free());
    }

    Choice choose() {
        progress.at("choosing durations", 0);
        if (grid.points() <= WholeGrid.MOST_POINTS) {
            Found found = WholeGrid.best(grid, landscape, merit);
            OptionalDouble bound = found.met() && merit.first() == Goal.TIME
                    ? OptionalDouble.of(batch.cost().of(Goal.TIME, grid.seconds(found.free())))
                    : OptionalDouble.empty();
            return choice(found, Plan.Claim.EXHAUSTIVE, 1, 1, bound);
        }
        List<double[]> starts = starts();
        List<Descent.End> ends = new ArrayList<>();
        Descent descent = Descent.toLeast(merit.sum(0), Box.whole(grid), landscape, List.of());
        for (double[] start : starts) {
            progress.at("choosing durations", (double) ends.size() / (2 * starts.size()));
            ends.add(descent.from(start));
        }
        Optional<Descent.End> best = ends.stream()
                .filter(Descent.End::met)
                .min(Comparator.comparingDouble(end -> merit.sum(0).of(end.free())));
        double[] inside = inside(starts, best.isPresent()).free();
        if (best.isPresent()) {
            double least = merit.sum(0).of(best.get().free());
            int agreed = (int) ends.stream()
                    .filter(end -> end.met() && merit.sum(0).of(end.free()) <= least + AGREED)
                    .count();
            Optional<Choice> choice = branched(best.get(), inside, starts.size(), agreed);
            if (choice.isPresent()) {
                return choice.get();
            }
        }
        return choice(
                shortened(nudged(inside)), Plan.Claim.LOCAL, starts.size(), agreeing(ends), OptionalDouble.empty());
    }

    private static int agreeing(List<Descent.End> ends) {
        double least = ends.stream().mapToDouble(Descent.End::miss).min().orElse(0);
        return (int) ends.stream()
                .filter(end -> end.miss() <= least + AGREED * Math.max(1, Math.abs(least)))
                .count();
    }

    /** Goal by goal, those before it capped at what was reached. */
    private Optional<Choice> branched(Descent.End relaxed, double[] inside, int starts, int agreed) {
        // A step that its pieces warm in counts for more the longer it lasts: its decay is no exponential of the clock.
        boolean convex = Convexity.holds(batch.recipe()) && !batch.isLagging();
        List<Linear.Cap> caps = new ArrayList<>();
        Found found = null;
        boolean complete = true;
        Descent.End from = relaxed;
        for (int g = 0; g < merit.size() && (g == 0 || merit.undecidedAfter(g)); g++) {
            progress.at("choosing durations", 0.5 + 0.5 * g / merit.size());
            Linear goal = merit.sum(g);
            if (found != null) {
                from = Descent.toLeast(goal, Box.whole(grid), landscape, caps).from(found.free());
                if (!from.met()) {
                    break;
                }
            }
            Branching.Outcome outcome =
                    new Branching(grid, landscape, merit, goal, caps, convex, found).from(from, inside);
            if (outcome.best().isEmpty()) {
                return Optional.empty();
            }
            found = outcome.best().get();
            complete &= outcome.complete();
            caps.add(new Linear.Cap(goal, goal.of(found.free()) + Merit.SAME));
        }
        if (found == null) {
            return Optional.empty();
        }
        Plan.Claim claim = convex && complete ? Plan.Claim.GLOBAL : Plan.Claim.LOCAL;
        return Optional.of(choice(
                found, claim, starts, agreed, claim == Plan.Claim.GLOBAL ? bound(relaxed) : OptionalDouble.empty()));
    }

    /** A proven bound on the total time, where time is what is minimised. */
    private OptionalDouble bound(Descent.End relaxed) {
        if (merit.first() != Goal.TIME) {
            return OptionalDouble.empty();
        }
        Run run = landscape.run(relaxed.free());
        double share = Convexity.bound(
                Box.whole(grid),
                merit.sum(0),
                relaxed.free(),
                landscape.misses(run),
                landscape.gradients(run),
                relaxed.multipliers());
        double slack = merit.sum(0).of(relaxed.free()) - share;
        return OptionalDouble.of(run.totals().seconds() - slack * merit.span(0));
    }

    /** Of a percentile over samples nothing is proven, whatever was gone through. */
    private Choice choice(Found found, Plan.Claim claim, int starts, int agreed, OptionalDouble bound) {
        boolean sampled = batch.assurance().any();
        return new Choice(
                found.free(),
                found.met(),
                new Plan.Proof(
                        sampled ? Plan.Claim.LOCAL : claim,
                        starts,
                        agreed,
                        sampled ? OptionalDouble.empty() : bound,
                        batch.evaluations()));
    }

    /** The place with most room: from the longest durations and the middle; from every start where none met the targets. */
    private Descent.End inside(List<double[]> starts, boolean met) {
        Descent towards = Descent.toNearest(Box.whole(grid), landscape, List.of());
        Descent.End inside = towards.from(starts.get(0));
        int tries = met ? 2 : starts.size();
        for (int i = 1; i < tries; i++) {
            progress.at("looking for the nearest miss", (double) i / tries);
            Descent.End other = towards.from(starts.get(i));
            inside = other.miss() < inside.miss() ? other : inside;
        }
        return inside;
    }

    /** The nearest miss on the grid: rounded, then moved a choice at a time as long as that helps. */
    private Found nudged(double[] at) {
        int[] choice = new int[grid.size()];
        for (int a = 0; a < choice.length; a++) {
            choice[a] = grid.below(a, at[a]);
        }
        Found best = Found.of(landscape, grid.values(choice));
        boolean moved = true;
        for (int nudges = 0; moved && nudges < MOST_NUDGES; nudges++) {
            moved = false;
            for (int a = 0; a < choice.length; a++) {
                for (int by = -1; by <= 1; by += 2) {
                    int[] other = choice.clone();
                    other[a] += by;
                    if (other[a] >= 0 && other[a] < grid.choices(a)) {
                        Found found = Found.of(landscape, grid.values(other));
                        if (found.miss() < best.miss()) {
                            best = found;
                            choice = other;
                            moved = true;
                        }
                    }
                }
            }
        }
        return best;
    }

    /** Towards the shortest durations, as far as the miss stays alike. */
    private Found shortened(Found miss) {
        double[] lowest = grid.lowest();
        double few = 0;
        double enough = 1;
        Found found = miss;
        for (int i = 0; i < 20; i++) {
            double share = 0.5 * (few + enough);
            double[] less = new double[lowest.length];
            for (int a = 0; a < less.length; a++) {
                int choice = grid.below(a, lowest[a] + share * (miss.free()[a] - lowest[a]));
                less[a] = grid.value(a, choice);
            }
            Found other = Found.of(landscape, less);
            boolean alike = other.miss() <= miss.miss() + Found.ALIKE;
            found = alike ? other : found;
            few = alike ? few : share;
            enough = alike ? share : enough;
        }
        return found;
    }

    /** The longest durations, the middle, the shortest, and some drawn from a fixed seed. */
    private List<double[]> starts() {
        SplittableRandom random = new SplittableRandom(SEED);
        Box whole = Box.whole(grid);
        List<double[]> starts = new ArrayList<>();
        for (double share : new double[] {1, 0.5, 0.02}) {
            double[] start = new double[grid.size()];
            Arrays.fill(start, share);
            starts.add(whole.at(start));
        }
        for (int i = 0; i < SEEDED_STARTS; i++) {
            double[] start = new double[grid.size()];
            for (int a = 0; a < start.length; a++) {
                start[a] = random.nextDouble();
            }
            starts.add(whole.at(start));
        }
        return starts;
    }
}
