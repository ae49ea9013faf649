package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.soakwright.planner.conditions.Known;
import org.soakwright.planner.conditions.Lag;
import org.soakwright.recipes.model.Gap;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.Target;
import org.soakwright.recipes.model.Time;
import org.soakwright.recipes.text.Unsound;
import org.soakwright.solver.chain.Chain;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Stage;
import org.soakwright.solver.chain.StageTooShort;

/**
 * A recipe ready to be followed: one chain for each species, all sharing the durations of the steps. Not safe for use by several
 * threads at once.
 */
public final class Batch {
    private final Recipe written;
    private final Physics physics;
    private final Recipe recipe;
    private final List<Translation.Slot> slots;
    private final List<Chain> chains;
    private final List<Classes> classes;
    private final int[] lastStage;
    private final int[] firstStage;
    private final Cost cost;
    private final List<Requirement> requirements;
    private final Assurance assurance;
    private long evaluations;

    /**
     * Prepares a recipe.
     *
     * @throws Unsound where it asks for something that is not computed yet, or does not tell enough
     */
    public Batch(Recipe recipe) {
        this(recipe, Physics.of(recipe, StepTimes.nominal(recipe), -1, false), Held.AS_ASKED, null);
    }

    /**
     * The same, quicker and good to about 1e-4 where pieces of several sides share a liquor: for comparing, not for deciding.
     *
     * @param endless the grade whose pieces are taken for endless in all but their shortest side; -1 for none
     */
    static Batch sketch(Recipe recipe, int endless) {
        Physics physics = Physics.of(recipe, StepTimes.nominal(recipe), endless, true);
        return new Batch(recipe, physics, Held.AT_STATED_VALUES, null);
    }

    /**
     * A sample of what is not known exactly: every value is known, and no confidence asked for. What moves still liquor and what warming is
     * worth were found at stated values.
     */
    Batch sample(Recipe drawn, boolean sketched) {
        Recipe known = Known.of(drawn).recipe();
        Physics sampled = Physics.of(known, physics.films().again(known), physics.warming(), -1, sketched);
        return new Batch(drawn, sampled, Held.TO_NOTHING, null);
    }

    /** The same with the density that moves a still liquor found from steps of these durations. */
    Batch resettled(double[] seconds) {
        return new Batch(written, Physics.of(written, seconds, -1, false), Held.TO_NOTHING, assurance);
    }

    /** The same with modes of its own, which another thread may ask for. */
    Batch again() {
        Physics own = Physics.of(recipe, physics.films(), physics.warming(), -1, false);
        Batch again = new Batch(written, own, Held.TO_NOTHING, assurance);
        return again.held(assurance.again(again));
    }

    /** The same physics looked at for other targets. */
    Batch withTargets(List<Target> targets) {
        Physics own = Physics.of(recipe.withTargets(targets), physics.films(), physics.warming(), -1, false);
        return new Batch(written.withTargets(targets), own, Held.AS_ASKED, null);
    }

    /**
     * What the solver is given.
     *
     * @param recipe in the bases that are computed in
     */
    private record Physics(Recipe recipe, Films films, Warming warming, List<Chain> chains) {
        static Physics of(Recipe written, double[] seconds, int endless, boolean sketched) {
            Recipe known = Known.of(written).recipe();
            return of(known, Films.of(known, seconds), Warming.of(known), endless, sketched);
        }

        static Physics of(Recipe known, Films films, Warming warming, int endless, boolean sketched) {
            List<Chain> chains = new Translation(known, films).chains(endless);
            List<Chain> used = sketched ? chains.stream().map(Chain::sketch).toList() : chains;
            return new Physics(known, films, warming, used);
        }

        Physics with(Recipe other) {
            return new Physics(other, films, warming, chains);
        }
    }

    /** What requirements with a confidence are held to. */
    private enum Held {
        AS_ASKED,
        AT_STATED_VALUES,
        TO_NOTHING
    }

