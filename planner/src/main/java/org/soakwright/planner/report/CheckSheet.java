package org.soakwright.planner.report;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import org.soakwright.planner.batch.Checked;
import org.soakwright.recipes.model.Recipe;

/** What decides each step of a recipe that was found sound. Plain text, lines of at most 100 characters parted by {@code \n}. */
public final class CheckSheet {
    private CheckSheet() {}

    /** The sheet. */
    public static String of(Checked checked, Style style) {
        Recipe recipe = checked.recipe();
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
        lines.addAll(GroupTable.section(recipe, checked.groups()).lines(style));
        List<String> handling = HandlingWords.of(recipe);
        if (!handling.isEmpty()) {
            lines.add("");
            lines.add(style.heading("Handling"));
            handling.forEach(said -> lines.addAll(Prose.point(said)));
        }
        List<String> pieces = PieceLines.of(recipe, checked.shapes());
        if (!pieces.isEmpty()) {
            lines.add("");
            lines.add(style.heading("Pieces"));
            pieces.forEach(piece -> lines.addAll(Prose.point(piece)));
        }
        for (Section section : FoundTables.of(checked)) {
            lines.add("");
            lines.addAll(section.lines(style));
        }
        lines.add("");
        lines.add(style.heading("Cautions"));
        checked.cautions().forEach(caution -> lines.addAll(Prose.point(caution)));
        return lines.stream().collect(Collectors.joining("\n", "", "\n"));
    }

    private static String count(int number, String what) {
        return number + " " + what + (number == 1 ? "" : "s");
    }
}
