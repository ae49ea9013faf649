package org.soakwright.recipes.model;

import java.util.ArrayList;
import java.util.List;
import java.util.function.UnaryOperator;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problem;
import org.soakwright.recipes.text.Shown;
import org.soakwright.recipes.text.Unit;

/** What a piece holds of a species as loaded. */
public sealed interface Start {
    /** The unit in which results of the species are shown. */
    Unit unit();

    /** Whether the start is counted per mass or per volume of piece. */
    Basis basis();

    /** Whether there is none anywhere, so that nothing can be a share of it. */
    boolean isZero();

    /** With its contents changed. */
    Start each(UnaryOperator<Quantity> change);

    /** The same everywhere. */
    record Uniform(Content content) implements Start {
        @Override
        public Unit unit() {
            return content.unit();
        }

        @Override
        public Basis basis() {
            return content.basis();
        }

        @Override
        public boolean isZero() {
            return content.si() == 0;
        }

        @Override
        public Start each(UnaryOperator<Quantity> change) {
            return new Uniform(content.each(change));
        }
    }

    /** A content at a position: 0 is the centre or the sealed face, 1 the wetted surface. */
    record Point(double position, Content content, Place place) {}

    /** Straight lines between points, from position 0 to position 1, strictly increasing, in one basis. */
    record Profile(Place place, List<Point> points) implements Start {
        public Profile {
            points = List.copyOf(points);
            Rules.require(problems(place, points));
        }

        @Override
        public Start each(UnaryOperator<Quantity> change) {
            return new Profile(
                    place,
                    points.stream()
                            .map(point ->
                                    new Point(point.position(), point.content().each(change), point.place()))
                            .toList());
        }

        private static List<Problem> problems(Place place, List<Point> points) {
            if (points.size() < 2) {
                return List.of(new Problem(
                        place,
                        "a profile has two points or more: found " + points.size()
                                + "; write such as [[0, 190 g/kg], [1, 150 g/kg]]"));
            }
            List<Problem> problems = new ArrayList<>();
            Point first = points.get(0);
            Point last = points.get(points.size() - 1);
            if (first.position() != 0) {
                problems.add(new Problem(
                        first.place(),
                        "a profile begins at position 0, the centre or sealed face: found "
                                + Shown.number(first.position())));
            }
            if (last.position() != 1) {
                problems.add(new Problem(
                        last.place(),
                        "a profile ends at position 1, the wetted surface: found " + Shown.number(last.position())));
            }
            for (int i = 1; i < points.size(); i++) {
                Point point = points.get(i);
                if (!(point.position() > points.get(i - 1).position())) {
                    problems.add(new Problem(
                            point.place(),
                            "the positions of a profile increase: found " + Shown.number(point.position()) + " after "
                                    + Shown.number(points.get(i - 1).position())));
                }
                if (point.content().basis() != first.content().basis()) {
                    problems.add(new Problem(
                            point.content().place(),
                            "the contents of a profile are all by mass or all by volume: found \"" + point.content()
                                    + "\" after \"" + first.content() + "\""));
                }
            }
            return problems;
        }

        @Override
        public Unit unit() {
            return points.get(0).content().unit();
        }

        @Override
        public Basis basis() {
            return points.get(0).content().basis();
        }

        @Override
        public boolean isZero() {
            return points.stream().allMatch(point -> point.content().si() == 0);
        }
    }
}
