package org.soakwright.recipes.model;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problem;

/** Whether how a lot is handled fits the step and what comes before it. */
final class HandlingRules {
    private HandlingRules() {}

    /** Of steps in the order in which they happen. */
    static List<Problem> problems(List<Step> steps) {
        List<Problem> problems = new ArrayList<>();
        for (int i = 0; i < steps.size(); i++) {
            Step step = steps.get(i);
            problems.addAll(of(step.head().handling(), step.place(), i == 0, step.fills()));
        }
        return problems;
    }

    /**
     * Of one step.
     *
     * @param stays where that is written
     * @param first whether no step comes before it
     * @param fills how many it has
     */
    static List<Problem> of(Handling handling, Place stays, boolean first, int fills) {
        if (handling.stays() && first) {
            return List.of(new Problem(
                    stays, "the first step has no vessel before it to stay in: found stays: true; remove stays"));
        }
        Changeover changeover = handling.changeover();
        if (changeover == null || handling.stays() || fills > 1) {
            return List.of();
        }
        return List.of(new Problem(
                changeover.place(),
                "a changeover lies between two liquors of one lot in one vessel: found one on a step with neither stays: true"
                        + " nor several fills; add one of these, or remove changeover; the time between lots is the"
                        + " turnaround of the vessel on a line"));
    }
}
