package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.soakwright.planner.conditions.Movement;
import org.soakwright.recipes.model.Content;
import org.soakwright.recipes.model.Diffusivities;
import org.soakwright.recipes.model.Diffusivity;
import org.soakwright.recipes.model.Gap;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.Grain;
import org.soakwright.recipes.model.Medium;
import org.soakwright.recipes.model.Partition;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Renewal;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Step;
import org.soakwright.solver.chain.Chain;
import org.soakwright.solver.chain.Stage;
import org.soakwright.solver.chain.Start;
import org.soakwright.solver.chain.Surroundings;
import org.soakwright.solver.shape.Axis;
import org.soakwright.solver.shape.Side;
import org.soakwright.solver.stage.Surface;

/**
 * A recipe in the solver's terms. A step is one stage, or one for each of its fills; what lies between two steps or fills is a stage of rest at
 * the conditions of the step before, or of the step itself between its fills.
 */
final class Translation {
    /** In the order in which the solver counts them. */
    private static final List<Grain> DIRECTIONS = List.of(Grain.values());

    private final Recipe recipe;
    private final Films films;

    Translation(Recipe recipe, Films films) {
        this.recipe = recipe;
        this.films = films;
    }

    /**
     * Which step each stage belongs to and what part of its time it takes; a gap belongs to the step it follows, takes no part and has a time of
     * its own.
     *
     * @param next the step that begins or goes on after it
     */
    record Slot(int step, double part, Gap gap, int next) {
        static Slot of(int step, int fills) {
            return new Slot(step, 1.0 / fills, new Gap.None(), step);
        }

        boolean isGap() {
            return part == 0;
        }

        double seconds(double[] stepSeconds) {
            return isGap() ? gap.seconds() : part * stepSeconds[step];
        }
    }

    List<Slot> slots() {
        List<Slot> slots = new ArrayList<>();
        for (int i = 0; i < recipe.steps().size(); i++) {
            Step step = recipe.steps().get(i);
            addGap(slots, i - 1, recipe.gapBefore(i), i);
            for (int f = 0; f < step.fills(); f++) {
                if (f > 0) {
                    addGap(slots, i, step.gapBetweenFills(), i);
                }
                slots.add(Slot.of(i, step.fills()));
            }
        }
        return List.copyOf(slots);
    }

    private static void addGap(List<Slot> slots, int after, Gap gap, int next) {
        if (gap.lasts()) {
            slots.add(new Slot(after, 0, gap, next));
        }
    }

    /** Each grade's pieces as the recipe states them, before any spread and without skins. */
    List<org.soakwright.solver.shape.Grade> lot() {
        return recipe.lot().grades().stream()
                .map(grade -> pieces(grade, sides(grade)))
                .toList();
    }

    private org.soakwright.solver.shape.Grade pieces(Grade grade, List<Side> sides) {
        return new org.soakwright.solver.shape.Grade(
                sides, grade.share() * recipe.lot().volumeM3(), 1);
    }

    /** As one species finds them: where a skin covers one of two faces, the first side lies between both. */
    static List<Side> sides(Grade grade, Species species) {
        List<Side> sides = new ArrayList<>(sides(grade));
        if (Films.twoFaced(species, grade)) {
            Side half = sides.get(0);
            sides.set(0, Side.betweenFaces(2 * half.length(), half.direction()));
        }
        return sides;
    }

    /** From the core of each to its surface. */
    static List<Side> sides(Grade grade) {
        List<Side> sides = new ArrayList<>();
        for (org.soakwright.recipes.model.Side side : grade.sides()) {
            Grain grain = grade.grain(side);
            Axis axis = sides.isEmpty() ? axis(grade) : Axis.SLAB;
            sides.add(new Side(axis, side.depth(), grain == null ? 0 : DIRECTIONS.indexOf(grain)));
        }
        return sides;
    }

    /** Of the first side; any other is a slab's. */
    static Axis axis(Grade grade) {
        return switch (grade.shape()) {
            case SLAB, BRICK -> Axis.SLAB;
            case CYLINDER, SHORT_CYLINDER -> Axis.CYLINDER;
            case SPHERE -> Axis.SPHERE;
        };
    }

    /**
     * One for each species, in which all classes of pieces share the liquor.
     *
     * @param endless the grade whose pieces are taken for endless in all but their shortest side; -1 for none
     */
    List<Chain> chains(int endless) {
        return recipe.species().stream().map(species -> chain(species, endless)).toList();
    }

    private Chain chain(Species species, int endless) {
        Classes classes = Classes.of(recipe, species);
        if (endless >= 0) {
            classes.makeEndless(endless);
        }
        Set<Integer> passing = new HashSet<>();
        List<Slot> slots = slots();
        for (int k = 0; k < slots.size(); k++) {
            if (slots.get(k).isGap()) {
                passing.add(k);
            }
        }
        return Chain.of(
                classes.lot(),
                classes.starts(),
                stages(species, classes.populations(), recipe.steps().size() - 1),
                passing);
    }

