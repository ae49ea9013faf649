package org.soakwright.recipes.parsing;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Dimension;
import org.soakwright.recipes.model.Fit;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Shape;
import org.soakwright.recipes.model.Spread;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Source;
import org.soakwright.recipes.text.Unit;

/** Makes grades of a list of measured pieces: their median sizes and their spread. */
final class MeasuredReader {
    /** As many pieces as any median and spread should stand on. */
    private static final int FEWEST_IN_A_GRADE = 5;

    /** A lognormal this wide has a number of many digits that says no more. */
    private static final double LARGEST_SHOWN = 10;

    private static final Unit PERCENT = Kind.FRACTION.unit("%").orElseThrow();

    private final Values values;
    private final Problems problems;
    private final Lists lists;
    private final Fields fields;
    private final Shape shape;

    MeasuredReader(Values values, Lists lists, Fields fields, Shape shape) {
        this.values = values;
        this.problems = values.problems();
        this.lists = lists;
        this.fields = fields;
        this.shape = shape;
    }

    /** One for each grade asked for, smallest first. */
    @Nullable
    List<Sized> sized(Measured measured, @Nullable Quantity weight, LotReader.Common common) {
        boolean alone = nothingBeside(measured);
        Proportions proportions = proportions();
        if (!measured.isWhole()) {
            return null;
        }
        Source source = problems.attempt(() -> lists.list(measured.named(), measured.place()));
        SizeList list = source == null ? null : new ListReader(source, shape, problems).list();
        if (list == null || proportions == null || !alone || !enough(list, measured)) {
            return null;
        }
        return agree(list, proportions, weight, common.density(), measured)
                ? fitted(list, proportions, weight, measured)
                : null;
    }

    /** Whether nothing is stated that the list says already, with a problem added for each that is. */
    private boolean nothingBeside(Measured measured) {
        List<String> said = Stream.concat(shape.dimensions().stream().map(Dimension::word), Stream.of("spread"))
                .filter(fields::has)
                .toList();
        said.forEach(key ->
                problems.add(fields.place(key), "the list gives the " + key + ": found it stated too; keep one"));
        boolean oneWeight = measured.grades() > 1 && fields.has("weight");
        if (oneWeight) {
            problems.add(
                    fields.place("weight"),
                    "one weight cannot hold for " + measured.grades()
                            + " grades: found one; write a column such as weight [g] into the list");
        }
        return said.isEmpty() && !oneWeight;
    }

    private @Nullable Proportions proportions() {
        if (shape.dimensions().size() > 1 && !fields.has("proportions")) {
            problems.add(
                    fields.place(),
                    "the other sizes of a measured " + shape.word() + " need proportions: found none; write such as "
                            + Proportions.example(shape));
            return null;
        }
        return new SizeReader(values, fields, shape).proportions();
    }

    private boolean enough(SizeList list, Measured measured) {
        int needed = FEWEST_IN_A_GRADE * measured.grades();
        if (list.rows().size() >= needed) {
            return true;
        }
        problems.add(
                measured.place(),
                "too few pieces for " + measured.grades() + " grades: found "
                        + list.rows().size() + " where " + needed + " are needed; measure more, or make fewer grades");
        return false;
    }

    /** Whether weights, sizes and density of the pieces agree as far as all are known. */
    private boolean agree(
            SizeList list,
            Proportions proportions,
            @Nullable Quantity weight,
            @Nullable Quantity density,
            Measured measured) {
        Unit unit = list.weightUnit();
        if (weight != null && unit != null) {
            problems.add(weight.place(), "the list weighs each piece: found a weight beside it; keep one");
            return false;
        }
        double average =
                list.rows().stream().mapToDouble(SizeList.Row::weight).average().orElseThrow();
        Quantity weighed = unit == null ? weight : Quantity.derived(average, unit, measured.place());
        if (weighed == null || density == null || !shape.isFinite()) {
            return true;
        }
        double kg = density.si()
                * list.rows().stream()
                        .mapToDouble(row -> volume(proportions, list, row))
                        .average()
                        .orElseThrow();
        return problems.attempt(() -> weighed.weighing(kg)) != null;
    }

    private double volume(Proportions proportions, SizeList list, SizeList.Row row) {
        return shape.volumeM3(proportions.with(list.dimension(), row.size()));
    }

    private @Nullable List<Sized> fitted(
            SizeList list, Proportions proportions, @Nullable Quantity weight, Measured measured) {
        Fitting fitting = Fitting.of(
                new Sample(list.rows().stream()
                        .map(row -> new Sample.Piece(row.size(), counts(list, proportions, row), 1))
                        .toList()),
                measured.grades());
        List<Sized> sized = new ArrayList<>();
        for (Fitting.Part part : fitting.parts()) {
            Unit unit = list.weightUnit();
            Quantity each = unit == null ? weight : Quantity.derived(part.averageMass(), unit, measured.place());
            Spread spread = spread(part.lognormal().cv(), measured);
            List<Quantity> sizes = sizes(list, proportions, part, measured);
            if (sizes == null || (spread == null && part.lognormal().cv() > 0)) {
                return null;
            }
            sized.add(new Sized(sizes, each, spread, fit(list, fitting, part, measured)));
        }
        return sized;
    }

    /** What a piece counts: its weight; of a shape that its size gives, its volume; else as much as any other. */
    private double counts(SizeList list, Proportions proportions, SizeList.Row row) {
        if (list.weightUnit() != null) {
            return row.weight();
        }
        return shape.isFinite() ? volume(proportions, list, row) : 1;
    }

    private @Nullable Spread spread(double cv, Measured measured) {
        if (cv > Spread.MOST) {
            problems.add(
                    measured.place(),
                    "the pieces differ too much for one grade: found a spread of "
                            + (cv > LARGEST_SHOWN
                                    ? "more than 1000 %"
                                    : Quantity.derived(cv, PERCENT, measured.place())
                                            .toString())
                            + " where 60 % is the most; make "
                            + (measured.grades() == 1 ? "" : "more ") + "grades of the list, such as {file: "
                            + measured.named() + ", grades: " + (measured.grades() + 2) + "}");
            return null;
        }
        return cv > 0 ? problems.attempt(() -> new Spread(Quantity.derived(cv, PERCENT, measured.place()))) : null;
    }

    private @Nullable List<Quantity> sizes(
            SizeList list, Proportions proportions, Fitting.Part part, Measured measured) {
        double[] sizes = proportions.with(list.dimension(), part.lognormal().median());
        if (Arrays.stream(sizes).allMatch(SizeReader::isPossible)) {
            return SizeReader.quantities(sizes, list.unit(), measured.place());
        }
        problems.add(
                measured.place(), "the list and the proportions make pieces beyond all measure; correct one of them");
        return null;
    }

    private static Fit fit(SizeList list, Fitting fitting, Fitting.Part part, Measured measured) {
        return new Fit(
                measured.named(),
                part.pieces(),
                fitting.worth(),
                Quantity.derived(part.lognormal().median(), list.unit(), measured.place()),
                part.lognormal().cv(),
                fitting.worst());
    }
}
