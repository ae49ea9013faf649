package org.soakwright.planner.report;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.planner.batch.Durations;
import org.soakwright.planner.batch.Plan;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.TargetState;
import org.soakwright.recipes.model.Goal;
import org.soakwright.recipes.model.Recipe;

/** The answer in a few plain sentences: how long, what decides, how sure. */
final class Answer {
    private static final int MOST_NAMED = 3;

    private Answer() {}

    static List<String> followed(Run run) {
        List<TargetState> targets = run.targets();
        String takes =
                "As written the batch takes " + Wording.lasting(run.totals().seconds());
        if (targets.isEmpty()) {
            return List.of(takes + ". The recipe states no target.");
        }
        List<TargetState> missed =
                targets.stream().filter(state -> !state.met()).toList();
        if (missed.isEmpty()) {
            return List.of(takes + " and meets every target.");
        }
        List<String> sentences = new ArrayList<>();
        sentences.add(takes + " and misses " + missed.size() + " of " + targets.size() + " targets.");
        missed.stream().limit(MOST_NAMED).forEach(state -> sentences.add("Missed: " + Wording.miss(state) + "."));
        if (missed.size() > MOST_NAMED) {
            sentences.add("And " + (missed.size() - MOST_NAMED) + " more.");
        }
        return sentences;
    }

    static List<String> planned(Plan plan) {
        Recipe recipe = plan.run().batch().recipe();
        List<String> sentences = new ArrayList<>();
        List<String> stops = plan.stops();
        if (!stops.isEmpty()) {
            sentences.add("This is not a plan to use. " + String.join(" ", stops)
                    + " Whoever answers for it in spite of that writes allowed-by with their name into the recipe.");
        }
        if (plan.met()) {
            sentences.add(
                    (recipe.targets().isEmpty() ? "Without a target, the batch takes " : "Every target is met in ")
                            + Wording.lasting(plan.run().totals().seconds()) + "." + decides(plan.binds()));
            sentences.add(howSure(plan, recipe));
            return sentences;
        }
        boolean free = recipe.steps().stream().anyMatch(step -> step.time().isFree());
        sentences.add(free ? "No choice of times meets every target." : "The times are fixed and miss a target.");
        plan.nearestMiss()
                .ifPresent(miss -> sentences.add("Nearest miss: " + Wording.miss(miss.target()) + "."
                        + alsoMissed(plan.run(), miss.target().name())));
        if (free) {
            sentences.add(howSureOfNone(plan.proof()));
        }
        sentences.add("What follows is that nearest miss, not a plan to run.");
        return sentences;
    }

    private static String alsoMissed(Run run, String named) {
        List<String> others = run.targets().stream()
                .filter(state -> !state.met() && !state.name().equals(named))
                .map(TargetState::name)
                .toList();
        return others.isEmpty() ? "" : " Also missed: " + firstOf(others) + ".";
    }

    private static String decides(List<String> binds) {
        if (binds.isEmpty()) {
            return "";
        }
        return (binds.size() == 1 ? " What decides is " : " What decides: ") + firstOf(binds) + ".";
    }

    private static String firstOf(List<String> names) {
        String more = names.size() > MOST_NAMED ? " and " + (names.size() - MOST_NAMED) + " more" : "";
        return String.join("; ", names.subList(0, Math.min(MOST_NAMED, names.size()))) + more;
    }

    private static String howSure(Plan plan, Recipe recipe) {
        if (recipe.steps().stream().noneMatch(step -> step.time().isFree())) {
            return "Every time is fixed, so there was nothing to choose.";
        }
        Plan.Proof proof = plan.proof();
        String better = better(recipe.minimise().get(0));
        return switch (proof.claim()) {
            case GLOBAL -> "No choice of times is " + better + ": bounds that hold over the whole range show it.";
            case EXHAUSTIVE -> "No choice of times is " + better + ": every one that could be was followed.";
            case LOCAL ->
                "Nothing " + better + " was found: " + proof.agreed() + " of " + proof.starts()
                        + " searches ended at the same best. This is not proven." + bound(proof);
        };
    }

    private static String bound(Plan.Proof proof) {
        return proof.bound().isPresent()
                ? " No choice takes less than "
                        + Durations.practical(proof.bound().getAsDouble()) + "."
                : "";
    }

    private static String howSureOfNone(Plan.Proof proof) {
        return switch (proof.claim()) {
            case GLOBAL -> "That none does is shown by bounds that hold over the whole range.";
            case EXHAUSTIVE -> "That none does is certain: every one that could was followed.";
            case LOCAL -> "None was found in " + proof.starts() + " searches; that none exists is not proven.";
        };
    }

    private static String better(Goal goal) {
        return switch (goal) {
            case TIME -> "shorter";
            case COST -> "cheaper";
            case LIQUOR -> "more sparing of liquor";
        };
    }
}
