package org.soakwright.planner.report.page;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import org.soakwright.planner.batch.Durations;
import org.soakwright.planner.report.Figures;
import org.soakwright.planner.report.HandlingWords;
import org.soakwright.planner.report.PieceWords;
import org.soakwright.planner.report.Wording;
import org.soakwright.recipes.model.Diffusivities;
import org.soakwright.recipes.model.Diffusivity;
import org.soakwright.recipes.model.Faces;
import org.soakwright.recipes.model.Film;
import org.soakwright.recipes.model.Gap;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.Grain;
import org.soakwright.recipes.model.Medium;
import org.soakwright.recipes.model.Moisture;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Skin;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Spread;
import org.soakwright.recipes.model.Start;
import org.soakwright.recipes.model.Step;

/** What a batch is taken to be like, from its recipe, in plain words: what is constant, what is neglected, by which conventions. */
final class Assumptions {
    private final Recipe recipe;
    private final List<String> points = new ArrayList<>();

    private Assumptions(Recipe recipe) {
        this.recipe = recipe;
    }

    static List<String> of(Recipe recipe) {
        Assumptions assumptions = new Assumptions(recipe);
        assumptions.pieces();
        recipe.species().forEach(assumptions::species);
        assumptions.surroundings();
        assumptions.films();
        assumptions.between();
        return List.copyOf(assumptions.points);
    }

    private void pieces() {
        String shapes = recipe.lot().grades().stream()
                .map(Assumptions::shape)
                .distinct()
                .collect(Collectors.joining("; "));
        points.add("Pieces are " + shapes + ". " + sizes() + " neither shrink nor swell, and liquor or air reaches"
                + " the whole of every open face.");
        if (PieceWords.differ(recipe)) {
            points.add(
                    "What differs from piece to piece is lognormal: the value stated is the median by mass. Readings of a"
                            + " grade are averages over its pieces by mass; a target with a share holds for so much of them, by mass."
                            + " Maps, profiles and cuts show a piece as stated.");
        }
        points.add(
                "Inside a piece solutes move by diffusion (Fick) alone, each by itself, at a diffusivity that does not depend on"
                        + " content. Nothing reacts, and contents count against the piece as loaded where nothing else is said.");
        weight();
        points.add("A piece has the temperature of its step from the step's beginning.");
    }

    /** Where what the pieces weigh, and the water in them, come from. */
    private void weight() {
        Moisture moisture = recipe.lot().moisture();
        boolean gains = recipe.steps().stream().anyMatch(step -> step.head().gain() != null);
        if (gains) {
            points.add("The lot gains or loses in each step what the recipe says, every piece its share.");
        }
        if (moisture != null) {
            points.add("Water is " + moisture.start() + " of the pieces at the start and " + moisture.end()
                    + " at the end, everywhere in them, changing evenly over the time between"
                    + (gains ? "." : "; what is neither water nor a solute stays, and the mass follows."));
        } else if (!gains && recipe.water().isPresent()) {
            points.add("The mass of the pieces changes by what all species change; all else stays.");
        }
    }

    private String sizes() {
        return PieceWords.sizes(recipe)
                .map(spread -> "In a grade " + spread + ", all sides of a piece alike; pieces")
                .orElse("All pieces of a grade have the size stated; they");
    }

    private static String shape(Grade grade) {
        return switch (grade.shape()) {
            case SLAB ->
                "slabs open on " + (grade.shortest().faces() == Faces.ONE ? "one face" : "both faces")
                        + ", their edges neglected";
            case CYLINDER -> "long cylinders, their ends neglected";
            case SPHERE -> "spheres";
            case SHORT_CYLINDER ->
                "short cylinders open on their round side and "
                        + (sealed(grade).isEmpty() ? "both flat faces" : "one flat face");
            case BRICK -> "bricks open on every face" + butSealed(sealed(grade));
        };
    }

    private static List<String> sealed(Grade grade) {
        return grade.sides().stream()
                .filter(side -> side.faces() == Faces.ONE)
                .map(side -> side.dimension().word())
                .toList();
    }

    private static String butSealed(List<String> sealed) {
        return sealed.isEmpty() ? "" : " but one of the " + String.join(" and one of the ", sealed);
    }

    private void species(Species species) {
        String name = species.name();
        String start = species.start() instanceof Start.Uniform uniform
                ? uniform.content() + " everywhere in the piece at the start" + varying(species.startVaries())
                : "the stated profile in the piece at the start";
        points.add(name + ": " + start + "; diffusivity " + pace(species.diffusivity())
                + varying(species.diffusivityVaries()) + ".");
        if (species.exchangesWith(Medium.LIQUOR)) {
            points.add(name + ": at equilibrium a piece holds "
                    + Figures.written(species.partition().value())
                    + " times the content of the liquor, both per volume, at every content"
                    + overridden(name) + ".");
        }
        recipe.lot().grades().stream()
                .flatMap(grade -> species.traits().skin(grade.name()).stream()
                        .map(skin -> skin(skin, grade)
                                + (recipe.lot().grades().size() > 1
                                                && !species.traits().skins().isEmpty()
                                        ? " of " + grade.name()
                                        : "")))
                .distinct()
                .forEach(skin -> points.add(name + ": " + skin + "."));
        if (!species.exchangesWith(Medium.LIQUOR) || !species.exchangesWith(Medium.AIR)) {
            points.add(name + " passes into " + (species.exchangesWith(Medium.LIQUOR) ? "liquor" : "air") + " only.");
        }
    }

