package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.soakwright.recipes.model.Content;
import org.soakwright.recipes.model.Diffusivities;
import org.soakwright.recipes.model.Diffusivity;
import org.soakwright.recipes.model.Film;
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
 * A recipe in the solver's terms. A step is one stage, or one for each of its fills; the time between two steps is a stage
 * of rest at the conditions of the step before.
 */
final class Translation {
    /** Gas constant, J/(mol K); exact since the SI of 2019. */
    private static final double GAS_CONSTANT = 8.31446261815324;

    /** In the order in which the solver counts them. */
    private static final List<Grain> DIRECTIONS = List.of(Grain.values());

    private final Recipe recipe;

    Translation(Recipe recipe) {
        NotYet.require(recipe);
        this.recipe = recipe;
    }

    /** Which step each stage belongs to and what part of its time it takes; a stage between steps has a fixed time. */
    record Slot(int step, double part, double fixedSeconds) {
        double seconds(double[] stepSeconds) {
            return fixedSeconds + part * stepSeconds[step];
        }
    }

    List<Slot> slots() {
        List<Slot> slots = new ArrayList<>();
        for (int i = 0; i < recipe.steps().size(); i++) {
            if (i > 0 && transfer() > 0) {
                slots.add(new Slot(i - 1, 0, transfer()));
            }
            int fills = fills(recipe.steps().get(i));
            for (int f = 0; f < fills; f++) {
                slots.add(new Slot(i, 1.0 / fills, 0));
            }
        }
        return List.copyOf(slots);
    }

    static int fills(Step step) {
        return step instanceof Step.Rinse rinse && rinse.renewal() instanceof Renewal.Fills fills ? fills.count() : 1;
    }

    private double transfer() {
        return recipe.between() == null ? 0 : recipe.between().si();
    }

    /** Each grade's pieces as the recipe states them, before any spread. */
    List<org.soakwright.solver.shape.Grade> lot() {
        double volume = recipe.lot().volumeM3();
        return recipe.lot().grades().stream()
                .map(grade -> new org.soakwright.solver.shape.Grade(sides(grade), grade.share() * volume, 1))
                .toList();
    }

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
            if (slots.get(k).part() == 0) {
                passing.add(k);
            }
        }
        return Chain.of(classes.lot(), classes.starts(), stages(species), passing);
    }

    /** As loaded, a uniform content times a factor. */
    static Start start(Recipe recipe, Species species, double factor) {
        if (species.start() instanceof org.soakwright.recipes.model.Start.Uniform uniform) {
            return new Start.Uniform(factor * recipe.lot().kgPerM3(uniform.content()));
        }
        return new Start.Polyline(((org.soakwright.recipes.model.Start.Profile) species.start())
                .points().stream()
                        .map(point ->
                                new Start.Point(point.position(), recipe.lot().kgPerM3(point.content())))
                        .toList());
    }

    private List<Stage> stages(Species species) {
        List<Stage> stages = new ArrayList<>();
        Step before = null;
        for (Step step : recipe.steps()) {
            if (before != null && transfer() > 0) {
                stages.add(rest(species, before));
            }
            Stage stage = stage(species, step);
            for (int f = 0; f < fills(step); f++) {
                stages.add(stage);
            }
            before = step;
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

    private Stage stage(Species species, Step step) {
        double diffusivity = diffusivity(species, step);
        if (step instanceof Step.Wet wet && species.exchangesWith(Medium.LIQUOR)) {
            Quantity dragOut = wet.dragOut();
            double clinging =
                    dragOut == null ? 0 : dragOut.si() * recipe.lot().massKg().orElseThrow();
            return new Stage(
                    diffusivity,
                    partition(species, step),
                    surface(wet.film()),
                    liquor(species, wet),
                    clinging,
                    grain(species, step));
        }
        if (step instanceof Step.Dry dry && species.exchangesWith(Medium.AIR)) {
            Content equilibrium = dry.air().equilibrium().get(species.name());
            double content = equilibrium == null ? 0 : recipe.lot().kgPerM3(equilibrium);
            return new Stage(
                    diffusivity, 1, surface(dry.film()), new Surroundings.Air(content), 0, grain(species, step));
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

    private static Surface surface(Film film) {
        return film instanceof Film.Coefficient coefficient
                ? new Surface.Film(coefficient.value().si())
                : new Surface.Open();
    }

    /** In the first direction stated; the others are {@link #grain} times it. */
    static double diffusivity(Species species, Step step) {
        return at(stated(species, step).all().get(0), step);
    }

    /** How the other directions compare. */
    static org.soakwright.solver.shape.Grain grain(Species species, Step step) {
        if (!(stated(species, step) instanceof Diffusivities.ByGrain byGrain)) {
            return org.soakwright.solver.shape.Grain.NONE;
        }
        double first = at(byGrain.all().get(0), step);
        List<Double> factors = new ArrayList<>();
        for (Grain grain : DIRECTIONS) {
            Diffusivity own = byGrain.values().get(grain);
            factors.add(own == null ? 1.0 : at(own, step) / first);
        }
        return new org.soakwright.solver.shape.Grain(factors);
    }

    /** A step's own diffusivity goes before the species'. */
    private static Diffusivities stated(Species species, Step step) {
        Diffusivities own = step.head().overrides().diffusivity().get(species.name());
        return own == null ? species.diffusivity() : own;
    }

    /** D(T) = D exp(-E/R (1/T - 1/T0)), Arrhenius' law; a step's own diffusivity has no E and is taken as it stands. */
    private static double at(Diffusivity stated, Step step) {
        Quantity temperature = step.temperature();
        if (temperature == null || !(stated.law() instanceof Diffusivity.Law.Activated activated)) {
            return stated.value().si();
        }
        double kelvin = activated.at().si();
        return stated.value().si()
                * Math.exp(activated.energy().si() / GAS_CONSTANT * (1 / kelvin - 1 / temperature.si()));
    }

    static double partition(Species species, Step step) {
        Partition own = step.head().overrides().partition().get(species.name());
        return own != null ? own.value() : species.partition().value();
    }
}
