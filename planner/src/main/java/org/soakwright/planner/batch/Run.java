package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.EnumMap;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Medium;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.Target;
import org.soakwright.recipes.text.Unit;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Probe;

/** A recipe followed for one choice of durations. */
public final class Run {
    /** Fitted to examples of one to twelve classes within a factor of two, microseconds on one core. */
    private static final double FIXED_EFFORT = 40;

    private static final double EFFORT_PER_MODE = 2;
    private static final double EFFORT_PER_PAIR = 0.15;

    private final Batch batch;
    private final double[] seconds;
    private final List<Course> courses;
    private final @Nullable Judgement judgement;
    private final Map<Integer, StepEnd> ends = new HashMap<>();
    private @Nullable List<Run> members;

    Run(Batch batch, double[] seconds, List<Course> courses) {
        this(batch, seconds, courses, null);
    }

    private Run(Batch batch, double[] seconds, List<Course> courses, @Nullable Judgement judgement) {
        this.judgement = judgement;
        this.batch = batch;
        this.seconds = seconds;
        this.courses = courses;
    }

    public Batch batch() {
        return batch;
    }

    /** Duration of each step, s. */
    public double[] seconds() {
        return seconds.clone();
    }

    Course course(int species) {
        return courses.get(species);
    }

    /** Where the solute of a species went, from 0. */
    public Balance balance(int species) {
        return Balance.of(this, species);
    }

    public Totals totals() {
        return batch.cost().of(seconds);
    }

    /** The end of a step, from 0; found once, since percentiles are dear. */
    public StepEnd end(int step) {
        return ends.computeIfAbsent(step, this::ended);
    }

    private StepEnd ended(int step) {
        Recipe recipe = batch.recipe();
        int stage = batch.lastStage(step);
        double from = recipe.gapSeconds(0, step) + recipe.gapBefore(step).seconds();
        for (int i = 0; i < step; i++) {
            from += seconds[i];
        }
        List<StepEnd.Liquor> liquor = new ArrayList<>();
        List<StepEnd.LotMean> means = new ArrayList<>();
        for (int s = 0; s < recipe.species().size(); s++) {
            Species species = recipe.species().get(s);
            Course course = courses.get(s);
            if (recipe.steps().get(step) instanceof Step.Wet && species.exchangesWith(Medium.LIQUOR)) {
                liquor.add(new StepEnd.Liquor(
                        species.name(), course.liquorAtStart(stage), course.value(new Probe.Liquor(), stage)));
            }
            Unit unit = species.start().unit();
            double mean = course.value(new Probe.LotMean(), stage);
            means.add(new StepEnd.LotMean(species.name(), recipe.lot().express(mean, unit), unit));
        }
        List<StepEnd.Piece> pieces = new ArrayList<>();
        for (int j = 0; j < recipe.lot().grades().size(); j++) {
            List<StepEnd.Content> contents = new ArrayList<>();
            for (int s = 0; s < recipe.species().size(); s++) {
                contents.add(content(s, j, stage));
            }
            pieces.add(new StepEnd.Piece(recipe.lot().grades().get(j).name(), List.copyOf(contents)));
        }
        Step done = recipe.steps().get(step);
        return new StepEnd(
                done, from, seconds[step], List.copyOf(liquor), List.copyOf(means), List.copyOf(pieces), mass(stage));
    }

    /** Of the lot, kg; empty where the recipe does not say how it changes. */
    private OptionalDouble mass(int stage) {
        Optional<Weighing> weighing = Weighing.of(batch.recipe());
        OptionalDouble loaded = batch.recipe().lot().massKg();
        return weighing.isPresent() && loaded.isPresent()
                ? OptionalDouble.of(loaded.getAsDouble()
                        * weighing.get().mass(state(stage, false), -1).value())
                : OptionalDouble.empty();
    }

    private StepEnd.Content content(int s, int grade, int stage) {
        Recipe recipe = batch.recipe();
        Species species = recipe.species().get(s);
        Course course = courses.get(s);
        Unit unit = species.start().unit();
        Map<org.soakwright.recipes.model.Reading, Double> values =
                new EnumMap<>(org.soakwright.recipes.model.Reading.class);
        Population population = batch.classes(s).populations().get(grade);
        double error = 0;
        for (org.soakwright.recipes.model.Reading kind : org.soakwright.recipes.model.Reading.values()) {
            Gauge.Average gauge = new Gauge.Average(grade, population, kind);
            values.put(kind, recipe.lot().express(gauge.value(course, stage), unit));
            error = Math.max(error, recipe.lot().express(gauge.error(course, stage), unit));
        }
        return new StepEnd.Content(species.name(), values, distribution(s, population, stage), error, unit);
    }

