package org.soakwright.planner.report.picture;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.OptionalDouble;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;
import org.soakwright.planner.batch.TargetState;
import org.soakwright.planner.conditions.Strengths;
import org.soakwright.planner.report.TargetWords;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Reference;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.Target;

/**
 * One target over the clock, in its own unit.
 *
 * @param name what is read, without the grade and the confidence
 * @param courses one for each grade looked at, or one
 */
record Watched(String name, String unit, List<Limit> limits, List<Course> courses) {
    /** A limit is drawn by orders of magnitude when it lies below this share of the most. */
    private static final double SMALL = 0.04;

    record Limit(double value, String text) {}

    /** A line without a break. */
    record Piece(double[] clocks, double[] values) {}

    /**
     * What is read in one grade or liquor.
     *
     * @param name as in sheets
     * @param step at whose end it is read
     * @param edges between which most samples lie of what is not known exactly; none where everything is
     */
    record Course(
            String name,
            String label,
            int series,
            List<Piece> pieces,
            List<Piece> edges,
            double readAt,
            String step,
            double value,
            boolean met,
            boolean decides) {
        List<Piece> drawn() {
            List<Piece> all = new ArrayList<>(pieces);
            edges.stream().filter(edge -> edge.values().length > 0).forEach(all::add);
            return all;
        }

        String verdict() {
            return met ? decides ? ", decides" : "" : ", missed";
        }
    }

    /** Every target but the totals, in the order written. */
    static List<Watched> of(History history, List<String> binds) {
        Map<Target, List<TargetState>> byTarget = new LinkedHashMap<>();
        for (TargetState state : history.targets()) {
            if (!(state.target() instanceof Target.OfTotal)) {
                byTarget.computeIfAbsent(state.target(), target -> new ArrayList<>())
                        .add(state);
            }
        }
        List<Watched> watched = new ArrayList<>();
        byTarget.forEach((target, states) -> watched.add(of(history, states, binds)));
        return watched;
    }

    private static Watched of(History history, List<TargetState> states, List<String> binds) {
        TargetState first = states.get(0);
        String name = TargetWords.name(history.recipe(), first);
        String sure = TargetWords.sure(history.recipe(), first.target());
        List<Limit> limits = new ArrayList<>();
        first.atMost().ifPresent(most -> limits.add(new Limit(most, "at most " + Words.written(most) + sure)));
        first.atLeast().ifPresent(least -> limits.add(new Limit(least, "at least " + Words.written(least) + sure)));
        List<Course> courses = new ArrayList<>();
        for (TargetState state : states) {
            courses.add(course(history, state, binds.contains(state.name())));
        }
        return new Watched(name, first.unit(), limits, courses);
    }

    private static Course course(History history, TargetState state, boolean decides) {
        int grade = grade(history, state.grade().orElse(""));
        int step = step(history, state.target());
        boolean ofLiquor = state.target() instanceof Target.OfLiquor;
        return new Course(
                state.name(),
                state.grade().orElse(ofLiquor ? "liquor" : "lot"),
                Math.max(0, grade),
                state.target() instanceof Target.OfLiquor liquor ? ofLiquor(history, liquor) : ofPieces(history, state),
                ofLiquor
                        ? List.of()
                        : history.band(state)
                                .map(band -> List.of(edge(history, band.low()), edge(history, band.high())))
                                .orElse(List.of()),
                history.ends().get(step).to(),
                history.ends().get(step).step().name(),
                state.value(),
                state.met(),
                decides);
    }

    /** The step at whose end a target is read. */
    private static int step(History history, Target target) {
        if (target instanceof Target.OfLiquor liquor) {
            return step(history, liquor.step());
        }
        return step(
                history, target instanceof Target.OfPieces pieces ? pieces.after() : ((Target.OfMass) target).after());
    }

    private static List<Piece> ofPieces(History history, TargetState state) {
        OptionalDouble start = AsLoaded.read(history, state);
        double[] later = history.course(state);
        if (start.isEmpty()) {
            return List.of(new Piece(Arrays.copyOfRange(history.clocks(), 1, later.length + 1), later));
        }
        double[] values = new double[later.length + 1];
        values[0] = start.getAsDouble();
        System.arraycopy(later, 0, values, 1, later.length);
        return List.of(new Piece(history.clocks(), values));
    }

