package org.soakwright.planner.batch;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.soakwright.recipes.model.Medium;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.Time;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Unsound;
import org.soakwright.solver.chain.Probe;

/**
 * A moment within a step at which the liquor is read, and what to do when the reading is off. A reading that is off is taken for pieces
 * that diffuse faster or slower than the recipe says: the steps that remain are planned again with that diffusivity.
 *
 * @param step from 0
 * @param seconds in liquor since the step's beginning
 * @param clock after the step's beginning by the clock, which runs on between fills
 * @param species whose content is read
 * @param expected g/L
 */
public record Checkpoint(
        int step, double seconds, double clock, String species, double expected, List<Deviation> deviations) {
    /** The diffusivities tried, as shares of the recipe's. */
    private static final double[] FACTORS = {0.8, 1.25};

    private static final double[] MOMENTS = {1.0 / 3, 2.0 / 3};

    /** Readings nearer to the expected one than this, relatively, tell nothing: meters and samples are no better. */
    private static final double TELLING = 0.03;

    /** How many times its planned duration a step may last when nothing else is free. */
    private static final double STRETCH = 3;

    /**
     * A reading that is off.
     *
     * @param reading g/L
     * @param factor of the diffusivity that explains it
     * @param seconds new durations of all steps, those before as they were; empty where none meets the targets
     * @param added change of the whole batch, s
     */
    public record Deviation(double reading, double factor, List<Double> seconds, OptionalDouble added) {
        public Deviation {
            seconds = List.copyOf(seconds);
        }
    }

    public Checkpoint {
        deviations = List.copyOf(deviations);
    }

    /** Two for each step in a vessel, of the species that the first target looks at, or of the first that is read there. */
    public static List<Checkpoint> of(Run run) {
        Recipe recipe = run.batch().recipe();
        Optional<Species> watched = watched(recipe);
        List<Checkpoint> all = new ArrayList<>();
        if (watched.isEmpty()) {
            return all;
        }
        List<Batch> others = new ArrayList<>();
        for (double factor : FACTORS) {
            // What an advice for a deviation of a fifth needs is good enough in a sketch.
            others.add(run.holding(Batch.sketch(withDiffusivity(recipe, watched.get(), factor), -1)));
        }
        for (int i = 0; i < recipe.steps().size(); i++) {
            Step step = recipe.steps().get(i);
            boolean vessel = step instanceof Step.Wet wet && !wet.liquor().isUnlimited();
            if (vessel) {
                double before = 0;
                for (double moment : MOMENTS) {
                    double seconds = clocked(moment, run.seconds()[i]);
                    if (seconds > before && seconds < run.seconds()[i]) {
                        all.add(at(run, others, i, watched.get().name(), seconds));
                    }
                    before = seconds;
                }
            }
        }
        return List.copyOf(all);
    }

    /** To a quarter of an hour in long steps, to five minutes or one in short ones. */
    private static double clocked(double moment, double planned) {
        double grain = planned > 4 * 3600 ? 900 : planned > 1800 ? 300 : 60;
        return Math.max(grain, grain * Math.rint(moment * planned / grain));
    }

    /**
     * What going on as planned ends with when the liquor reads something between what is expected and what a deviation explains; the
     * target that is then missed by most, empty where all are met.
     */
    public Optional<TargetState> goingOnAt(Run run, Deviation explained, double read) {
        double share = (read - expected) / (explained.reading() - expected);
        double factor = 1 + share * (explained.factor() - 1);
        Recipe recipe = run.batch().recipe();
        Species watched = recipe.species(species).orElseThrow();
        Run other = run.holding(Batch.sketch(withDiffusivity(recipe, watched, factor), -1))
                .follow(run.seconds());
        return other.batch().requirements().stream()
                .filter(requirement -> !other.meets(requirement))
                .max(Comparator.comparingDouble(other::miss))
                .map(requirement -> TargetState.of(other, requirement));
    }

    private static Optional<Species> watched(Recipe recipe) {
        return recipe.targets().stream()
                .filter(org.soakwright.recipes.model.Target.OfPieces.class::isInstance)
                .map(target -> ((org.soakwright.recipes.model.Target.OfPieces) target)
                        .species()
                        .name())
                .flatMap(name -> recipe.species(name).stream())
                .filter(species -> species.exchangesWith(Medium.LIQUOR))
                .findFirst()
                .or(() -> recipe.species().stream()
                        .filter(species -> species.exchangesWith(Medium.LIQUOR))
                        .findFirst());
    }

    private static Checkpoint at(Run run, List<Batch> others, int step, String species, double seconds) {
        double expected = reading(run.batch(), run.seconds(), step, seconds, species);
        List<Deviation> deviations = new ArrayList<>();
        for (int f = 0; f < FACTORS.length; f++) {
            double reading = reading(others.get(f), run.seconds(), step, seconds, species);
            if (Math.abs(reading - expected) > TELLING * Math.max(Math.abs(expected), Math.abs(reading))) {
                deviations.add(deviation(run, others.get(f), step, seconds, reading, FACTORS[f]));
            }
        }
        Step at = run.batch().recipe().steps().get(step);
        int fill = fillAt(seconds, run.seconds()[step] / at.fills(), at.fills());
        double clock = seconds + fill * at.gapBetweenFills().seconds();
        return new Checkpoint(step, seconds, clock, species, expected, deviations);
    }

    /** In which fill a moment lies that is so far into the time in liquor; at a change of liquor in the one that goes. */
    private static int fillAt(double seconds, double each, int fills) {
        return Math.min(fills - 1, (int) Math.ceil(seconds / each - 1e-9) - 1);
    }

    private static double reading(Batch batch, double[] stepSeconds, int step, double seconds, String species) {
        int s = batch.species(species);
        int fills = batch.recipe().steps().get(step).fills();
        double each = stepSeconds[step] / fills;
        int fill = fillAt(seconds, each, fills);
        int stage = batch.stageOfFill(step, fill);
        double[] upTo = new double[stage + 1];
        for (int k = 0; k < stage; k++) {
            upTo[k] = batch.slots().get(k).seconds(stepSeconds);
        }
        upTo[stage] = seconds - fill * each;
        return batch.chain(s).follow(batch.effective(s, upTo)).value(new Probe.Liquor(), stage);
    }

    private static Deviation deviation(Run run, Batch other, int step, double seconds, double reading, double factor) {
        double[] planned = run.seconds();
        try {
            Optional<Run> again = Planner.best(remaining(other, planned, step, seconds));
            if (again.isPresent()) {
                List<Double> times = new ArrayList<>();
                for (double time : again.get().seconds()) {
                    times.add(time);
                }
                double added = again.get().totals().seconds() - run.totals().seconds();
                return new Deviation(reading, factor, times, OptionalDouble.of(added));
            }
        } catch (Unsound tooShort) {
            return new Deviation(reading, factor, List.of(), OptionalDouble.empty());
        }
        return new Deviation(reading, factor, List.of(), OptionalDouble.empty());
    }

    /** What is past stands; this step lasts at least until now; where nothing that remains is free, this step is. */
    private static Batch remaining(Batch batch, double[] planned, int step, double now) {
        Recipe recipe = batch.recipe();
        List<Time> times = new ArrayList<>();
        // Equal fills cannot be changed half-way: such a step goes on as planned, those after it make up for it.
        boolean several = recipe.steps().get(step).fills() > 1;
        boolean anythingFree = recipe.steps().stream()
                .skip(several ? step + 1 : step)
                .anyMatch(one -> one.time().isFree());
        for (int i = 0; i < planned.length; i++) {
            Step one = recipe.steps().get(i);
            Time time = one.time();
            if (i < step || (i == step && several)) {
                time = new Time.Fixed(seconds(planned[i], time));
            } else if (i == step) {
                double most = time.isFree() ? time.seconds(time.choices() - 1) : planned[i];
                if (time.isFree() || !anythingFree) {
                    double to = anythingFree ? most : STRETCH * planned[i];
                    double grain = time instanceof Time.Between between
                            ? between.grain().si()
                            : 300;
                    // From now in whole grains, so that the planned duration stays on offer.
                    double from = planned[i] - grain * Math.floor((planned[i] - now) / grain);
                    time = to - from < grain
                            ? new Time.Fixed(seconds(planned[i], time))
                            : new Time.Between(
                                    time.place(), seconds(from, time), seconds(to, time), seconds(grain, time), null);
                }
            }
            times.add(time);
        }
        return batch.retimed(times);
    }

    private static Quantity seconds(double seconds, Time like) {
        return new Quantity(BigDecimal.valueOf(seconds), Kind.DURATION.unit("s").orElseThrow(), like.place());
    }

    private static Recipe withDiffusivity(Recipe recipe, Species changed, double factor) {
        List<Species> species = recipe.species().stream()
                .map(one -> one.equals(changed) ? faster(one, factor) : one)
                .toList();
        List<Step> steps = recipe.steps().stream()
                .map(step -> Rescaled.step(step, changed.name(), factor))
                .toList();
        return recipe.with(species, steps);
    }

    private static Species faster(Species species, double factor) {
        return species.withDiffusivity(Rescaled.times(species.diffusivity(), factor));
    }
}
