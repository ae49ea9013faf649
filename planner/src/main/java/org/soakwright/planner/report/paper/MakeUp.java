package org.soakwright.planner.report.paper;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import org.soakwright.planner.batch.Durations;
import org.soakwright.planner.report.Figures;
import org.soakwright.recipes.model.Basis;
import org.soakwright.recipes.model.Content;
import org.soakwright.recipes.model.Medium;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Renewal;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Step;

/** What to make ready for a step: liquor in litres, solute in kilograms, and how high the vessel stands with the pieces in it. */
final class MakeUp {
    private final Recipe recipe;

    MakeUp(Recipe recipe) {
        this.recipe = recipe;
    }

    List<String> of(int index, double seconds) {
        Step step = recipe.steps().get(index);
        if (step instanceof Step.Wet wet) {
            OptionalDouble fill = wet.liquor().volumeM3(recipe.lot());
            return fill.isEmpty()
                    ? List.of("Liquor in plenty, renewed so that its strength does not change: "
                            + solutes(wet, OptionalDouble.empty(), 1) + ".")
                    : List.of(liquor(wet, fill.getAsDouble(), seconds) + " " + level(index, wet, fill.getAsDouble()));
        }
        if (step instanceof Step.Dry dry) {
            return List.of("Air that draws the surface of the pieces towards "
                    + dry.air().equilibrium().entrySet().stream()
                            .map(entry -> entry.getValue() + " " + entry.getKey())
                            .collect(Collectors.joining(", "))
                    + ".");
        }
        return List.of();
    }

    private String liquor(Step.Wet wet, double fill, double seconds) {
        if (wet instanceof Step.Rinse rinse && rinse.renewal() instanceof Renewal.Flow flow) {
            double all = fill + flow.rate().si() * seconds;
            return "Make up " + litres(fill) + ", then let " + flow.rate() + " run through: " + litres(all) + " in "
                    + Durations.practical(seconds) + " in all; " + solutes(wet, OptionalDouble.of(all), 1) + ".";
        }
        int fills = wet.fills();
        String volume = fills > 1
                ? fills + " fills of " + litres(fill) + ", " + litres(fills * fill) + " in all; "
                : litres(fill) + "; ";
        return "Make up " + volume + solutes(wet, OptionalDouble.of(fill), fills) + ".";
    }

    private String solutes(Step.Wet wet, OptionalDouble volume, int fills) {
        List<String> solutes = new ArrayList<>();
        for (Species species : recipe.species()) {
            double strength = wet.liquor().kgPerM3(species.name());
            if (species.exchangesWith(Medium.LIQUOR) && strength > 0) {
                solutes.add(
                        species.name() + " " + strength(wet, species, strength) + toDissolve(strength, volume, fills));
            }
        }
        return solutes.isEmpty() ? "nothing to dissolve" : String.join("; ", solutes);
    }

    private static String toDissolve(double strength, OptionalDouble volume, int fills) {
        if (volume.isEmpty()) {
            return "";
        }
        double kg = strength * volume.getAsDouble();
        return fills > 1
                ? ", dissolve " + kilograms(kg) + " in each fill, " + kilograms(fills * kg) + " in all"
                : ", dissolve " + kilograms(kg);
    }

    private static String strength(Step.Wet wet, Species species, double kgPerM3) {
        Content content = wet.liquor().contents().get(species.name());
        String written = content != null && content.basis() == Basis.PER_MASS ? " (" + content + ")" : "";
        return Figures.made(kgPerM3) + " g/L" + written;
    }

    private String level(int index, Step.Wet wet, double fill) {
        double pieces = recipe.lot().volumeM3();
        boolean overflows = wet instanceof Step.Rinse rinse && rinse.renewal() instanceof Renewal.Flow;
        double clinging = overflows ? 0 : clinging(index);
        String what = overflows ? "It overflows with the lot in at " : "Level with the lot in: ";
        return what + litres(pieces + fill + clinging) + " (" + litres(pieces) + " of pieces, " + litres(fill)
                + " of liquor" + (clinging > 0 ? ", " + litres(clinging) + " clinging from before" : "") + ").";
    }

    /** What the step in liquor before this one leaves on the pieces, m3; for a step of several fills, what a fill leaves to the next. */
    private double clinging(int index) {
        double most =
                recipe.steps().get(index).fills() > 1 ? dragOut(recipe.steps().get(index)) : 0;
        for (int i = index - 1; i >= 0; i--) {
            if (recipe.steps().get(i) instanceof Step.Wet) {
                return Math.max(most, dragOut(recipe.steps().get(i)));
            }
        }
        return most;
    }

    private double dragOut(Step step) {
        Quantity dragOut = step instanceof Step.Wet wet ? wet.dragOut() : null;
        return volume(dragOut);
    }

    private double volume(@Nullable Quantity dragOut) {
        return dragOut == null ? 0 : dragOut.si() * recipe.lot().massKg().orElseThrow();
    }

    static String litres(double m3) {
        return Figures.made(m3 * 1000) + " L";
    }

    private static String kilograms(double kg) {
        return Figures.made(kg) + " kg";
    }
}
