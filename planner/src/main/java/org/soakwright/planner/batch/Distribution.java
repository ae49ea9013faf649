package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Target;

/**
 * How a reading that a target limits is distributed over pieces that differ.
 *
 * @param target how the target is called: {@code salt mean in 95 %, thick}
 * @param grade the grade, or {@code lot}
 * @param unit of values and limits, as the target shows them
 * @param curve rising, from nearly none of the pieces to nearly all
 * @param share of the pieces that must meet the limit, 1; empty where the target is for the average piece
 */
public record Distribution(
        String target,
        String grade,
        String unit,
        List<Point> curve,
        OptionalDouble atMost,
        OptionalDouble atLeast,
        OptionalDouble share) {

    /**
     * A point of the curve.
     *
     * @param value of the reading
     * @param below share of the pieces, by mass, that read so much or less; 1
     */
    public record Point(double value, double below) {}

    private static final int POINTS = 120;

    public Distribution {
        curve = List.copyOf(curve);
    }

    /** One for each target on pieces, and grade it looks at, where pieces differ; in the order of the targets. */
    public static List<Distribution> of(Run run) {
        List<Distribution> all = new ArrayList<>();
        Set<List<Integer>> seen = new HashSet<>();
        for (Requirement requirement : run.batch().requirements()) {
            if (requirement instanceof Requirement.OfContent content) {
                // A band is two requirements of one target.
                if (seen.add(List.of(content.target(), content.gauge().grade()))) {
                    of(run, content).ifPresent(all::add);
                }
            }
        }
        return List.copyOf(all);
    }

    private static Optional<Distribution> of(Run run, Requirement.OfContent content) {
        Recipe recipe = run.batch().recipe();
        if (!(recipe.targets().get(content.target()) instanceof Target.OfPieces target)
                || content.gauge() instanceof Gauge.OfLot) {
            return Optional.empty();
        }
        List<Population> every = run.batch().classes(content.species()).populations();
        int grade = content.gauge().grade();
        List<Population> pieces = grade < 0 ? every : List.of(every.get(grade));
        if (pieces.stream().noneMatch(Population::varies)) {
            return Optional.empty();
        }
        double[] values = Gauge.values(pieces, target.reading(), run.course(content.species()), content.stage());
        Scatter scatter = new Scatter(pieces, values);
        TargetState state = TargetState.of(run, content);
        // Values are proportional to kg/m3: what the target shows over what it read.
        double si = run.value(content);
        double scale = si == 0 ? 1 : state.value() / si;
        List<Point> curve = new ArrayList<>();
        double from = scatter.percentile(0.001);
        double to = scatter.percentile(0.999);
        for (int i = 0; i <= POINTS; i++) {
            double value = from + (to - from) * i / POINTS;
            curve.add(new Point(scale * value, scatter.below(value)));
        }
        Quantity share = target.share();
        return Optional.of(new Distribution(
                state.name(),
                state.grade().orElse("lot"),
                state.unit(),
                curve,
                state.atMost(),
                state.atLeast(),
                share == null ? OptionalDouble.empty() : OptionalDouble.of(share.si())));
    }
}