    private Map<org.soakwright.recipes.model.Reading, List<Double>> distribution(
            int s, Population population, int stage) {
        Map<org.soakwright.recipes.model.Reading, List<Double>> distribution =
                new EnumMap<>(org.soakwright.recipes.model.Reading.class);
        if (!population.varies()) {
            return distribution;
        }
        Recipe recipe = batch.recipe();
        Unit unit = recipe.species().get(s).start().unit();
        List<Population> alone = List.of(population);
        for (org.soakwright.recipes.model.Reading kind : org.soakwright.recipes.model.Reading.values()) {
            Scatter scatter = new Scatter(alone, Gauge.values(alone, kind, courses.get(s), stage));
            distribution.put(
                    kind,
                    StepEnd.SHARES.stream()
                            .map(share -> recipe.lot().express(scatter.percentile(share), unit))
                            .toList());
        }
        return distribution;
    }

    /** Every target of the recipe, for `grade: each` the grade nearest to failing. */
    public List<TargetState> targets() {
        List<TargetState> states = new ArrayList<>();
        for (int i = 0; i < batch.recipe().targets().size(); i++) {
            Requirement worst = null;
            double most = Double.NEGATIVE_INFINITY;
            for (Requirement requirement : batch.requirements()) {
                if (requirement.target() == i && miss(requirement) > most) {
                    most = miss(requirement);
                    worst = requirement;
                }
            }
            if (worst != null) {
                states.add(TargetState.of(this, worst));
            }
        }
        return List.copyOf(states);
    }

    public boolean meetsTargets() {
        return batch.requirements().stream().allMatch(this::meets);
    }

    boolean meets(Requirement requirement) {
        return requirement.allows(value(requirement));
    }

    /**
     * What is to be expected where values are not known exactly; empty where all are, or where the run was not {@link #judged}.
     */
    public Optional<Outlook> outlook() {
        return Optional.ofNullable(judgement).map(Judgement::outlook);
    }

    /**
     * The same run judged by many samples of what is not known exactly; itself where everything is. Targets with a confidence are then held to what the
     * samples read.
     *
     * @throws org.soakwright.recipes.text.Unsound where so many samples cannot be followed that a confidence cannot be reached
     */
    public Run judged(Progress progress) {
        Uncertainty uncertainty = Uncertainty.of(batch.written());
        if (uncertainty.isEmpty()) {
            return this;
        }
        Judgement judged = Judgement.of(this, uncertainty, progress);
        double[] margins = batch.assurance().margins();
        for (int r : batch.assurance().held()) {
            double raw = batch.assurance().raw(this, batch.requirements().get(r), r);
            margins[r] = raw > 0 && judged.held()[r] > 0 ? judged.held()[r] / raw : margins[r];
        }
        return new Run(batch.held(batch.assurance().with(margins)), seconds, courses, judged);
    }

    /** The same, judged the same, with a batch of its own, which another thread may follow. */
    public Run again() {
        Batch own = batch.again();
        Run run = own.follow(seconds);
        return new Run(own.held(own.assurance().with(batch.assurance().margins())), seconds, run.courses, judgement);
    }

    /** The same run looked at for other targets of the recipe, of which those kept are held to what they were; not judged. */
    public Run withTargets(List<Target> targets) {
        Batch own = batch.withTargets(targets);
        double[] margins = margins(own, batch.assurance().margins());
        return own.held(own.assurance().with(margins)).follow(seconds);
    }

    /** A batch of a changed recipe held to what this run's targets would be, reading at stated values times what sureness was worth here. */
    public Batch holding(Batch other) {
        double[] own = batch.assurance().margins();
        for (int r : batch.assurance().held()) {
            double stated = stated(batch.requirements().get(r));
            own[r] = stated > 0 ? Math.max(0, value(batch.requirements().get(r))) / stated : 1;
        }
        return other.held(other.assurance().atStatedValues(margins(other, own)));
    }

