package org.soakwright.planner.report;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.soakwright.planner.batch.Durations;
import org.soakwright.recipes.model.Changeover;
import org.soakwright.recipes.model.Gap;
import org.soakwright.recipes.model.Handling;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Step;

/** What lies between steps and fills, and what a recipe says of staying, attending and holding, in words. */
public final class HandlingWords {
    private HandlingWords() {}

    /** Between which steps the pieces are brought to another vessel; empty where they never are. */
    public static Optional<String> transferred(Recipe recipe) {
        boolean any = false;
        boolean others = false;
        for (int i = 1; i < recipe.steps().size(); i++) {
            boolean transfer = recipe.gapBefore(i) instanceof Gap.Transfer;
            any |= transfer;
            others |= !transfer;
        }
        return any ? Optional.of(others ? "steps in different vessels" : "steps") : Optional.empty();
    }

    /** A sentence for whatever a recipe says beside that; none where it says nothing. */
    public static List<String> of(Recipe recipe) {
        List<String> said = new ArrayList<>();
        Map<String, List<String>> staying = new LinkedHashMap<>();
        Map<String, List<String>> fills = new LinkedHashMap<>();
        Map<String, List<String>> held = new LinkedHashMap<>();
        List<String> attended = new ArrayList<>();
        for (int i = 0; i < recipe.steps().size(); i++) {
            Step step = recipe.steps().get(i);
            Handling handling = step.head().handling();
            if (handling.stays()) {
                note(staying, recipe.gapBefore(i), step, "it begins at once");
            }
            note(fills, step.gapBetweenFills(), step, "");
            Quantity hold = handling.holdAtMost();
            if (hold != null) {
                held.computeIfAbsent(hold.si() == 0 ? "" : Durations.practical(hold.si()), key -> new ArrayList<>())
                        .add(step.name());
            }
            if (handling.attended()) {
                attended.add(step.name());
            }
        }
        staying.forEach((what, steps) -> said.add(
                "Before " + Wording.list(steps) + " the pieces stay in the vessel of the step before: " + what + "."));
        fills.forEach((what, steps) -> said.add("Between the fills of " + Wording.list(steps)
                + " the pieces stay drained: " + what + ", the time of the step does not."));
        if (!attended.isEmpty()) {
            said.add("Somebody attends " + Wording.list(attended) + ": on a line in crew hours only.");
        }
        held.forEach((hold, steps) -> said.add("A line may hold " + Wording.list(steps)
                + (hold.isEmpty() ? " no longer than the recipe says." : " up to " + hold + " longer.")));
        return said;
    }

    /** Steps without a gap are noted where there are words for that. */
    private static void note(Map<String, List<String>> notes, Gap gap, Step step, String otherwise) {
        String what = gap instanceof Gap.Refilling refilling
                ? work(refilling.changeover()) + "; the clock counts them"
                : otherwise;
        if (!what.isEmpty()) {
            notes.computeIfAbsent(what, key -> new ArrayList<>()).add(step.name());
        }
    }

    /** {@code 20 min to drain, 30 min to refill}. */
    public static String work(Changeover changeover) {
        List<String> parts = new ArrayList<>();
        part(parts, changeover.drain(), "to drain");
        part(parts, changeover.refill(), "to refill");
        return String.join(", ", parts);
    }

    private static void part(List<String> parts, Quantity time, String what) {
        if (time.si() > 0) {
            parts.add(Durations.practical(time.si()) + " " + what);
        }
    }
}