    /** Without the moments too early in a stage to tell. */
    private static Piece edge(History history, double[] values) {
        int[] told = IntStream.range(0, values.length)
                .filter(i -> !Double.isNaN(values[i]))
                .toArray();
        return new Piece(
                Arrays.stream(told).mapToDouble(i -> history.clocks()[i + 1]).toArray(),
                Arrays.stream(told).mapToDouble(i -> values[i]).toArray());
    }

    private static List<Piece> ofLiquor(History history, Target.OfLiquor target) {
        int step = step(history, target.step());
        Step.Wet wet = (Step.Wet) history.ends().get(step).step();
        Species solute =
                history.recipe().species().get(species(history, target.species().name()));
        Quantity like = target.limits().atMost() != null
                ? target.limits().atMost()
                : Objects.requireNonNull(target.limits().atLeast());
        List<Piece> pieces = new ArrayList<>();
        for (History.Fill fill : history.fills(species(history, target.species().name()))) {
            if (fill.step() == step) {
                double[] values = fill.contents().clone();
                for (int i = 0; i < values.length; i++) {
                    values[i] = Strengths.express(wet, solute, values[i], like);
                }
                pieces.add(new Piece(fill.clocks(), values));
            }
        }
        return pieces;
    }

    /** Whether the limit would vanish at the foot of an even axis. */
    boolean spansOrders() {
        double least = limits.stream().mapToDouble(Limit::value).min().orElseThrow();
        return least > 0 && least < SMALL * most();
    }

    Scale scale() {
        double least = Double.POSITIVE_INFINITY;
        for (Course course : courses) {
            for (Piece piece : course.drawn()) {
                least = Math.min(least, History.lowest(piece.values()));
            }
        }
        for (Limit limit : limits) {
            least = Math.min(least, limit.value());
        }
        if (spansOrders()) {
            double foot = limits.stream().mapToDouble(Limit::value).min().orElseThrow() / 10;
            return Scale.logarithmic(Math.max(foot, least > 0 ? least : foot), most());
        }
        return Scale.holding(least, most(), 5);
    }

    /** The parts of lines that the axis can show: by orders of magnitude there is no zero. */
    List<Piece> shown(List<Piece> whole) {
        if (!spansOrders()) {
            return whole;
        }
        double foot = scale().ticks().get(0).value();
        List<Piece> parts = new ArrayList<>();
        for (Piece piece : whole) {
            int from = 0;
            for (int i = 0; i <= piece.values().length; i++) {
                if (i == piece.values().length || piece.values()[i] < foot) {
                    if (i - from > 1) {
                        parts.add(new Piece(
                                Arrays.copyOfRange(piece.clocks(), from, i),
                                Arrays.copyOfRange(piece.values(), from, i)));
                    }
                    from = i + 1;
                }
            }
        }
        return parts;
    }

    private double most() {
        double most = 0;
        for (Course course : courses) {
            for (Piece piece : course.drawn()) {
                most = Math.max(most, History.highest(piece.values()));
            }
        }
        for (Limit limit : limits) {
            most = Math.max(most, limit.value());
        }
        return most;
    }

    private static int step(History history, @Nullable Reference after) {
        for (int i = 0; i < history.ends().size(); i++) {
            if (after != null && history.ends().get(i).step().name().equals(after.name())) {
                return i;
            }
        }
        return history.ends().size() - 1;
    }

    static int species(History history, String name) {
        List<Species> species = history.recipe().species();
        for (int i = 0; i < species.size(); i++) {
            if (species.get(i).name().equals(name)) {
                return i;
            }
        }
        throw new IllegalArgumentException("no species " + name);
    }

    /** Below 0 where there is none of this name: the lot, or a liquor. */
    static int grade(History history, String name) {
        List<Grade> grades = history.grades();
        for (int i = 0; i < grades.size(); i++) {
            if (grades.get(i).name().equals(name)) {
                return i;
            }
        }
        return -1;
    }
}