    /** Margins of the requirements that both have, 1 for others. */
    private double[] margins(Batch other, double[] own) {
        double[] margins = new double[other.requirements().size()];
        Arrays.fill(margins, 1);
        for (int r = 0; r < margins.length; r++) {
            Requirement wanted = other.requirements().get(r);
            Target target = other.recipe().targets().get(wanted.target());
            for (int q : batch.assurance().held()) {
                Requirement known = batch.requirements().get(q);
                if (known.upper() == wanted.upper()
                        && known.grade() == wanted.grade()
                        && batch.recipe().targets().get(known.target()).equals(target)) {
                    margins[r] = own[q];
                }
            }
        }
        return margins;
    }

    /** What preparing and following a recipe like this once takes, about, microseconds: modes to find and to hand from stage to stage. */
    double effort() {
        double effort = FIXED_EFFORT;
        for (int s = 0; s < courses.size(); s++) {
            int classes = batch.chain(s).lot().size();
            int before = 0;
            for (int k = 0; k < courses.get(s).size(); k++) {
                int modes = courses.get(s).modes(k);
                effort += classes * (EFFORT_PER_MODE * modes + EFFORT_PER_PAIR * modes * before);
                before = modes;
            }
        }
        return effort;
    }

    /** Of the ensemble that targets with a confidence are planned on. */
    List<Run> members() {
        if (members == null) {
            members = batch.assurance().follow(seconds);
        }
        return members;
    }

    /**
     * What counts, in SI: kg/m3, s, m3 or money. With a confidence it is what so many samples read at most, or at least, comparable with the
     * limit at stated values.
     */
    double value(Requirement requirement) {
        int index = batch.index(requirement);
        if (index < 0 || !batch.assurance().holds(index)) {
            return stated(requirement);
        }
        return judgement != null ? judgement.held()[index] : batch.assurance().value(this, requirement, index);
    }

    /** At stated values, in SI. */
    double stated(Requirement requirement) {
        if (requirement instanceof Requirement.OfTotal total) {
            return batch.cost().of(total.goal(), seconds);
        }
        return Batch.read(requirement, state(requirement, false));
    }

    double miss(Requirement requirement) {
        return requirement.miss(value(requirement));
    }

    /** Derivative of the miss by the duration of each step, 1/s. */
    double[] missGradient(Requirement requirement) {
        double slope = requirement.missSlope(value(requirement));
        int index = batch.index(requirement);
        double[] gradient = index < 0 || !batch.assurance().holds(index)
                ? statedGradient(requirement)
                : batch.assurance().gradient(this, requirement, index);
        for (int i = 0; i < gradient.length; i++) {
            gradient[i] *= slope;
        }
        return gradient;
    }

    /** Derivative of what is read at stated values by the duration of each step. */
    double[] statedGradient(Requirement requirement) {
        double[] gradient = new double[seconds.length];
        if (requirement instanceof Requirement.OfTotal total) {
            for (int i = 0; i < gradient.length; i++) {
                gradient[i] = batch.cost().rate(total.goal(), i);
            }
            return gradient;
        }
        if (requirement instanceof Requirement.OfState ofState) {
            return ofState.measure().read(state(requirement, true)).slopes();
        }
        Requirement.OfContent content = (Requirement.OfContent) requirement;
        return batch.byStep(
                content.species(),
                content.gauge().gradient(courses.get(content.species()), content.stage()),
                stageSeconds());
    }

    /**
     * How far each requirement of the targets is missed, and how that goes with the durations: nearly straight, above zero where missed.
     *
     * @param slopes of each by the duration of each step, 1/s
     */
    public record Misses(double[] values, double[][] slopes) {}

    /** Of every side of every target, for every grade it holds in. */
    public Misses misses() {
        List<Requirement> all = batch.requirements();
        double[] values = new double[all.size()];
        double[][] slopes = new double[all.size()][];
        for (int r = 0; r < values.length; r++) {
            // Within rounding of the limit is met, so that this and the targets never disagree.
            double miss = miss(all.get(r));
            values[r] = meets(all.get(r)) ? Math.min(miss, 0) : Math.max(miss, Double.MIN_NORMAL);
            slopes[r] = missGradient(all.get(r));
        }
        return new Misses(values, slopes);
    }

    private State state(Requirement requirement, boolean sloping) {
        return state(requirement.stage(), sloping);
    }

    /** This run at the end of a stage. */
    State state(int stage, boolean sloping) {
        return new State(batch, courses, stageSeconds(), batch.exchanging(seconds), stage, sloping);
    }

    private double[] stageSeconds() {
        return batch.slots().stream().mapToDouble(slot -> slot.seconds(seconds)).toArray();
    }
}