    private Batch(Recipe written, Physics physics, Held held, @Nullable Assurance known) {
        this.written = written;
        this.physics = physics;
        recipe = physics.recipe();
        chains = physics.chains();
        classes = recipe.species().stream()
                .map(species -> Classes.of(recipe, species))
                .toList();
        slots = new Translation(recipe, physics.films()).slots();
        lastStage = new int[recipe.steps().size()];
        firstStage = new int[recipe.steps().size()];
        for (int k = slots.size() - 1; k >= 0; k--) {
            if (!slots.get(k).isGap()) {
                firstStage[slots.get(k).step()] = k;
            }
        }
        for (int k = 0; k < slots.size(); k++) {
            if (!slots.get(k).isGap()) {
                lastStage[slots.get(k).step()] = k;
            }
        }
        cost = new Cost(recipe);
        requirements = Requirements.of(this);
        assurance = known != null
                ? known
                : held == Held.TO_NOTHING
                        ? Assurance.none(requirements.size())
                        : Assurance.of(this, held == Held.AT_STATED_VALUES || isDear());
    }

    /** Whether following once takes milliseconds. */
    boolean isDear() {
        return chains.stream().anyMatch(chain -> chain.sketch() != chain);
    }

    /** What requirements with a confidence are held to. */
    Assurance assurance() {
        return assurance;
    }

    /** The same, held otherwise. */
    Batch held(Assurance other) {
        return new Batch(written, physics, Held.TO_NOTHING, other);
    }

    /** Where a requirement stands among all. */
    int index(Requirement requirement) {
        for (int r = 0; r < requirements.size(); r++) {
            if (requirements.get(r) == requirement) {
                return r;
            }
        }
        return requirements.indexOf(requirement);
    }

    /** The same physics with other times to choose from; what was found of it is shared. */
    Batch retimed(List<Time> times) {
        Physics same = physics.with(recipe.withSteps(timed(recipe.steps(), times)));
        return new Batch(written.withSteps(timed(written.steps(), times)), same, Held.TO_NOTHING, assurance);
    }

    private static List<Step> timed(List<Step> steps, List<Time> times) {
        List<Step> timed = new ArrayList<>();
        for (int i = 0; i < times.size(); i++) {
            Step step = steps.get(i);
            timed.add(step.with(step.head().withTime(times.get(i))));
        }
        return timed;
    }

    /** As it was written; {@link #recipe} has the same in the bases that are computed in. */
    Recipe written() {
        return written;
    }

    public Recipe recipe() {
        return recipe;
    }

    /** How many choices of durations have been followed so far. */
    public long evaluations() {
        return evaluations;
    }

    /**
     * Follows the recipe for given durations.
     *
     * @param stepSeconds one for each step, s; above 0
     * @throws Unsound when a step is too short to be computed, at the place of its time
     */
    public Run follow(double... stepSeconds) {
        List<Step> steps = recipe.steps();
        if (stepSeconds.length != steps.size()) {
            throw new IllegalArgumentException(steps.size() + " durations wanted, found " + stepSeconds.length);
        }
        evaluations++;
        double[] seconds = new double[slots.size()];
        for (int k = 0; k < seconds.length; k++) {
            seconds[k] = slots.get(k).seconds(stepSeconds);
        }
        List<Course> courses = new ArrayList<>(chains.size());
        for (int s = 0; s < chains.size(); s++) {
            double[] own = effective(s, seconds);
            try {
                chains.get(s).require(own);
                courses.add(chains.get(s).follow(own));
            } catch (StageTooShort tooShort) {
                throw tooShort(tooShort, s, seconds);
            }
        }
        return new Run(this, stepSeconds.clone(), courses);
    }

    /**
     * What the stages last for one species, whose diffusivity is that of a step's temperature though the pieces come to it colder or warmer.
     *
     * @param seconds of the first stages by the clock
     */
    double[] effective(int species, double[] seconds) {
        double[] own = seconds.clone();
        for (int k = 0; k < own.length; k++) {
            own[k] = lag(species, k).effective(seconds[k]);
        }
        return own;
    }

    /** How the time of a stage differs for a species. */
    Lag lag(int species, int stage) {
        int step = slots.get(stage).step();
        return stage == firstStage[step] ? physics.warming().lag(species, step) : Lag.NONE;
    }

    /** Whether the time of any stage differs from the clock for what diffuses. */
    boolean isLagging() {
        return physics.warming().matters();
    }

    Films films() {
        return physics.films();
    }

