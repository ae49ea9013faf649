package org.soakwright.recipes.library;

import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/** What a source gives: one value, a range, or a value at each of several temperatures. All values are above zero. */
public sealed interface Figure {
    Place place();

    /** The smallest value given, in SI. */
    double least();

    /** The largest value given, in SI. */
    double most();

    /** The value, where there is only one; a range leaves the choice to whoever uses it. */
    default Optional<Quantity> single() {
        return Optional.empty();
    }

    /**
     * One value.
     *
     * @param giveOrTake what the source prints after a plus-minus sign; null where it prints none
     */
    record One(Quantity value, @Nullable Quantity giveOrTake) implements Figure {
        public One {
            value.positive("a value");
            if (giveOrTake != null) {
                giveOrTake.positive("`give-or-take`");
            }
        }

        @Override
        public Place place() {
            return value.place();
        }

        @Override
        public double least() {
            return value.si();
        }

        @Override
        public double most() {
            return value.si();
        }

        @Override
        public Optional<Quantity> single() {
            return Optional.of(value);
        }

        @Override
        public String toString() {
            return giveOrTake == null ? value.toString() : value + " give or take " + giveOrTake;
        }
    }

    /** Two ends. */
    record Range(Span span, Across across) implements Figure {
        public Range {
            span.from().positive("a value");
            if (span.isOne()) {
                throw new Unsound(
                        span.place(), "a range has two ends: found \"" + span + "\" for both; write the one value");
            }
        }

        @Override
        public Place place() {
            return span.place();
        }

        @Override
        public double least() {
            return span.from().si();
        }

        @Override
        public double most() {
            return span.to().si();
        }

        @Override
        public String toString() {
            return span + " across " + across.word();
        }
    }

    /** A value and its temperature. */
    record Point(Quantity temperature, Quantity value) {
        public Point {
            temperature.possible();
            value.positive("a value");
        }
    }

    /** A value at each of two or more temperatures, which rise. */
    record ByTemperature(Place place, List<Point> points) implements Figure {
        public ByTemperature {
            points = List.copyOf(points);
            if (points.size() < 2) {
                throw new Unsound(place, "values by temperature are two or more: found " + points.size());
            }
            for (int i = 1; i < points.size(); i++) {
                Quantity before = points.get(i - 1).temperature();
                Quantity after = points.get(i).temperature();
                if (!(after.si() > before.si())) {
                    throw new Unsound(
                            after.place(), "temperatures rise: found \"" + after + "\" after \"" + before + "\"");
                }
            }
        }

        @Override
        public double least() {
            return points.stream()
                    .mapToDouble(point -> point.value().si())
                    .min()
                    .orElseThrow();
        }

        @Override
        public double most() {
            return points.stream()
                    .mapToDouble(point -> point.value().si())
                    .max()
                    .orElseThrow();
        }

        @Override
        public String toString() {
            return points.stream()
                    .map(point -> point.value() + " at " + point.temperature())
                    .collect(Collectors.joining(", "));
        }
    }
}
