package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Limits;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Target;
import org.soakwright.recipes.text.Unsound;

/**
 * What requirements with a confidence are held to: the percentile of their reading over an {@link Ensemble}, or where that is dear the reading at stated
 * values, either times a margin that a judgement on many samples gave.
 */
final class Assurance {
    private final double[] levels;
    private final double[] margins;
    private final @Nullable Ensemble ensemble;

    private Assurance(double[] levels, double[] margins, @Nullable Ensemble ensemble) {
        this.levels = levels;
        this.margins = margins;
        this.ensemble = ensemble;
    }

    /** Nothing is held to anything but its reading. */
    static Assurance none(int requirements) {
        double[] levels = new double[requirements];
        Arrays.fill(levels, Double.NaN);
        return new Assurance(levels, ones(requirements), null);
    }

    /**
     * As the recipe asks for it, without margins.
     *
     * @param dear whether following is so dear that no ensemble is
     */
    static Assurance of(Batch batch, boolean dear) {
        Recipe recipe = batch.written();
        List<Requirement> requirements = batch.requirements();
        Assurance none = none(requirements.size());
        if (recipe.uncertain().isEmpty()) {
            return none;
        }
        double[] levels = none.levels.clone();
        for (int r = 0; r < levels.length; r++) {
            levels[r] = level(recipe, requirements.get(r));
        }
        boolean any = Arrays.stream(levels).anyMatch(level -> !Double.isNaN(level));
        return new Assurance(levels, none.margins, any && !dear ? new Ensemble(batch) : null);
    }

    /** Of a band each side may be missed by half of the rest. */
    private static double level(Recipe recipe, Requirement requirement) {
        Target target = recipe.targets().get(requirement.target());
        Quantity confidence = recipe.confidence(target).orElse(null);
        if (confidence == null) {
            return Double.NaN;
        }
        double inside = isBand(target) ? (1 + confidence.si()) / 2 : confidence.si();
        return requirement.upper() ? inside : 1 - inside;
    }

    private static boolean isBand(Target target) {
        if (target instanceof Target.OfMass mass) {
            return mass.atMost() != null && mass.atLeast() != null;
        }
        Limits limits = target instanceof Target.OfPieces pieces
                ? pieces.limits()
                : target instanceof Target.OfLiquor liquor ? liquor.limits() : null;
        return limits != null && limits.atMost() != null && limits.atLeast() != null;
    }

    private static double[] ones(int count) {
        double[] ones = new double[count];
        Arrays.fill(ones, 1);
        return ones;
    }

    /** The same held to other margins, by requirement. */
    Assurance with(double[] others) {
        return new Assurance(levels, others.clone(), ensemble);
    }

    /** The same with an ensemble of its own, which another thread may follow. */
    Assurance again(Batch stated) {
        return new Assurance(levels, margins, ensemble == null ? null : new Ensemble(stated));
    }

    /** The same, reading at stated values. */
    Assurance atStatedValues(double[] others) {
        return new Assurance(levels, others.clone(), null);
    }

    boolean any() {
        return Arrays.stream(levels).anyMatch(level -> !Double.isNaN(level));
    }

    /** Whether a requirement is held to a percentile. */
    boolean holds(int requirement) {
        return !Double.isNaN(levels[requirement]);
    }

    double level(int requirement) {
        return levels[requirement];
    }

    double[] margins() {
        return margins.clone();
    }

    /** On how many samples it is planned; 1 is at stated values. */
    int samples() {
        return ensemble == null ? 1 : Ensemble.SAMPLES;
    }

    /** Members followed, none where it reads at stated values. */
    List<Run> follow(double[] seconds) {
        return ensemble == null ? List.of() : ensemble.follow(seconds);
    }

    /** Without the margin. */
    double raw(Run run, Requirement requirement, int index) {
        return ensemble == null
                ? run.stated(requirement)
                : ensemble.weighed(run.members(), requirement, index, levels[index])
                        .value();
    }

    double value(Run run, Requirement requirement, int index) {
        return margins[index] * raw(run, requirement, index);
    }

    double[] gradient(Run run, Requirement requirement, int index) {
        double[] gradient = ensemble == null
                ? run.statedGradient(requirement)
                : ensemble.gradient(
                        ensemble.weighed(run.members(), requirement, index, levels[index]),
                        index,
                        run.seconds().length);
        for (int i = 0; i < gradient.length; i++) {
            gradient[i] *= margins[index];
        }
        return gradient;
    }

    static Unsound tooOftenRefused(Recipe recipe, Requirement requirement, int refused, int samples, String first) {
        Target target = recipe.targets().get(requirement.target());
        Quantity confidence = recipe.confidence(target).orElse(null);
        return new Unsound(
                confidence == null ? target.place() : confidence.place(),
                "confidence: cannot be reached, because " + refused + " of " + samples
                        + " samples of what is not known exactly cannot be followed and count as failing, the first for: "
                        + first + "; narrow the give-or-take");
    }

    /** Names of the places where confidence is asked for and something is uncertain. */
    List<Integer> held() {
        List<Integer> held = new ArrayList<>();
        for (int r = 0; r < levels.length; r++) {
            if (holds(r)) {
                held.add(r);
            }
        }
        return held;
    }
}
