package org.soakwright.planner.report;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import org.soakwright.planner.batch.AsInfinite;
import org.soakwright.planner.batch.Groups;
import org.soakwright.recipes.model.Recipe;

/** What decides each step of a recipe that was found sound. Plain text, lines of at most 100 characters parted by {@code \n}. */
public final class CheckSheet {
    private CheckSheet() {}

    /**
     * The sheet.
     *
     * @param groups of the same recipe
     * @param shapes of the same recipe
     * @param cautions of the same recipe
     */
    public static String of(
            Recipe recipe, List<Groups.Group> groups, List<AsInfinite> shapes, List<String> cautions, Style style) {
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
        lines.addAll(GroupTable.section(recipe, groups).lines(style));
        List<String> pieces = PieceLines.of(recipe, shapes);
        if (!pieces.isEmpty()) {
            lines.add("");
            lines.add(style.heading("Pieces"));
            pieces.forEach(piece -> lines.addAll(Prose.point(piece)));
        }
        lines.add("");
        lines.add(style.heading("Cautions"));
        cautions.forEach(caution -> lines.addAll(Prose.point(caution)));
        return lines.stream().collect(Collectors.joining("\n", "", "\n"));
    }

    private static String count(int number, String what) {
        return number + " " + what + (number == 1 ? "" : "s");
    }
}
