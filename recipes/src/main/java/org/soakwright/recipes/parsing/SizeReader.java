package org.soakwright.recipes.parsing;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Dimension;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Shape;
import org.soakwright.recipes.model.Spread;
import org.soakwright.recipes.model.Word;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Tree;
import org.soakwright.recipes.text.Unit;

/** Reads the sizes of a grade whose shape is known: stated, or from the weight and the proportions. */
final class SizeReader {
    static final Unit MILLIMETRE = Kind.LENGTH.unit("mm").orElseThrow();

    private final Values values;
    private final Problems problems;
    private final Fields fields;
    private final Shape shape;

    SizeReader(Values values, Fields fields, Shape shape) {
        this.values = values;
        this.problems = values.problems();
        this.fields = fields;
        this.shape = shape;
    }

    /** Whether any size that the shape has is stated. */
    boolean anyStated() {
        return shape.dimensions().stream().anyMatch(dimension -> fields.has(dimension.word()));
    }

    /** Whether no size is stated that the shape lacks, with a problem added for each. */
    boolean noneOfOtherShapes() {
        boolean none = true;
        for (Dimension dimension : Dimension.values()) {
            if (fields.has(dimension.word()) && !shape.dimensions().contains(dimension)) {
                problems.add(
                        fields.place(dimension.word()),
                        "a " + shape.word() + " has no " + dimension.word() + ": found one; " + right());
                none = false;
            }
        }
        return none;
    }

    private String right() {
        List<Dimension> missing = shape.dimensions().stream()
                .filter(dimension -> !fields.has(dimension.word()))
                .toList();
        return missing.isEmpty()
                ? "keep only " + Word.list(shape.dimensions())
                : "write such as " + missing.get(0).word() + ": 12 mm";
    }

    /** The sizes as stated. */
    @Nullable
    List<Quantity> stated() {
        if (fields.has("proportions")) {
            sizesAndProportions();
            return null;
        }
        if (!anyStated() && shape.dimensions().size() > 1 && fields.has("weight")) {
            problems.add(
                    fields.place("weight"),
                    "a weight alone gives no " + shape.word() + " its sizes: found neither "
                            + Word.list(shape.dimensions()) + " nor proportions; add them, such as "
                            + Proportions.example(shape));
            return null;
        }
        List<Quantity> sizes = new ArrayList<>();
        for (Dimension dimension : shape.dimensions()) {
            String key = dimension.word();
            Quantity size = values.checked(
                    new Known(values).quantity(key, fields.need(key, "12 mm"), Kind.LENGTH),
                    found -> found.positive("the " + key));
            if (size != null) {
                sizes.add(size);
            }
        }
        return sizes.size() == shape.dimensions().size() ? sizes : null;
    }

    private void sizesAndProportions() {
        if (shape.dimensions().size() == 1) {
            proportions();
            return;
        }
        problems.add(
                fields.place("proportions"),
                anyStated()
                        ? "proportions give sizes that are stated: found both; keep one"
                        : "proportions need a weight or a measured list: found neither; add weight, such as 350 g");
    }

    /** Whether the weight is to give the sizes. */
    boolean areWeighed() {
        boolean proportioned = fields.has("proportions") || shape.dimensions().size() == 1;
        return shape.isFinite() && fields.has("weight") && !anyStated() && proportioned;
    }

    /**
     * The sizes of the piece of median size.
     *
     * @param weight of the average piece; null where it could not be read
     * @param density of the pieces; null where there is none, or it could not be read
     */
    @Nullable
    List<Quantity> fromWeight(@Nullable Quantity weight, @Nullable Spread spread, @Nullable Quantity density) {
        Proportions proportions = proportions();
        if (proportions == null || weight == null || density == null) {
            return null;
        }
        Quantity doubt = weight.giveOrTake() == null ? density.giveOrTake() : weight.giveOrTake();
        if (doubt != null) {
            problems.add(
                    doubt.place(),
                    "sizes from a weight and a density are as sure as those: found give-or-take \"" + doubt
                            + "\"; remove it, or write the sizes with theirs");
            return null;
        }
        double average = weight.si() / density.si();
        double median = spread == null ? average : average / spread.averagePerMedianVolume();
        double[] sizes = proportions.ofVolume(median);
        if (Arrays.stream(sizes).allMatch(SizeReader::isPossible)) {
            return quantities(sizes, MILLIMETRE, weight.place());
        }
        problems.add(
                weight.place(),
                "weight, density and proportions make a piece beyond all measure: found \"" + weight
                        + "\"; write a weight such as 350 g");
        return null;
    }

    /** Smaller than an atom or larger than the Earth is no piece. */
    static boolean isPossible(double metres) {
        return metres > 1e-10 && metres < 1e7;
    }

    /** Those stated, or one to one for a shape of one size. */
    @Nullable
    Proportions proportions() {
        Tree tree = fields.get("proportions");
        return tree == null ? Proportions.one(shape) : Proportions.read(values, shape, tree);
    }

    static List<Quantity> quantities(double[] metres, Unit unit, Place place) {
        return Arrays.stream(metres)
                .mapToObj(size -> Quantity.derived(size, unit, place))
                .toList();
    }
}
