package org.soakwright.planner.report.paper;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import org.soakwright.planner.batch.EachGrade;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.TargetState;
import org.soakwright.planner.report.PieceWords;
import org.soakwright.recipes.model.Counted;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.GradeScope;
import org.soakwright.recipes.model.Phase;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Reading;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Reference;
import org.soakwright.recipes.model.Shape;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Target;

/** How to take what the targets speak of. */
final class Sampling {
    private final Recipe recipe;

    private Sampling(Recipe recipe) {
        this.recipe = recipe;
    }

    /** What is taken together: pieces of these grades, after this step, prepared in this way. */
    private record Take(String after, String reading, String how) {}

    private record Of(Set<String> species, Set<String> grades) {}

    static List<String> of(Run run, Clock clock) {
        Recipe recipe = run.batch().recipe();
        Sampling sampling = new Sampling(recipe);
        Map<Take, Of> takes = new LinkedHashMap<>();
        for (TargetState state : EachGrade.of(run)) {
            if (state.target() instanceof Target.OfPieces pieces) {
                String how = sampling.how(pieces, state) + sampling.against(pieces, run);
                Take take = new Take(
                        sampling.after(pieces.after()), pieces.reading().word(), how);
                Of of = takes.computeIfAbsent(take, key -> new Of(new LinkedHashSet<>(), new LinkedHashSet<>()));
                of.species().add(pieces.species().name());
                of.grades().add(state.grade().orElseThrow());
            }
        }
        List<String> lines = new ArrayList<>();
        takes.forEach((take, of) -> lines.add(
                "After " + take.after() + ", at " + clock.both(endOf(run, take.after())) + ": " + listed(of.species())
                        + " " + take.reading() + grades(recipe, of.grades()) + ". " + take.how()));
        for (TargetState state : EachGrade.of(run)) {
            if (state.target() instanceof Target.OfLiquor liquor) {
                lines.add("At the end of " + liquor.step().name()
                        + ", before the liquor is drained: stir, take a sample of" + " the liquor, assay it for "
                        + liquor.species().name() + ".");
            } else if (state.target() instanceof Target.OfMass mass) {
                String after = sampling.after(mass.after());
                lines.add("At the end of " + after + ", at " + clock.both(endOf(run, after))
                        + ": weigh the whole lot, drained as it was when it was loaded.");
            }
        }
        if (!takes.isEmpty()) {
            lines.add("How many pieces are taken, and where in the lot, is for the local sampling plan.");
        }
        return lines.stream().distinct().toList();
    }

    private static String grades(Recipe recipe, Set<String> grades) {
        return recipe.lot().grades().size() == 1 ? "" : ", " + listed(grades);
    }

    private static String listed(Set<String> names) {
        List<String> all = new ArrayList<>(names);
        int last = all.size() - 1;
        return last == 0 ? all.get(0) : String.join(", ", all.subList(0, last)) + " and " + all.get(last);
    }

    private String after(@Nullable Reference after) {
        return after != null
                ? after.name()
                : recipe.steps().get(recipe.steps().size() - 1).name();
    }

    static double endOf(Run run, String step) {
        for (int i = 0; i < run.seconds().length; i++) {
            if (run.end(i).step().name().equals(step)) {
                return run.end(i).to();
            }
        }
        throw new IllegalArgumentException("no step " + step);
    }

    /** What the assay is counted against. */
    private String against(Target.OfPieces target, Run run) {
        String species = target.species().name();
        String water = " Find the water of the same sample too: the limit is " + species;
        if (target.counted() instanceof Counted.InPhase in) {
            return water + (in.phase() == Phase.WATER ? " over " + species + " and water together." : " over water.");
        }
        return switch (((Counted.OfPiece) target.counted()).per()) {
            case PRESENT -> " Count it per kg of the sample as it is.";
            case DRY -> water + " per kg of all that is not water.";
            case LOADED ->
                run.end(0).massKg().isPresent()
                        ? " The limit is per kg as loaded: take what is found per kg of the sample times the lot's mass then"
                                + " over its mass as loaded."
                        : "";
        };
    }

    private String how(Target.OfPieces target, TargetState state) {
        if (target.grade() instanceof GradeScope.WholeLot) {
            String all = "pieces of all grades, taken in the shares in which they are loaded";
            Quantity share = target.share();
            return share == null
                    ? "Homogenise whole " + all + "."
                    : "Assay " + all + ", each alone: " + share + " of them, by mass, are to keep the limit.";
        }
        Grade grade = recipe.lot().grade(state.grade().orElseThrow()).orElseThrow();
        Species species = recipe.species(target.species().name()).orElseThrow();
        return prepared(target.reading(), grade, target.share() != null, species.hasUnlikeFaces(grade))
                + counted(target, grade);
    }

    private String prepared(Reading reading, Grade grade, boolean each, boolean unlike) {
        return switch (reading) {
            case MEAN -> (each ? "Homogenise each piece alone" : "Homogenise whole pieces") + apart();
            case CORE -> "Cut a plug from " + PieceWords.core(grade) + apart();
            case SURFACE ->
                (unlike
                                ? "Take the skin off its face and shave a thin layer off "
                                        + (PieceWords.hasSeveralSides(grade)
                                                ? "every face; the mean over all counts"
                                                : "either face; the mean of both counts")
                                : "Shave a thin layer off the wetted surface")
                        + apart();
            case HIGHEST -> layers(grade) + ", assay each; the highest counts" + apart();
            case LOWEST -> layers(grade) + ", assay each; the lowest counts" + apart();
            case RANGE -> layers(grade) + ", assay each; the highest less the lowest counts" + apart();
        };
    }

    /** What is made of the readings of several pieces that differ. */
    private String counted(Target.OfPieces target, Grade grade) {
        Quantity share = target.share();
        if (share != null) {
            return " Of the pieces " + share + ", by mass, are to keep the limit, each read alone.";
        }
        Species species = recipe.species(target.species().name()).orElseThrow();
        return target.reading() != Reading.MEAN && PieceWords.differ(grade, species)
                ? " Pieces differ: the average of several counts."
                : "";
    }

    private String apart() {
        return recipe.lot().grades().size() == 1 ? "." : ", each grade by itself.";
    }

    /** Of several sides, what is least or most may lie where faces meet. */
    private static String layers(Grade grade) {
        if (PieceWords.hasSeveralSides(grade)) {
            return "Cut what lies between the core and " + PieceWords.corner(grade) + " into small parts";
        }
        String through = grade.shape() == Shape.SLAB ? "through the whole thickness" : "from the surface to the core";
        return "Cut a plug " + through + " into thin layers";
    }
}
