package org.soakwright.planner.report.picture;

import java.util.List;
import org.jspecify.annotations.Nullable;
import org.soakwright.planner.report.Way;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Spread;
import org.soakwright.recipes.model.Start;
import org.soakwright.recipes.text.Unit;

/** What the pieces held of a species as loaded, in its unit. */
final class Loaded {
    private final Recipe recipe;
    private final Start start;
    private final @Nullable Spread varies;
    private final Unit unit;

    Loaded(Recipe recipe, int species) {
        this.recipe = recipe;
        start = recipe.species().get(species).start();
        varies = recipe.species().get(species).startVaries();
        unit = start.unit();
    }

    /** At positions of a way through a piece; what is stated from the core outwards goes both ways where it runs from face to face. */
    double[] profile(Way way, double[] positions) {
        double[] values = new double[positions.length];
        for (int i = 0; i < values.length; i++) {
            values[i] = at(way.fromSkin() ? Math.abs(2 * positions[i] - 1) : positions[i]);
        }
        return values;
    }

    /** Over the volume of the pieces of this grade; where the start varies, that is above the median that is stated. */
    double mean(Grade grade) {
        if (start instanceof Start.Uniform uniform) {
            double sigma = varies == null ? 0 : varies.sigma();
            return Math.exp(0.5 * sigma * sigma) * express(uniform.content());
        }
        int s = switch (grade.shape()) {
            case SLAB -> 0;
            case CYLINDER -> 1;
            case SPHERE -> 2;
            case SHORT_CYLINDER, BRICK -> throw new IllegalStateException("a profile belongs to one axis");
        };
        List<Start.Point> points = ((Start.Profile) start).points();
        double sum = 0;
        for (int i = 1; i < points.size(); i++) {
            double a = points.get(i - 1).position();
            double b = points.get(i).position();
            double middle = (a + b) / 2;
            // Simpson's rule, exact here: a line times the square of the position at most.
            sum += (b - a)
                    / 6
                    * (at(a) * Math.pow(a, s) + 4 * at(middle) * Math.pow(middle, s) + at(b) * Math.pow(b, s));
        }
        return (s + 1) * sum;
    }

    /** At the core. */
    double core() {
        return at(0);
    }

    private double at(double position) {
        if (start instanceof Start.Uniform uniform) {
            return express(uniform.content());
        }
        List<Start.Point> points = ((Start.Profile) start).points();
        int i = 1;
        while (i < points.size() - 1 && points.get(i).position() < position) {
            i++;
        }
        Start.Point a = points.get(i - 1);
        Start.Point b = points.get(i);
        double share = (position - a.position()) / (b.position() - a.position());
        return express(a.content()) + share * (express(b.content()) - express(a.content()));
    }

    private double express(org.soakwright.recipes.model.Content content) {
        return recipe.lot().express(recipe.lot().kgPerM3(content), unit);
    }
}
