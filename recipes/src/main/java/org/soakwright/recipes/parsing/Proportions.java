package org.soakwright.recipes.parsing;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Dimension;
import org.soakwright.recipes.model.Shape;
import org.soakwright.recipes.model.Word;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Tree;

/** How the sizes of a shape stand to each other; all of a shape of one size are one to one. */
record Proportions(Shape shape, List<Double> parts) {
    private static final BigDecimal LEAST = new BigDecimal("0.001");
    private static final BigDecimal MOST = new BigDecimal("1000");

    static Proportions one(Shape shape) {
        return new Proportions(shape, List.of(1.0));
    }

    /** An example for a shape of several sizes. */
    static String example(Shape shape) {
        return "proportions: " + (shape == Shape.BRICK ? "[1, 2.5, 4]" : "[1, 0.4]") + ", " + order(shape);
    }

    private static String order(Shape shape) {
        return shape.dimensions().stream().map(Word::word).collect(Collectors.joining(" : "));
    }

    static @Nullable Proportions read(Values values, Shape shape, Tree tree) {
        Problems problems = values.problems();
        int wanted = shape.dimensions().size();
        if (wanted == 1) {
            problems.add(
                    tree.place(),
                    "a " + shape.word() + " has one size, so it has no proportions: found some; remove them");
            return null;
        }
        if (!(tree instanceof Tree.Items items) || items.items().size() != wanted) {
            if (!(tree instanceof Tree.Broken)) {
                String found = tree instanceof Tree.Items items ? items.items().size() + " of them" : tree.label();
                problems.add(
                        tree.place(),
                        "the proportions of a " + shape.word() + " are " + wanted + " numbers: found " + found
                                + "; write such as " + example(shape));
            }
            return null;
        }
        List<Double> parts = new ArrayList<>();
        for (Tree item : items.items()) {
            BigDecimal part = values.number("proportions", item, "2.5");
            if (part != null && (part.compareTo(LEAST) < 0 || part.compareTo(MOST) > 0)) {
                problems.add(
                        item.place(),
                        "a proportion lies from 0.001 to 1000: found " + item.label() + "; write a number such as 2.5");
            } else if (part != null) {
                parts.add(part.doubleValue());
            }
        }
        return parts.size() == wanted ? new Proportions(shape, parts) : null;
    }

    /** Every size in metres, where one of them is known. */
    double[] with(Dimension dimension, double metres) {
        return scaled(metres / parts.get(shape.dimensions().indexOf(dimension)));
    }

    /** Every size in metres of a piece of the volume. */
    double[] ofVolume(double m3) {
        return scaled(Math.cbrt(m3 / shape.volumeM3(scaled(1))));
    }

    private double[] scaled(double factor) {
        return parts.stream().mapToDouble(part -> part * factor).toArray();
    }
}
