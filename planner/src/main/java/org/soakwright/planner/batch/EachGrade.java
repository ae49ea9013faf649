package org.soakwright.planner.batch;

import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Targets as every grade they look at meets them. */
public final class EachGrade {
    private EachGrade() {}

    /** The targets in the order written, once for each grade looked at; met says whether that grade meets it. */
    public static List<TargetState> of(Run run) {
        Map<List<Object>, TargetState> states = new LinkedHashMap<>();
        Map<List<Object>, Double> misses = new HashMap<>();
        for (Requirement requirement : run.batch().requirements()) {
            TargetState state = TargetState.of(run, requirement);
            List<Object> key = List.of(requirement.target(), state.grade());
            TargetState other = states.get(key);
            // A band is two requirements of one target: what is shown is the side nearer to failing.
            boolean met = run.meets(requirement) && (other == null || other.met());
            double miss = run.miss(requirement);
            TargetState nearer =
                    other == null || miss > misses.getOrDefault(key, Double.NEGATIVE_INFINITY) ? state : other;
            misses.merge(key, miss, Math::max);
            states.put(key, withMet(nearer, met));
        }
        return List.copyOf(states.values());
    }

    private static TargetState withMet(TargetState state, boolean met) {
        return new TargetState(
                state.target(),
                state.name(),
                state.grade(),
                state.atMost(),
                state.atLeast(),
                state.value(),
                state.unit(),
                met);
    }
}