    private static String skin(Skin skin, Grade grade) {
        boolean one = skin.face() == Faces.ONE && grade.sides().get(0).faces() == Faces.BOTH;
        return "a skin that passes " + Wording.quantity(skin.permeance())
                + ", counted as contents of the liquor, covers "
                + (one
                        ? "one face"
                                + (PieceWords.hasSeveralSides(grade)
                                        ? " of the thickness, the other is bare"
                                        : ", the other is bare; a surface reading is the mean of both")
                        : "every open face");
    }

    private static String varying(@Nullable Spread spread) {
        return spread == null ? "" : ", varying by " + spread.cv() + " from piece to piece";
    }

    private static String pace(Diffusivities diffusivity) {
        List<String> values = new ArrayList<>();
        if (diffusivity instanceof Diffusivities.ByGrain byGrain) {
            byGrain.values().forEach((grain, value) -> values.add(pace(value) + " " + direction(grain)));
        } else {
            values.add(pace(diffusivity.all().get(0)));
        }
        return Wording.list(values) + (diffusivity.dependsOnTemperature() ? "" : " at every temperature");
    }

    private static String pace(Diffusivity diffusivity) {
        Diffusivity.Law law = diffusivity.law();
        String value = Wording.quantity(diffusivity.value());
        if (law instanceof Diffusivity.Law.Activated activated) {
            return value + " at " + Wording.quantity(activated.at()) + ", changing with temperature by "
                    + activated.energy() + " (Arrhenius)";
        }
        if (law instanceof Diffusivity.Law.Viscous viscous) {
            return value + " at " + Wording.quantity(viscous.at())
                    + ", changing with the absolute temperature over the viscosity of water";
        }
        if (law instanceof Diffusivity.Law.Measured measured) {
            return Wording.list(measured.points().stream()
                            .map(point ->
                                    Wording.quantity(point.value()) + " at " + Wording.quantity(point.temperature()))
                            .toList())
                    + ", in between by the logarithm against the inverse absolute temperature";
        }
        return value;
    }

    private static String direction(Grain grain) {
        return switch (grain) {
            case ALONG -> "along the axis";
            case ACROSS -> "across it";
            case THICKNESS, WIDTH, LENGTH -> "along the " + grain.word();
        };
    }

    private String overridden(String species) {
        List<String> others = new ArrayList<>();
        for (Step step : recipe.steps()) {
            if (step.head().overrides().partition().containsKey(species)) {
                others.add(Figures.written(
                                step.head().overrides().partition().get(species).value())
                        + " in " + step.name());
            }
        }
        return others.isEmpty() ? "" : "; " + String.join(", ", others);
    }

    private void surroundings() {
        if (recipe.steps().stream().anyMatch(Step.Wet.class::isInstance)) {
            points.add("A liquor is well mixed: it has one content throughout its vessel, and grades share it.");
        }
        if (recipe.steps().stream().anyMatch(step -> step instanceof Step.Wet wet && wet.dragOut() != null)) {
            points.add("Liquor that clings to the pieces joins the next liquor and counts in its volume.");
        }
        if (recipe.steps().stream()
                .anyMatch(step -> step instanceof Step.Wet wet && wet.liquor().isUnlimited())) {
            points.add("Liquor called unlimited keeps its content whatever enters it.");
        }
    }

    private void films() {
        Map<String, List<String>> films = new LinkedHashMap<>();
        for (Step step : recipe.steps()) {
            Film film = step instanceof Step.Wet wet ? wet.film() : step instanceof Step.Dry dry ? dry.film() : null;
            if (film != null) {
                films.computeIfAbsent(film(film, step), key -> new ArrayList<>())
                        .add(step.name());
            }
        }
        films.forEach((film, steps) -> points.add(String.join(", ", steps) + ": " + film + "."));
    }

    private static String film(Film film, Step step) {
        if (film instanceof Film.Coefficient coefficient) {
            return "the film between piece and " + (step instanceof Step.Dry ? "air" : "liquor") + " passes "
                    + Wording.quantity(coefficient.value())
                    + (step instanceof Step.Dry ? ", referred to the content of the piece" : ", the same all the time");
        }
        if (film instanceof Film.Computed computed) {
            return "the film between piece and liquor is worked out from how the liquor moves, " + moves(computed);
        }
        return "no film: the surface is at equilibrium at once";
    }

    private static String moves(Film.Computed film) {
        if (film instanceof Film.Still) {
            return "by nothing but its own density";
        }
        if (film instanceof Film.Past past) {
            return "past the pieces at " + Wording.quantity(past.speed())
                    + (past.alsoStill() ? " and by its density" : "");
        }
        if (film instanceof Film.Stirred stirred) {
            return "stirred with " + Wording.quantity(stirred.power());
        }
        Film.Packed packed = (Film.Packed) film;
        return "through a bed of pieces at " + Wording.quantity(packed.speed()) + " over the whole section, "
                + Wording.quantity(packed.voids()) + " of it liquor";
    }

    private void between() {
        Quantity between = recipe.between();
        List<String> drained = new ArrayList<>();
        for (int i = 0; i < recipe.steps().size(); i++) {
            Step step = recipe.steps().get(i);
            if (recipe.gapBefore(i) instanceof Gap.Refilling) {
                drained.add("before " + step.name());
            }
            if (step.gapBetweenFills().lasts()) {
                drained.add("between the fills of " + step.name());
            }
        }
        if (between != null) {
            HandlingWords.transferred(recipe)
                    .ifPresent(where -> points.add("Between " + where + " the pieces rest for "
                            + Durations.practical(between.si())
                            + " at the temperature of the step before; nothing leaves or enters them."));
        }
        if (!drained.isEmpty()) {
            points.add(
                    "While a vessel is drained and refilled, " + Wording.list(drained)
                            + ", the pieces rest in it at the temperature of the liquor that goes; nothing leaves or enters them.");
        }
    }
}
