package org.soakwright.planner.batch;

import java.util.List;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Start;

/** What the pieces hold as loaded, against which a limit `of: start` counts: the mean over the pieces looked at. */
final class StartContent {
    private StartContent() {}

    /**
     * Of one grade, or of the lot.
     *
     * @param only the grade, from 0; -1 for the lot
     * @return kg/m3 of piece
     */
    static double of(Recipe recipe, Species species, int only) {
        if (species.start() instanceof Start.Uniform uniform) {
            return Classes.meanStart(species) * recipe.lot().kgPerM3(uniform.content());
        }
        List<Grade> grades = recipe.lot().grades();
        List<Start.Point> points = ((Start.Profile) species.start()).points();
        double sum = 0;
        double shares = 0;
        for (int j = 0; j < grades.size(); j++) {
            if (only < 0 || only == j) {
                sum += grades.get(j).share() * mean(recipe, points, grades.get(j));
                shares += grades.get(j).share();
            }
        }
        return sum / shares;
    }

    /** Straight lines times x^s, integrated exactly. */
    private static double mean(Recipe recipe, List<Start.Point> points, Grade grade) {
        int s = Translation.axis(grade).power();
        double sum = 0;
        for (int i = 1; i < points.size(); i++) {
            double a = points.get(i - 1).position();
            double b = points.get(i).position();
            double ca = recipe.lot().kgPerM3(points.get(i - 1).content());
            double cb = recipe.lot().kgPerM3(points.get(i).content());
            double rise = (cb - ca) / (b - a);
            double flat = (Math.pow(b, s + 1) - Math.pow(a, s + 1)) / (s + 1);
            double tilted = (Math.pow(b, s + 2) - Math.pow(a, s + 2)) / (s + 2);
            sum += (ca - rise * a) * flat + rise * tilted;
        }
        return (s + 1) * sum;
    }
}
