package org.soakwright.planner.batch;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.soakwright.planner.batch.doubt.Chance;
import org.soakwright.recipes.model.Target;

/**
 * What is to be expected of a run when values of its recipe are not known exactly, found by following many samples of them.
 *
 * @param all the chance that every target is met together
 * @param refused samples that could not be followed; each counts as failing
 * @param refusal why the first of them could not; empty where all could
 * @param sketched whether samples were followed in a sketch, good to about 1e-4
 * @param planned on how many samples the durations were chosen; 1 is at stated values with a margin, 0 is not chosen
 * @param chances of each target of the recipe, in its order
 * @param prospects of each target in each grade it looks at
 * @param values names of what is not known exactly, in the order of the file
 */
public record Outlook(
        Chance all,
        int refused,
        Optional<String> refusal,
        boolean sketched,
        int planned,
        List<Chance> chances,
        List<Prospect> prospects,
        List<String> values) {
    public Outlook {
        chances = List.copyOf(chances);
        prospects = List.copyOf(prospects);
        values = List.copyOf(values);
    }

    /** Shares of the samples whose readings are told; 1. */
    public static final List<Double> LEVELS = List.of(0.05, 0.5, 0.95);

    /**
     * One target in one grade.
     *
     * @param grade as {@link TargetState} tells it
     * @param confidence asked for, 0.9 for 90 %; empty where none is
     * @param percentiles at {@link #LEVELS}, in the target's unit, of the samples that could be followed
     * @param error standard error, of sampling alone, of the value that a confidence is held to, in the target's unit
     * @param shares of the variance of the reading's logarithm, by value, in the order of {@link Outlook#values}; empty where there are too few
     *     samples to tell
     */
    public record Prospect(
            Target target,
            Optional<String> grade,
            String name,
            Chance chance,
            OptionalDouble confidence,
            List<Double> percentiles,
            OptionalDouble error,
            String unit,
            List<Double> shares) {
        public Prospect {
            percentiles = List.copyOf(percentiles);
            shares = List.copyOf(shares);
        }
    }

    /** Of a target in its grade; empty where the state is of another recipe. */
    public Optional<Prospect> of(TargetState state) {
        return prospects.stream()
                .filter(one ->
                        one.target().equals(state.target()) && one.grade().equals(state.grade()))
                .findFirst();
    }

    /** The chance of a target in all its grades. */
    public Optional<Chance> chance(TargetState state, List<Target> targets) {
        int index = targets.indexOf(state.target());
        return index < 0 ? Optional.empty() : Optional.of(chances.get(index));
    }
}