    /** As loaded, a uniform content times a factor. A profile from the middle goes both ways where the faces differ. */
    static Start start(Recipe recipe, Species species, Grade grade, double factor) {
        if (species.start() instanceof org.soakwright.recipes.model.Start.Uniform uniform) {
            return new Start.Uniform(factor * recipe.lot().kgPerM3(uniform.content()));
        }
        List<Start.Point> points = ((org.soakwright.recipes.model.Start.Profile) species.start())
                .points().stream()
                        .map(point ->
                                new Start.Point(point.position(), recipe.lot().kgPerM3(point.content())))
                        .toList();
        if (!Films.twoFaced(species, grade)) {
            return new Start.Polyline(points);
        }
        List<Start.Point> through = new ArrayList<>();
        for (int i = points.size() - 1; i > 0; i--) {
            through.add(new Start.Point(
                    (1 - points.get(i).position()) / 2, points.get(i).content()));
        }
        points.forEach(point -> through.add(new Start.Point((1 + point.position()) / 2, point.content())));
        return new Start.Polyline(through);
    }

    /** The first steps of a species alone, its grades as the recipe states them. */
    Chain plain(Species species, int lastStep) {
        List<Population> populations = new ArrayList<>();
        List<org.soakwright.solver.shape.Grade> lot = new ArrayList<>();
        List<Start> starts = new ArrayList<>();
        for (Grade grade : recipe.lot().grades()) {
            populations.add(new Population(populations.size(), grade.share(), List.of()));
            lot.add(pieces(grade, sides(grade, species)));
            starts.add(start(recipe, species, grade, 1));
        }
        return Chain.of(lot, starts, stages(species, populations, lastStep), Set.of())
                .sketch();
    }

    private List<Stage> stages(Species species, List<Population> populations, int lastStep) {
        List<Stage> stages = new ArrayList<>();
        List<Stage> ofSteps = new ArrayList<>();
        for (Slot slot : slots()) {
            if (slot.next() > lastStep) {
                break;
            }
            if (slot.isGap()) {
                stages.add(rest(species, recipe.steps().get(slot.step())));
                continue;
            }
            if (ofSteps.size() == slot.step()) {
                ofSteps.add(stage(species, slot.step(), populations));
            }
            stages.add(ofSteps.get(slot.step()));
        }
        return stages;
    }

    private Stage rest(Species species, Step at) {
        return new Stage(
                diffusivity(species, at),
                partition(species, at),
                new Surface.Sealed(),
                new Surroundings.Rest(),
                0,
                grain(species, at));
    }

    private Stage stage(Species species, int index, List<Population> populations) {
        Step step = recipe.steps().get(index);
        double diffusivity = diffusivity(species, step);
        if (step instanceof Step.Wet wet && species.exchangesWith(Medium.LIQUOR)) {
            Quantity dragOut = wet.dragOut();
            double clinging =
                    dragOut == null ? 0 : dragOut.si() * recipe.lot().massKg().orElseThrow();
            return new Stage(
                    diffusivity,
                    partition(species, step),
                    films.surfaces(index, species, populations),
                    liquor(species, wet),
                    clinging,
                    grain(species, step));
        }
        if (step instanceof Step.Dry dry && species.exchangesWith(Medium.AIR)) {
            Content equilibrium = dry.air().equilibrium().get(species.name());
            double content = equilibrium == null ? 0 : recipe.lot().kgPerM3(equilibrium);
            return new Stage(
                    diffusivity,
                    1,
                    films.surfaces(index, species, populations),
                    new Surroundings.Air(content),
                    0,
                    grain(species, step));
        }
        return rest(species, step);
    }

    private Surroundings liquor(Species species, Step.Wet wet) {
        double content = wet.liquor().kgPerM3(species.name());
        if (wet.liquor().isUnlimited()) {
            return new Surroundings.Plenty(content);
        }
        double volume = wet.liquor().volumeM3(recipe.lot()).orElseThrow();
        double flow = wet instanceof Step.Rinse rinse && rinse.renewal() instanceof Renewal.Flow running
                ? running.rate().si()
                : 0;
        return new Surroundings.Vessel(volume, content, flow, content);
    }

    /** In the first direction stated; the others are {@link #grain} times it. */
    static double diffusivity(Species species, Step step) {
        return Movement.at(stated(species, step).all().get(0), step.temperature());
    }

    /** The same at another temperature than the step's, K. */
    static double diffusivity(Species species, Step step, double kelvin) {
        Diffusivity stated = stated(species, step).all().get(0);
        return stated.dependsOnTemperature()
                ? Movement.at(stated, kelvin).value()
                : stated.value().si();
    }

    /** How the other directions compare. */
    static org.soakwright.solver.shape.Grain grain(Species species, Step step) {
        if (!(stated(species, step) instanceof Diffusivities.ByGrain byGrain)) {
            return org.soakwright.solver.shape.Grain.NONE;
        }
        double first = Movement.at(byGrain.all().get(0), step.temperature());
        List<Double> factors = new ArrayList<>();
        for (Grain grain : DIRECTIONS) {
            Diffusivity own = byGrain.values().get(grain);
            factors.add(own == null ? 1.0 : Movement.at(own, step.temperature()) / first);
        }
        return new org.soakwright.solver.shape.Grain(factors);
    }

    /** A step's own diffusivity goes before the species'. */
    static Diffusivities stated(Species species, Step step) {
        Diffusivities own = step.head().overrides().diffusivity().get(species.name());
        return own == null ? species.diffusivity() : own;
    }

    static double partition(Species species, Step step) {
        Partition own = step.head().overrides().partition().get(species.name());
        return own != null ? own.value() : species.partition().value();
    }
}
