package org.soakwright.planner.report;

import java.util.List;
import org.soakwright.planner.batch.Durations;
import org.soakwright.planner.batch.Groups;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.Time;

/** The dimensionless groups of a recipe: what decides each of its steps. */
public final class GroupTable {
    private GroupTable() {}

    /**
     * The section.
     *
     * @param groups of the same recipe
     */
    public static Section section(Recipe recipe, List<Groups.Group> groups) {
        return Section.of(
                "groups",
                "What decides each step",
                table(recipe, groups),
                List.of("Fo = D t/L², Bi = k L/(K D), capacity = liquor/(K x pieces); L from wetted surface to core"
                        + (recipe.lot().grades().stream().anyMatch(PieceWords::hasSeveralSides)
                                ? ", the shortest way."
                                : ".")));
    }

    private static Table table(Recipe recipe, List<Groups.Group> groups) {
        Table table = new Table()
                .text("Species")
                .text("Grade")
                .text("Fo")
                .number("Bi")
                .number("Capacity")
                .text("Regime");
        String before = "";
        for (Groups.Group group : groups) {
            if (!group.step().equals(before)) {
                Step step = recipe.step(group.step()).orElseThrow();
                table.heading(step.kind() + ": " + step.name() + ", " + time(step.time()));
            }
            table.row(List.of(
                    "  " + group.species(),
                    group.piece(),
                    range(group),
                    Double.isInfinite(group.biot()) ? "no film" : group.biot() == 0 ? "sealed" : three(group.biot()),
                    group.capacityRatio().isPresent()
                            ? three(group.capacityRatio().getAsDouble())
                            : "",
                    group.regime()));
            before = group.step();
        }
        return table;
    }

    private static String range(Groups.Group group) {
        String low = three(group.foLow());
        String high = three(group.foHigh());
        return low.equals(high) ? low : low + " – " + high;
    }

    private static String time(Time time) {
        String shortest = Durations.practical(time.seconds(0));
        if (!time.isFree()) {
            return shortest;
        }
        String range = shortest + " to " + Durations.practical(time.seconds(time.choices() - 1));
        return time.definite()
                .map(planned -> range + ", planned " + Durations.practical(planned.si()))
                .orElse(range);
    }

    private static String three(double value) {
        return Figures.rounded(value, 3);
    }
}
