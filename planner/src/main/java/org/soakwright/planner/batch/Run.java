package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.soakwright.recipes.model.Medium;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.text.Unit;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Probe;

/** A recipe followed for one choice of durations. */
public final class Run {
    private final Batch batch;
    private final double[] seconds;
    private final List<Course> courses;
    private final Map<Integer, StepEnd> ends = new HashMap<>();

    Run(Batch batch, double[] seconds, List<Course> courses) {
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
        double between = recipe.between() == null ? 0 : recipe.between().si();
        double from = step * between;
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
                done, from, from + seconds[step], List.copyOf(liquor), List.copyOf(means), List.copyOf(pieces));
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

    /** In SI: kg/m3, s, m3 or money. */
    double value(Requirement requirement) {
        if (requirement instanceof Requirement.OfTotal total) {
            return batch.cost().of(total.goal(), seconds);
        }
        Requirement.OfContent content = (Requirement.OfContent) requirement;
        return content.gauge().value(courses.get(content.species()), content.stage());
    }

    double miss(Requirement requirement) {
        return requirement.miss(value(requirement));
    }

    /** Derivative of the miss by the duration of each step, 1/s. */
    double[] missGradient(Requirement requirement) {
        double slope = requirement.missSlope(value(requirement));
        double[] gradient = new double[seconds.length];
        if (requirement instanceof Requirement.OfTotal total) {
            for (int i = 0; i < gradient.length; i++) {
                gradient[i] = slope * batch.cost().rate(total.goal(), i);
            }
            return gradient;
        }
        Requirement.OfContent content = (Requirement.OfContent) requirement;
        double[] byStage = content.gauge().gradient(courses.get(content.species()), content.stage());
        for (int k = 0; k < byStage.length; k++) {
            Translation.Slot slot = batch.slots().get(k);
            double rate = batch.lag(content.species(), k).rate(slot.seconds(seconds));
            gradient[slot.step()] += slope * slot.part() * rate * byStage[k];
        }
        return gradient;
    }
}
