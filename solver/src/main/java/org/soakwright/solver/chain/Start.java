package org.soakwright.solver.chain;

import java.util.List;
import org.soakwright.solver.Require;

/** The profile with which the pieces begin. */
public sealed interface Start {
    /** The largest content anywhere, kg/m3. */
    double most();

    /**
     * The same throughout.
     *
     * @param content kg/m3 of piece
     */
    record Uniform(double content) implements Start {
        public Uniform {
            Require.notNegative("start content", content, "kg/m3");
        }

        @Override
        public double most() {
            return content;
        }
    }

    /**
     * Straight lines between points.
     *
     * @param points from position 0, the core, sealed face or back, to position 1, the wetted surface, in rising order
     */
    record Polyline(List<Point> points) implements Start {
        @Override
        public double most() {
            return points.stream().mapToDouble(Point::content).max().orElseThrow();
        }

        /** kg/m3 at a position. */
        double at(double position) {
            int i = 1;
            while (i < points.size() - 1 && position > points.get(i).position()) {
                i++;
            }
            Point from = points.get(i - 1);
            Point to = points.get(i);
            double part = (position - from.position()) / (to.position() - from.position());
            return from.content() + part * (to.content() - from.content());
        }

        public Polyline {
            points = List.copyOf(points);
            int last = points.size() - 1;
            if (last < 1 || points.get(0).position != 0 || points.get(last).position != 1) {
                throw new IllegalArgumentException("a profile runs from position 0 to position 1, found " + points);
            }
            for (int i = 1; i <= last; i++) {
                if (!(points.get(i).position > points.get(i - 1).position)) {
                    throw new IllegalArgumentException("positions of a profile must rise, found " + points);
                }
            }
        }
    }

    /**
     * A corner of a polyline.
     *
     * @param position 0 to 1
     * @param content kg/m3 of piece
     */
    record Point(double position, double content) {
        public Point {
            Require.notNegative("position", position, "1");
            Require.notNegative("start content", content, "kg/m3");
        }
    }
}
