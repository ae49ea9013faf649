package org.soakwright.planner.line;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.line.VesselGroup;
import org.soakwright.recipes.model.line.Volume;

/** Which vessels have room for a load: pieces displace liquor, and where a lot stays for several steps, one vessel serves them all. */
final class Fitting {
    /** What rounding of sums of decimals may make of a vessel that is just full. */
    private static final double ROUNDING = 1e-9;

    private Fitting() {}

    /** The vessels in which each step can run, in the order of the line. */
    static List<List<VesselGroup>> groups(Recipe recipe, List<VesselGroup> all) {
        List<List<VesselGroup>> groups = new ArrayList<>();
        List<Step> steps = recipe.steps();
        for (int i = 0; i < steps.size(); ) {
            int next = i + 1;
            while (next < steps.size() && steps.get(next).head().handling().stays()) {
                next++;
            }
            List<Step> visit = steps.subList(i, next);
            List<VesselGroup> fitting = all.stream()
                    .filter(group -> visit.stream().allMatch(step -> group.serves(step) && fits(recipe, step, group)))
                    .toList();
            for (; i < next; i++) {
                groups.add(fitting);
            }
        }
        return groups;
    }

    /** Whether every step has a vessel. */
    static boolean fits(Recipe recipe, List<VesselGroup> all) {
        return groups(recipe, all).stream().noneMatch(List::isEmpty);
    }

    private static boolean fits(Recipe recipe, Step step, VesselGroup group) {
        Volume volume = group.volume();
        if (volume != null && m3(recipe, step) > volume.usableM3() * (1 + ROUNDING)) {
            return false;
        }
        Quantity capacity = group.capacity();
        return capacity == null || recipe.lot().massKg().orElseThrow() <= capacity.si() * (1 + ROUNDING);
    }

    /** What pieces and liquor fill together. */
    static double m3(Recipe recipe, Step step) {
        OptionalDouble liquor =
                step instanceof Step.Wet wet ? wet.liquor().volumeM3(recipe.lot()) : OptionalDouble.empty();
        return recipe.lot().volumeM3() + liquor.orElse(0);
    }
}
