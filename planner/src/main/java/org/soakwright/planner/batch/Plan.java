package org.soakwright.planner.batch;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What the planner chose, and why it is to be believed.
 *
 * @param run the recipe followed with the chosen durations; where no choice meets the targets, the nearest miss
 * @param met whether every target is met
 * @param proof what is claimed of the choice
 * @param binds names of the targets that stop any free step from being a grain shorter (or cheaper)
 * @param perHour what one more hour in each step would change in each binding target (in each missed one if none is met)
 * @param nearestMiss the target that fails by most, where one must fail
 * @param remedies changes that were planned again and found to meet the targets
 */
public record Plan(
        Run run,
        boolean met,
        Proof proof,
        List<String> binds,
        List<PerHour> perHour,
        Optional<NearestMiss> nearestMiss,
        List<Remedy> remedies) {

    /** Cautions that forbid to use the plan until somebody answers for it; empty for a plan that may be used. */
    public List<String> stops() {
        return Cautions.of(run).stops();
    }

    /** Whether every target is met and nothing forbids to use it. */
    public boolean mayBeUsed() {
        return met && stops().isEmpty();
    }

    /** How far a claim of optimality reaches. */
    public enum Claim {
        /** No choice on the grid is better: shown by bounds that hold for the whole range. */
        GLOBAL,
        /** No choice on the grid is better: all that could be were followed. */
        EXHAUSTIVE,
        /** Nothing better was found near any of the places the search ended at. */
        LOCAL
    }

    /**
     * What is claimed.
     *
     * @param starts searches begun
     * @param agreed searches that ended at the same best value
     * @param bound no choice takes fewer seconds; empty where that is not proven or time is not what is minimised
     * @param evaluations times the recipe was followed
     */
    public record Proof(Claim claim, int starts, int agreed, OptionalDouble bound, long evaluations) {
        Proof after(long allEvaluations) {
            return new Proof(claim, starts, agreed, bound, allEvaluations);
        }
    }

    /** Change of a reading, in the target's unit, when a step lasts one hour more and all else is as planned. */
    public record PerHour(String step, String reading, double change, String unit) {}

    /**
     * The least that must be given up.
     *
     * @param target the one that fails by most, relative to its limit
     * @param by how far beyond the limit, in the target's unit; above 0
     */
    public record NearestMiss(TargetState target, double by) {}

    /**
     * One change of the recipe with which every target can be met.
     *
     * @param kind longer, finer, fill, warmer, liquor or total
     * @param change in words: {@code allow up to 48 h in each step}
     * @param totals what the batch then takes
     * @param caution what speaks against it; empty where nothing does
     */
    public record Remedy(String kind, String change, Totals totals, String caution) {}
}
