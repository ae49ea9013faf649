package org.soakwright.recipes.model;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problem;
import org.soakwright.recipes.text.Unsound;

/** What makes a lot whole. */
final class LotRules {
    /** Bounds the error of shares written in decimals. */
    private static final double SHARE_SUM_TOLERANCE = 1e-9;

    private LotRules() {}

    static void check(Place place, Amount amount, @Nullable Quantity density, List<Grade> grades) {
        List<Problem> problems = new ArrayList<>();
        if (grades.isEmpty()) {
            problems.add(new Problem(
                    place,
                    "a lot has at least one grade of pieces; write one such as {shape: slab, thickness: 18 mm}"));
        }
        if (density != null) {
            problems.addAll(Rules.ifNotPositive("the density", density));
        } else if (amount instanceof Amount.Weighed) {
            problems.add(new Problem(place, "the lot is given by mass and has no density; add one such as 1120 kg/m3"));
        }
        if (amount instanceof Amount.ByCount) {
            grades.stream()
                    .filter(grade -> pieceM3(grade, density).isEmpty())
                    .forEach(grade -> problems.add(uncountable(grade)));
        }
        if (density != null && density.si() > 0) {
            grades.forEach(grade -> problems.addAll(contradictions(grade, density)));
        }
        problems.addAll(Names.duplicates(
                "grades",
                grades.stream()
                        .map(grade -> new Reference(grade.name(), grade.place()))
                        .toList()));
        double sum = grades.stream().mapToDouble(Grade::share).sum();
        if (!grades.isEmpty() && Math.abs(sum - 1) > SHARE_SUM_TOLERANCE) {
            problems.add(new Problem(
                    grades.get(0).place(),
                    "the shares of the grades sum to " + Rules.percent(sum) + "; they must sum to 100 %"));
        }
        if (!problems.isEmpty()) {
            throw new Unsound(problems);
        }
    }

    /** What was put in the place of what is written contradicts nobody. Of a list the reader compares the pieces themselves, before a fit comes between. */
    private static List<Problem> contradictions(Grade grade, Quantity density) {
        OptionalDouble average = grade.averageM3();
        boolean written = grade.weight() != null
                && grade.weight().isWritten()
                && grade.sides().stream().allMatch(side -> side.size().isWritten());
        return grade.weight() == null || !written || average.isEmpty() || grade.fit() != null
                ? List.of()
                : Rules.ifNotWeighing(grade.weight(), average.getAsDouble() * density.si());
    }

    private static Problem uncountable(Grade grade) {
        boolean weighed = grade.weight() != null;
        return new Problem(
                grade.place(),
                "a count needs the volume of each piece: found " + (weighed ? "no density" : "no weight") + " for the "
                        + grade.shape().word() + " " + grade.name() + "; "
                        + (weighed ? "add density to the lot, such as 1120 kg/m3" : "add weight, such as 350 g")
                        + ", or write the lot's mass or volume");
    }

    static OptionalDouble pieceM3(Grade grade, @Nullable Quantity density) {
        return grade.weight() != null && density != null
                ? OptionalDouble.of(grade.weight().si() / density.si())
                : grade.averageM3();
    }
}
