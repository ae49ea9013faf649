package org.soakwright.planner.report;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import org.soakwright.recipes.model.Dimension;
import org.soakwright.recipes.model.Faces;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Shape;
import org.soakwright.recipes.model.Side;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Spread;
import org.soakwright.recipes.text.Unit;

/** Pieces in words: how large they are, where in them their core lies and which way leads out of it, and how they differ. */
public final class PieceWords {
    private PieceWords() {}

    /** {@code 70 % tall, short cylinders 250 mm across, 95 mm long}. */
    public static String grade(Grade grade) {
        String share = grade.share() < 1 ? Figures.made(grade.share() * 100) + " % " : "";
        return share + grade.name() + ", " + sizes(grade);
    }

    private static String sizes(Grade grade) {
        return switch (grade.shape()) {
            case SLAB ->
                "slab of " + grade.shortest().size()
                        + (grade.shortest().faces() == Faces.ONE ? " with one face sealed" : "");
            case CYLINDER, SPHERE ->
                grade.shape().word() + " of " + grade.shortest().size();
            case SHORT_CYLINDER ->
                "short cylinders " + grade.sides().get(0).size() + " across, "
                        + grade.sides().get(1).size() + " long"
                        + (sealed(grade).isEmpty() ? "" : ", one flat face sealed");
            case BRICK -> "bricks of " + product(grade.sides()) + sealedSides(grade);
        };
    }

    /** {@code 65 x 102 x 215 mm}; each with its unit where they have several. */
    private static String product(List<Side> sides) {
        Unit unit = sides.get(0).size().unit();
        boolean same = sides.stream().allMatch(side -> side.size().unit().equals(unit));
        return sides.stream()
                        .map(side -> same ? side.size().written() : side.size().toString())
                        .collect(Collectors.joining(" x "))
                + (same ? " " + unit : "");
    }

    private static String sealedSides(Grade grade) {
        List<String> sealed =
                sealed(grade).stream().map(side -> side.dimension().word()).toList();
        return sealed.isEmpty()
                ? ""
                : ", " + Wording.list(sealed) + " sealed on one face" + (sealed.size() > 1 ? " each" : "");
    }

    private static List<Side> sealed(Grade grade) {
        return grade.sides().stream().filter(side -> side.faces() == Faces.ONE).toList();
    }

    /** Whether solute has ways of different lengths out of a piece. */
    public static boolean hasSeveralSides(Grade grade) {
        return grade.sides().size() > 1;
    }

    /** The shortest way out of a piece of several sides: {@code along the length}. */
    public static String way(Grade grade) {
        return grade.shortest().dimension() == Dimension.DIAMETER
                ? "along the radius"
                : "along the " + grade.shortest().dimension().word();
    }

    /** What the shortest way ends at: {@code flat face}, {@code round side}; {@code face} or {@code surface} of other shapes. */
    public static String face(Grade grade) {
        return switch (grade.shape()) {
            case SLAB, BRICK -> "face";
            case CYLINDER, SPHERE -> "surface";
            case SHORT_CYLINDER -> grade.shortest().dimension() == Dimension.DIAMETER ? "round side" : "flat face";
        };
    }

    /** Where the core is: {@code the middle of the thickness}, {@code the core: on the axis, half the length (47.5 mm) in}. */
    public static String core(Grade grade) {
        return switch (grade.shape()) {
            case SLAB -> grade.shortest().faces() == Faces.ONE ? "the sealed face" : "the middle of the thickness";
            case CYLINDER -> "around the axis";
            case SPHERE -> "the centre";
            case SHORT_CYLINDER, BRICK -> "the core: " + place(grade);
        };
    }

    private static String place(Grade grade) {
        List<String> places = new ArrayList<>();
        if (grade.shape() == Shape.SHORT_CYLINDER) {
            places.add("on the axis");
        }
        List<String> halves = grade.sides().stream()
                .filter(side -> side.dimension().hasFaces() && side.faces() == Faces.BOTH)
                .map(side -> half(grade, side))
                .toList();
        if (!halves.isEmpty()) {
            places.add(Wording.list(halves) + " in");
        }
        List<String> sealed =
                sealed(grade).stream().map(side -> side.dimension().word()).toList();
        if (sealed.size() == 1) {
            places.add(
                    grade.shape() == Shape.BRICK
                            ? "at the sealed face of the " + sealed.get(0)
                            : "at the sealed flat face");
        } else if (!sealed.isEmpty()) {
            places.add("where the sealed faces of " + Wording.list(sealed) + " meet");
        }
        return String.join(", ", places);
    }

    /** Where sizes differ, half of the one stated would be wrong for most. */
    private static String half(Grade grade, Side side) {
        return "half the " + side.dimension().word() + (grade.spread() == null ? " (" + half(side.size()) + ")" : "");
    }

    private static String half(Quantity size) {
        BigDecimal half = size.value()
                .divide(BigDecimal.valueOf(2), size.value().scale() + 1, RoundingMode.UNNECESSARY)
                .stripTrailingZeros();
        return half.toPlainString() + " " + size.unit();
    }

    /** Where wetted faces meet, so that solute has the shortest ways of all. */
    public static String corner(Grade grade) {
        if (grade.shape() == Shape.BRICK) {
            return sealed(grade).isEmpty() ? "a corner" : "a corner between wetted faces";
        }
        return sealed(grade).isEmpty() ? "the edge of a flat face" : "the edge of the open flat face";
    }

    /** Whether the pieces of a grade differ in what they hold of a species. */
    public static boolean differ(Grade grade, Species species) {
        return grade.spread() != null || species.startVaries() != null || species.diffusivityVaries() != null;
    }

    /** Whether any pieces of one grade differ. */
    public static boolean differ(Recipe recipe) {
        return differences(recipe).isPresent();
    }

    /** {@code Pieces differ: sizes spread by 3 %; salt at the start varies by 6 %, its diffusivity by 10 %.} */
    public static Optional<String> differences(Recipe recipe) {
        List<String> parts = new ArrayList<>();
        sizes(recipe).ifPresent(parts::add);
        for (Species species : recipe.species()) {
            Spread start = species.startVaries();
            Spread pace = species.diffusivityVaries();
            if (start != null) {
                parts.add(species.name() + " at the start varies by " + start.cv()
                        + (pace == null ? "" : ", its diffusivity by " + pace.cv()));
            } else if (pace != null) {
                parts.add("the diffusivity of " + species.name() + " varies by " + pace.cv());
            }
        }
        return parts.isEmpty() ? Optional.empty() : Optional.of("Pieces differ: " + String.join("; ", parts) + ".");
    }

    /** {@code sizes spread by 3 %}, or by how much in which grade. */
    public static Optional<String> sizes(Recipe recipe) {
        List<Grade> grades = recipe.lot().grades();
        List<String> spreads = new ArrayList<>();
        for (Grade grade : grades) {
            Spread spread = grade.spread();
            if (spread != null) {
                spreads.add(spread.cv().toString());
            }
        }
        if (spreads.isEmpty()) {
            return Optional.empty();
        }
        if (spreads.size() == grades.size() && spreads.stream().distinct().count() == 1) {
            return Optional.of("sizes spread by " + spreads.get(0));
        }
        List<String> each = new ArrayList<>();
        for (Grade grade : grades) {
            Spread spread = grade.spread();
            if (spread != null) {
                each.add(spread.cv() + " in " + grade.name());
            }
        }
        return Optional.of("sizes spread by " + Wording.list(each));
    }

    /** {@code 95 %}. */
    public static String percent(double share) {
        return Figures.made(100 * share) + " %";
    }
}
