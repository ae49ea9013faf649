package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.soakwright.recipes.model.Step;

/** Why a choice is what it is: found by changing it and following again. */
final class Explanation {
    private static final double HOUR = 3600;

    private final Batch batch;
    private final Grid grid;
    private final Run run;

    Explanation(Batch batch, Grid grid, Run run) {
        this.batch = batch;
        this.grid = grid;
        this.run = run;
    }

    /** Targets that some free step would break if it were the next shorter choice; for steps that cost by the hour, no others. */
    List<String> binding() {
        Set<String> names = new LinkedHashSet<>();
        double[] seconds = run.seconds();
        for (int a = 0; a < grid.size(); a++) {
            int step = grid.step(a);
            int choice = grid.below(a, seconds[step]);
            if (choice > 0) {
                double[] shorter = seconds.clone();
                shorter[step] = grid.value(a, choice - 1);
                addMissed(batch.follow(shorter), names);
            }
        }
        return List.copyOf(names);
    }

    List<String> missed() {
        Set<String> names = new LinkedHashSet<>();
        addMissed(run, names);
        return List.copyOf(names);
    }

    private void addMissed(Run changed, Set<String> names) {
        for (Requirement requirement : batch.requirements()) {
            if (!changed.meets(requirement)) {
                names.add(TargetState.name(batch.recipe(), requirement));
            }
        }
    }

    /** What an hour more in each step changes in the targets named. */
    List<Plan.PerHour> perHour(List<String> names) {
        List<Plan.PerHour> changes = new ArrayList<>();
        List<Step> steps = batch.recipe().steps();
        double[] seconds = run.seconds();
        for (int i = 0; i < steps.size(); i++) {
            double[] longer = seconds.clone();
            longer[i] += HOUR;
            Run changed = batch.follow(longer);
            Set<String> said = new LinkedHashSet<>();
            for (Requirement requirement : batch.requirements()) {
                String name = TargetState.name(batch.recipe(), requirement);
                if (names.contains(name) && said.add(name)) {
                    TargetState before = TargetState.of(run, requirement);
                    TargetState after = TargetState.of(changed, requirement);
                    changes.add(
                            new Plan.PerHour(steps.get(i).name(), name, after.value() - before.value(), before.unit()));
                }
            }
        }
        return List.copyOf(changes);
    }

    Optional<Plan.NearestMiss> nearestMiss() {
        return batch.requirements().stream()
                .max(Comparator.comparingDouble(run::miss))
                .filter(requirement -> !run.meets(requirement))
                .map(requirement -> {
                    TargetState state = TargetState.of(run, requirement);
                    OptionalDouble limit = requirement.upper() ? state.atMost() : state.atLeast();
                    return new Plan.NearestMiss(state, Math.abs(state.value() - limit.orElseThrow()));
                });
    }
}
