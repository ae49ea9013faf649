package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Shape;
import org.soakwright.recipes.model.Side;
import org.soakwright.recipes.model.Target;

/**
 * What it would cost to take pieces of several sides for endless ones that only their shortest side counts for: the time, all steps
 * stretched alike, until the targets on these pieces are met.
 *
 * @param grade its name
 * @param taken the shape it is taken for: a slab, or a long cylinder
 * @param side the side that alone would count
 * @param seconds of all steps as it is; empty where no stretching meets the targets
 * @param taking of all steps were it so; empty alike
 */
public record AsInfinite(String grade, Shape taken, Side side, OptionalDouble seconds, OptionalDouble taking) {
    /** Steps are not stretched beyond this, nor shrunk below its inverse. */
    private static final double MOST = 64;

    /** Of the time: how closely it is found. */
    private static final double CLOSE = 0.002;

    /** One for each grade of several sides that a target looks at. */
    public static List<AsInfinite> of(Recipe recipe) {
        List<AsInfinite> all = new ArrayList<>();
        List<Grade> grades = recipe.lot().grades();
        for (int j = 0; j < grades.size(); j++) {
            Grade grade = grades.get(j);
            if (grade.sides().size() > 1 && watched(recipe)) {
                Side side = grade.shortest();
                Shape taken = side.equals(grade.sides().get(0)) && grade.shape() == Shape.SHORT_CYLINDER
                        ? Shape.CYLINDER
                        : Shape.SLAB;
                OptionalDouble seconds = time(Batch.sketch(recipe, -1), j);
                OptionalDouble taking = time(Batch.sketch(recipe, j), j);
                all.add(new AsInfinite(grade.name(), taken, side, seconds, taking));
            }
        }
        return List.copyOf(all);
    }

    private static boolean watched(Recipe recipe) {
        return recipe.targets().stream().anyMatch(Target.OfPieces.class::isInstance);
    }

    private static OptionalDouble time(Batch batch, int grade) {
        double[] planned = batch.recipe().steps().stream()
                .mapToDouble(step -> step.time()
                        .definite()
                        .map(one -> one.si())
                        .orElse(step.time().seconds(step.time().choices() / 2)))
                .toArray();
        double factor = 1;
        boolean enough = meets(batch, grade, planned, factor);
        double step = enough ? 0.5 : 2;
        double last = factor;
        while (meets(batch, grade, planned, factor) == enough) {
            last = factor;
            factor *= step;
            if (factor > MOST || factor < 1 / MOST) {
                return OptionalDouble.empty();
            }
        }
        double low = Math.min(last, factor);
        double high = Math.max(last, factor);
        while (high / low > 1 + CLOSE) {
            double middle = Math.sqrt(low * high);
            if (meets(batch, grade, planned, middle)) {
                high = middle;
            } else {
                low = middle;
            }
        }
        double sum = 0;
        for (double seconds : planned) {
            sum += high * seconds;
        }
        return OptionalDouble.of(sum);
    }

    private static boolean meets(Batch batch, int grade, double[] planned, double factor) {
        double[] seconds = planned.clone();
        for (int i = 0; i < seconds.length; i++) {
            seconds[i] *= factor;
        }
        Run run = batch.follow(seconds);
        return batch.requirements().stream()
                .filter(one -> one instanceof Requirement.OfContent content
                        && content.gauge().grade() == grade)
                .allMatch(run::meets);
    }
}