    /** Whether the pieces exchange anything in a stage; where they never do, whether it is a stage at all. */
    boolean exchanges(int stage) {
        Translation.Slot slot = slots.get(stage);
        boolean onlyRests = recipe.steps().stream().allMatch(Step.Rest.class::isInstance);
        return onlyRests || (!slot.isGap() && !(recipe.steps().get(slot.step()) instanceof Step.Rest));
    }

    /** All the time in which the pieces exchange something, s. */
    double exchanging(double[] stepSeconds) {
        double sum = 0;
        for (int k = 0; k < slots.size(); k++) {
            sum += exchanges(k) ? slots.get(k).seconds(stepSeconds) : 0;
        }
        return sum;
    }

    /** Derivatives by the durations of stages, as derivatives by those of the steps that the stages belong to. */
    double[] byStep(int species, double[] byStage, double[] stageSeconds) {
        double[] byStep = new double[recipe.steps().size()];
        for (int k = 0; k < byStage.length; k++) {
            Translation.Slot slot = slots.get(k);
            byStep[slot.step()] += slot.part() * lag(species, k).rate(stageSeconds[k]) * byStage[k];
        }
        return byStep;
    }

    /** What a requirement reads off a state of this batch at stated values, in SI; totals are none. */
    static double read(Requirement requirement, State state) {
        if (requirement instanceof Requirement.OfState ofState) {
            return ofState.measure().read(state).value();
        }
        Requirement.OfContent content = (Requirement.OfContent) requirement;
        return content.gauge().value(state.courses().get(content.species()), state.stage());
    }

    /** What is said of pieces that come to a step from another temperature. */
    List<String> warming() {
        return physics.warming().said();
    }

    private Unsound tooShort(StageTooShort cause, int species, double[] seconds) {
        Translation.Slot slot = slots.get(cause.stage());
        Step step = recipe.steps().get(slot.step());
        double shortest = slot.isGap() ? cause.shortest() : cause.shortest() / slot.part();
        Unsound unsound = new Unsound(
                slot.gap().place().orElse(step.time().place()),
                lasting(slot)
                        + " is too short to be computed for "
                        + recipe.species().get(species).name()
                        + " by this version: found " + Durations.practical(seconds[cause.stage()])
                        + (!slot.isGap() && slot.part() < 1 ? " per fill" : "") + ", which needs more than "
                        + cause.most() + " modes"
                        + (chains.get(species).lot().size() > 1
                                ? " over " + chains.get(species).lot().size()
                                        + (recipe.lot().grades().size()
                                                        == chains.get(species)
                                                                .lot()
                                                                .size()
                                                ? " grades"
                                                : " classes of pieces")
                                : "")
                        + "; write at least " + Durations.practical(Math.ceil(shortest)));
        unsound.initCause(cause);
        return unsound;
    }

    /** What lasts as long as a stage, in words. */
    private String lasting(Translation.Slot slot) {
        String next = recipe.steps().get(slot.next()).name();
        if (slot.gap() instanceof Gap.Transfer) {
            return "the time between steps";
        }
        if (slot.gap() instanceof Gap.Refilling) {
            return "the changeover " + (slot.next() == slot.step() ? "between the fills of " : "before ") + next;
        }
        return "the time of " + next;
    }

    /** How a species tells the pieces apart. */
    Classes classes(int species) {
        return classes.get(species);
    }

    Chain chain(int species) {
        return chains.get(species);
    }

    Stage stage(int species, int stage) {
        return chains.get(species).stage(stage);
    }

    List<Translation.Slot> slots() {
        return slots;
    }

    List<Requirement> requirements() {
        return requirements;
    }

    Cost cost() {
        return cost;
    }

    int lastStage(int step) {
        return lastStage[step];
    }

    /** The stage of a fill of a step, both from 0. */
    int stageOfFill(int step, int fill) {
        boolean apart = recipe.steps().get(step).gapBetweenFills().lasts();
        return firstStage[step] + (apart ? 2 : 1) * fill;
    }

    int step(String name) {
        for (int i = 0; i < recipe.steps().size(); i++) {
            if (recipe.steps().get(i).name().equals(name)) {
                return i;
            }
        }
        throw new IllegalArgumentException("no step " + name);
    }

    int species(String name) {
        List<Species> species = recipe.species();
        for (int i = 0; i < species.size(); i++) {
            if (species.get(i).name().equals(name)) {
                return i;
            }
        }
        throw new IllegalArgumentException("no species " + name);
    }
}
