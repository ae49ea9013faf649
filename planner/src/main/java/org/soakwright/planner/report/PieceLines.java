package org.soakwright.planner.report;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.planner.batch.AsInfinite;
import org.soakwright.planner.batch.Durations;
import org.soakwright.recipes.model.Fit;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.Recipe;

/** What a check says of the pieces: how well a spread fits what was measured, and what their shape is worth. */
final class PieceLines {
    private PieceLines() {}

    static List<String> of(Recipe recipe, List<AsInfinite> shapes) {
        List<String> lines = new ArrayList<>();
        for (Grade grade : recipe.lot().grades()) {
            Fit fit = grade.fit();
            if (fit != null) {
                lines.add(fit(grade.name(), fit));
            }
        }
        shapes.forEach(shape -> lines.add(shape(shape)));
        return lines;
    }

    private static String fit(String grade, Fit fit) {
        String doubt = fit.verdict() == Fit.Verdict.LOGNORMAL
                ? "the spread describes them."
                : "more than chance makes: the pieces may be of several kinds; read the list into grades.";
        return grade + ": " + fit.pieces() + " pieces of " + fit.file() + ", median " + fit.median() + ", spread "
                + Figures.rounded(100 * fit.cv(), 2) + " %. Largest gap between list and spread "
                + Figures.rounded(100 * fit.worst(), 2) + " % of the mass, chance alone makes up to "
                + Figures.rounded(100 * fit.limit(), 2) + " %: " + doubt;
    }

    private static String shape(AsInfinite shape) {
        String taken = shape.grade() + ": taken for a "
                + (shape.taken() == org.soakwright.recipes.model.Shape.SLAB ? "slab" : "long cylinder")
                + " of " + shape.side().size() + ", ";
        if (shape.seconds().isEmpty() || shape.taking().isEmpty()) {
            return taken
                    + (shape.seconds().isEmpty()
                            ? "nothing can be compared: no stretching of the steps meets its targets."
                            : "it would never be said to meet its targets, however long the steps.");
        }
        double seconds = shape.seconds().getAsDouble();
        double taking = shape.taking().getAsDouble();
        return taken + "it would be given " + Durations.practical(taking) + " where "
                + Durations.practical(seconds) + " are enough, all steps stretched alike: "
                + Figures.rounded(100 * Math.abs(taking / seconds - 1), 2) + " % "
                + (taking > seconds ? "too much." : "too little.");
    }
}
