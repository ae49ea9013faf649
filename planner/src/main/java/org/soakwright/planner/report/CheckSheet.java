package org.soakwright.planner.report;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import org.soakwright.planner.batch.Durations;
import org.soakwright.planner.batch.Groups;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.Time;

/** What decides each step of a recipe that was found sound. Plain text, lines of at most 100 characters parted by {@code \n}. */
public final class CheckSheet {
    private CheckSheet() {}

    /**
     * The sheet.
     *
     * @param groups of the same recipe
     * @param cautions of the same recipe
     */
    public static String of(Recipe recipe, List<Groups.Group> groups, List<String> cautions, Style style) {
        List<String> lines = new ArrayList<>();
        Prose.lines(recipe.title()).forEach(line -> lines.add(style.heading(line)));
        lines.add("");
        lines.add(style.good("The recipe is sound and can be "
                + (recipe.steps().stream()
                                .allMatch(step -> step.time().definite().isPresent())
                        ? "followed."
                        : "planned.")));
        lines.addAll(Prose.lines(count(recipe.steps().size(), "step") + ", "
                + count(recipe.lot().grades().size(), "grade") + ", "
                + recipe.species().size() + " species, "
                + count(recipe.targets().size(), "target") + "."));
        lines.add("");
        lines.add(style.heading("What decides each step"));
        lines.addAll(table(recipe, groups).lines(style));
        lines.addAll(Prose.lines(
                "  ",
                "  ",
                "Fo = D t/L², Bi = k L/(K D), capacity = liquor/(K x pieces); L from wetted surface to core."));
        lines.add("");
        lines.add(style.heading("Cautions"));
        cautions.forEach(caution -> lines.addAll(Prose.point(caution)));
        return lines.stream().collect(Collectors.joining("\n", "", "\n"));
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

    private static String count(int number, String what) {
        return number + " " + what + (number == 1 ? "" : "s");
    }
}
