package org.soakwright.planner.report.picture;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.soakwright.planner.batch.StepEnd;
import org.soakwright.planner.batch.TargetState;
import org.soakwright.planner.report.PieceWords;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Reading;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Target;

/**
 * A reading at the ends of steps. Between them the trace follows means, and profiles of one piece along one way: no share of pieces that
 * differ, no average of theirs but the mean, and of pieces of several sides nothing that lies elsewhere.
 */
final class EndReadings {
    private static final double SAME = 1e-9;

    private final History history;
    private final int species;
    private final int grade;
    private final Target.OfPieces target;
    private final TargetState state;

    EndReadings(History history, int species, int grade, Target.OfPieces target, TargetState state) {
        this.history = history;
        this.species = species;
        this.grade = grade;
        this.target = target;
        this.state = state;
    }

    /** Whether the trace follows the reading itself. */
    static boolean areAll(History history, int species, int grade, Target.OfPieces target) {
        if (target.share() != null || (target.reading() != Reading.MEAN && differ(history, species, grade))) {
            return true;
        }
        boolean along = target.reading() == Reading.MEAN || target.reading() == Reading.CORE;
        return !along && PieceWords.hasSeveralSides(history.grades().get(grade));
    }

    private static boolean differ(History history, int species, int grade) {
        return PieceWords.differ(
                history.grades().get(grade), history.recipe().species().get(species));
    }

    /**
     * From the start, where it is known, over the end of every step.
     *
     * @param read when the target is read, s
     * @param factor how much of the species' unit one of the target's unit is
     */
    Watched.Piece piece(double read, double factor) {
        List<double[]> points = new ArrayList<>();
        start().ifPresent(value -> points.add(new double[] {0, value / factor}));
        for (StepEnd end : history.ends()) {
            OptionalDouble value = end.to() == read ? OptionalDouble.of(state.value() * factor) : at(end);
            value.ifPresent(known -> points.add(new double[] {end.to(), known / factor}));
        }
        return new Watched.Piece(
                points.stream().mapToDouble(point -> point[0]).toArray(),
                points.stream().mapToDouble(point -> point[1]).toArray());
    }

    /** What pieces read alike as loaded, or on average where their start varies. */
    private OptionalDouble start() {
        Species loaded = history.recipe().species().get(species);
        if (grade < 0 || (target.share() != null && loaded.startVaries() != null)) {
            return OptionalDouble.empty();
        }
        double value = history.readings(species, grade, target.reading())[0];
        Grade pieces = history.grades().get(grade);
        return OptionalDouble.of(
                target.reading() == Reading.MEAN || loaded.startVaries() == null
                        ? value
                        : value
                                * new Loaded(history.recipe(), species).mean(pieces)
                                / new Loaded(history.recipe(), species).profile(new double[] {0})[0]);
    }

    private OptionalDouble at(StepEnd end) {
        if (grade < 0) {
            return OptionalDouble.empty();
        }
        StepEnd.Content content = end.pieces().get(grade).species().get(species);
        Quantity share = target.share();
        if (share == null) {
            return OptionalDouble.of(content.value(target.reading()));
        }
        boolean band = state.atLeast().isPresent() && state.atMost().isPresent();
        if (!band) {
            return told(content, state.atLeast().isEmpty() ? share.si() : 1 - share.si());
        }
        // A band reads the side that is nearer to failing, which is known of its own step only.
        return OptionalDouble.empty();
    }

    private OptionalDouble told(StepEnd.Content content, double below) {
        List<Double> values = content.distribution().getOrDefault(target.reading(), List.of());
        for (int i = 0; i < values.size(); i++) {
            if (Math.abs(StepEnd.SHARES.get(i) - below) < SAME) {
                return OptionalDouble.of(values.get(i));
            }
        }
        return OptionalDouble.empty();
    }
}
