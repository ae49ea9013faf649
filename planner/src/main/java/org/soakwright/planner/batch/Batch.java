package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Step;
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
    private final Recipe recipe;
    private final List<Translation.Slot> slots;
    private final List<Chain> chains;
    private final List<Classes> classes;
    private final int[] lastStage;
    private final Cost cost;
    private final List<Requirement> requirements;
    private final Assurance assurance;
    private long evaluations;

    /**
     * Prepares a recipe.
     *
     * @throws Unsound where it asks for something that is not computed yet
     */
    public Batch(Recipe recipe) {
        this(recipe, new Translation(recipe).chains(-1), Held.AS_ASKED, null);
        Warming.of(recipe);
    }

    /**
     * The same, quicker and good to about 1e-4 where pieces of several sides share a liquor: for comparing, not for deciding.
     *
     * @param endless the grade whose pieces are taken for endless in all but their shortest side; -1 for none
     */
    static Batch sketch(Recipe recipe, int endless) {
        Batch sketch = new Batch(
                recipe,
                new Translation(recipe)
                        .chains(endless).stream().map(Chain::sketch).toList(),
                Held.AT_STATED_VALUES,
                null);
        Warming.of(recipe);
        return sketch;
    }

    /** A sample of what is not known exactly: every value is known, and no confidence asked for. Warming was judged at stated values. */
    static Batch sample(Recipe drawn, boolean sketched) {
        List<Chain> chains = new Translation(drawn).chains(-1);
        return new Batch(drawn, sketched ? chains.stream().map(Chain::sketch).toList() : chains, Held.TO_NOTHING, null);
    }

    /** What requirements with a confidence are held to. */
    private enum Held {
        AS_ASKED,
        AT_STATED_VALUES,
        TO_NOTHING
    }

    private Batch(Recipe recipe, List<Chain> chains, Held held, @Nullable Assurance known) {
        this.recipe = recipe;
        this.chains = chains;
        classes = recipe.species().stream()
                .map(species -> Classes.of(recipe, species))
                .toList();
        slots = new Translation(recipe).slots();
        lastStage = new int[recipe.steps().size()];
        for (int k = 0; k < slots.size(); k++) {
            if (slots.get(k).part() > 0) {
                lastStage[slots.get(k).step()] = k;
            }
        }
        cost = new Cost(recipe);
        requirements = Requirements.of(this);
        assurance = known != null
                ? known
                : held == Held.TO_NOTHING
                        ? Assurance.none(requirements.size())
                        : Assurance.of(recipe, requirements, held == Held.AT_STATED_VALUES || isDear());
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
        return new Batch(recipe, chains, Held.TO_NOTHING, other);
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
        List<Step> steps = new ArrayList<>();
        for (int i = 0; i < times.size(); i++) {
            Step step = recipe.steps().get(i);
            steps.add(step.with(step.head().withTime(times.get(i))));
        }
        Batch retimed = new Batch(recipe.withSteps(steps), chains, Held.TO_NOTHING, assurance);
        Warming.of(retimed.recipe);
        return retimed;
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
            try {
                chains.get(s).require(seconds);
                courses.add(chains.get(s).follow(seconds));
            } catch (StageTooShort tooShort) {
                throw tooShort(tooShort, s, seconds);
            }
        }
        return new Run(this, stepSeconds.clone(), courses);
    }

    private Unsound tooShort(StageTooShort cause, int species, double[] seconds) {
        Translation.Slot slot = slots.get(cause.stage());
        Step step = recipe.steps().get(slot.step());
        boolean between = slot.part() == 0 && recipe.between() != null;
        double shortest = between ? cause.shortest() : cause.shortest() / slot.part();
        Unsound unsound = new Unsound(
                between && recipe.between() != null
                        ? recipe.between().place()
                        : step.time().place(),
                (between ? "the time between steps" : "the time of " + step.name())
                        + " is too short to be computed for "
                        + recipe.species().get(species).name()
                        + " by this version: found " + Durations.practical(seconds[cause.stage()])
                        + (slot.part() > 0 && slot.part() < 1 ? " per fill" : "") + ", which needs more than "
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
