package org.soakwright.recipes.model;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.function.UnaryOperator;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problem;

/**
 * How fast a species moves.
 *
 * @param value m2/s, above zero; of measured points the one at the lowest temperature, whose give-or-take is that of all
 * @param from the entry of the library it was taken from; null where it is the recipe's own
 */
public record Diffusivity(Quantity value, Law law, @Nullable String from) {
    public Diffusivity {
        value = law instanceof Law.Measured measured ? measured.points().get(0).value() : value;
        Rules.positive("a diffusivity", value);
    }

    /** The same at every temperature. */
    public static Diffusivity of(Quantity value) {
        return new Diffusivity(value, new Law.Constant(), null);
    }

    /** Along the line through measured points. */
    public static Diffusivity of(Law.Measured measured, @Nullable String from) {
        return new Diffusivity(measured.points().get(0).value(), measured, from);
    }

    public Place place() {
        return value.place();
    }

    /** Whether the diffusivity of a step depends on its temperature. */
    public boolean dependsOnTemperature() {
        return !(law instanceof Law.Constant);
    }

    /** So many times as fast at every temperature. */
    public Diffusivity times(double factor) {
        return new Diffusivity(value.times(factor), law.times(factor), from);
    }

    /** Of measured points all change as the first does. */
    public Diffusivity each(UnaryOperator<Quantity> change) {
        Quantity changed = change.apply(value);
        if (law instanceof Law.Measured measured) {
            return of(measured.each(changed, change), from);
        }
        return new Diffusivity(changed, law.each(change), from);
    }

    /** How it changes with temperature. */
    public sealed interface Law {
        /** The same law of a value times a factor. */
        default Law times(double factor) {
            return this;
        }

        /** With its quantities changed. */
        default Law each(UnaryOperator<Quantity> change) {
            return this;
        }

        /** Not at all, or only at one temperature is it asked for. */
        record Constant() implements Law {}

        /**
         * Arrhenius' law.
         *
         * @param at the temperature the value belongs to
         * @param energy J/mol, from 0 to 500 kJ/mol
         */
        record Activated(Quantity at, Quantity energy) implements Law {
            public Activated {
                Rules.requireAll(List.of(Rules.ifNoTemperature(at), Rules.ifNoActivationEnergy(energy)));
            }

            @Override
            public Law each(UnaryOperator<Quantity> change) {
                return new Activated(change.apply(at), change.apply(energy));
            }
        }

        /**
         * As the absolute temperature over the viscosity of water.
         *
         * @param at the temperature the value belongs to
         */
        record Viscous(Quantity at) implements Law {
            public Viscous {
                Rules.temperature(at);
            }

            @Override
            public Law each(UnaryOperator<Quantity> change) {
                return new Viscous(change.apply(at));
            }
        }

        /** The logarithm straight in 1/T between two or more points, kept by rising temperature. */
        record Measured(List<Point> points) implements Law {
            public Measured {
                points = points.stream()
                        .sorted(Comparator.comparingDouble(
                                point -> point.temperature().si()))
                        .toList();
                Rules.require(problems(points));
            }

            private static List<Problem> problems(List<Point> points) {
                if (points.size() < 2) {
                    throw new IllegalArgumentException("a line goes through two points or more: " + points);
                }
                for (int i = 1; i < points.size(); i++) {
                    Quantity one = points.get(i - 1).temperature();
                    Quantity other = points.get(i).temperature();
                    if (one.si() == other.si()) {
                        return List.of(new Problem(
                                other.place(),
                                "two points are at one temperature: found \"" + other + "\" beside \"" + one
                                        + "\"; remove one"));
                    }
                }
                return List.of();
            }

            @Override
            public Law times(double factor) {
                return new Measured(points.stream()
                        .map(point ->
                                new Point(point.temperature(), point.value().times(factor)))
                        .toList());
            }

            private Measured each(Quantity first, UnaryOperator<Quantity> change) {
                double factor = first.si() / points.get(0).value().si();
                List<Point> changed = new ArrayList<>();
                for (Point point : points) {
                    Quantity value = changed.isEmpty() ? first : point.value().times(factor);
                    changed.add(new Point(change.apply(point.temperature()), value));
                }
                return new Measured(changed);
            }
        }
    }

    /** A temperature and the diffusivity found at it. */
    public record Point(Quantity temperature, Quantity value) {
        public Point {
            Rules.requireAll(List.of(Rules.ifNoTemperature(temperature), Rules.ifNotPositive("a diffusivity", value)));
        }
    }
}
