package org.soakwright.recipes.model;

import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Nearest;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problem;

/**
 * Whether the parts of a recipe agree with each other. Each part can be asked about alone, so that a reader learns of
 * every disagreement even where other parts are broken; a {@link Recipe} asks about all of them.
 */
public final class Consistency {
    private final Declared declared;

    public Consistency(Declared declared) {
        this.declared = declared;
    }

    /** A start by mass needs the lot's density; a profile and a grain need shapes that have them. */
    public List<Problem> of(Species species) {
        ShapeRules shapes = new ShapeRules(declared);
        List<Problem> problems = new ArrayList<>(shapes.ofStart(species.start()));
        problems.addAll(shapes.ofGrain(species.name(), species.diffusivity()));
        if (species.start().basis() == Basis.PER_MASS) {
            problems.addAll(needsLotDensity(startPlace(species.start()), "a content by mass"));
        }
        if (species.start() instanceof Start.Uniform uniform) {
            problems.addAll(new Water(declared).of(uniform.content()));
        }
        problems.addAll(shapes.ofSkin(species.traits().skin()));
        species.traits().skins().forEach((grade, skin) -> {
            problems.addAll(knownGrade(new Reference(grade, skin.place())));
            problems.addAll(shapes.ofSkin(grade, skin));
        });
        return problems;
    }

    /** The water is stated once. */
    public static List<Problem> ofWater(@Nullable Moisture moisture, List<Species> species) {
        return Water.problems(moisture, species);
    }

    /**
     * Every species that exchanges with liquor is named, and no other; a ratio needs the lot's mass.
     *
     * @param statesTemperature whether its step does
     */
    public List<Problem> of(Liquor liquor, boolean statesTemperature) {
        List<Problem> problems = new ArrayList<>(new Solutions(declared).ofLiquor(liquor, statesTemperature));
        liquor.contents().forEach((name, content) -> {
            problems.addAll(knownSpecies(new Reference(name, content.place())));
            problems.addAll(exchanges(name, content.place(), Medium.LIQUOR));
        });
        if (!liquor.othersZero()) {
            problems.addAll(unnamed(
                    liquor.contents().keySet(),
                    Medium.LIQUOR,
                    liquor.place(),
                    "the liquor does not name ",
                    "; write its content such as 0 g/L, or others: 0"));
        }
        if (liquor.volume() instanceof LiquorVolume.Ratio ratio) {
            problems.addAll(needsLotDensity(ratio.place(), "a ratio per mass of lot"));
        }
        return problems;
    }

    /**
     * A film that is worked out has what it is worked out from.
     *
     * @param kind of its step
     */
    public List<Problem> of(@Nullable Film film, String kind, Place step, boolean statesTemperature) {
        return new Solutions(declared).ofFilm(film, kind, step, statesTemperature);
    }

    /** Between steps time passes, or nothing is said. */
    public static List<Problem> ofBetween(@Nullable Quantity between) {
        return between == null || between.si() > 0
                ? Rules.ifTooLong(between)
                : List.of(new Problem(
                        between.place(),
                        "the time between steps must be above zero: found \"" + between
                                + "\"; write such as 20 min, or remove between"));
    }

    /**
     * Whether how a lot is handled fits its step.
     *
     * @param stays where that is written
     * @param first whether no step comes before it
     * @param fills how many the step has
     */
    public static List<Problem> ofHandling(Handling handling, Place stays, boolean first, int fills) {
        return HandlingRules.of(handling, stays, first, fills);
    }

    /** Drag-out is per mass of lot. */
    public List<Problem> ofDragOut(@Nullable Quantity dragOut) {
        return dragOut == null ? List.of() : needsLotDensity(dragOut.place(), "drag-out per mass of lot");
    }

    /** Every species that exchanges with air has its equilibrium, and no other; there is at least one. */
    public List<Problem> of(Air air) {
        List<Problem> problems = new ArrayList<>();
        air.equilibrium().forEach((name, content) -> {
            problems.addAll(knownSpecies(new Reference(name, content.place())));
            problems.addAll(exchanges(name, content.place(), Medium.AIR));
            if (content.basis() == Basis.PER_MASS) {
                problems.addAll(needsLotDensity(content.place(), "a content by mass"));
            }
            problems.addAll(new Water(declared).of(content));
        });
        problems.addAll(unnamed(
                air.equilibrium().keySet(),
                Medium.AIR,
                air.place(),
                "the air does not name the equilibrium of ",
                "; write its content such as 60 g/kg"));
        boolean allRead = declared.species().size() == declared.speciesNames().size();
        if (allRead && declared.species().stream().noneMatch(species -> species.exchangesWith(Medium.AIR))) {
            problems.add(new Problem(
                    air.place(),
                    "no species exchanges with air, so nothing would dry; add exchanges-with: [air] to a species, or"
                            + " write rest"));
        }
        return problems;
    }

    /** Overrides are of declared species, a diffusivity in the directions that the pieces have. */
    public List<Problem> of(Overrides overrides) {
        List<Problem> problems = new ArrayList<>();
        overrides.diffusivity().forEach((name, value) -> {
            problems.addAll(knownSpecies(new Reference(name, value.place())));
            problems.addAll(new ShapeRules(declared).ofGrain(name, value));
        });
        overrides
                .partition()
                .forEach((name, value) -> problems.addAll(knownSpecies(new Reference(name, value.place()))));
        return problems;
    }

    /** A temperature is stated for food, and where a diffusivity depends on it. */
    public List<Problem> ofTemperature(Place step, boolean stated, Set<String> overridden) {
        if (stated) {
            return List.of();
        }
        return declared.species().stream()
                .filter(species -> species.diffusivity().dependsOnTemperature() && !overridden.contains(species.name()))
                .findFirst()
                .map(species -> "the diffusivity of " + species.name() + " depends on it")
                .or(() -> declared.products().stream()
                        .filter(product -> product == Product.FOOD)
                        .map(food -> "the product is food")
                        .findFirst())
                .map(why -> new Problem(step, "the step has no temperature, and " + why + "; add one such as 4 Cel"))
                .stream()
                .toList();
    }

    /** A step agrees with everything declared. */
    public List<Problem> of(Step step) {
        Overrides overrides = step.head().overrides();
        List<Problem> problems = new ArrayList<>(of(overrides));
        problems.addAll(ofTemperature(
                step.place(),
                step.temperature() != null,
                overrides.diffusivity().keySet()));
        if (step instanceof Step.Wet wet) {
            problems.addAll(of(wet.liquor(), step.temperature() != null));
            problems.addAll(of(wet.film(), step.kind(), step.place(), step.temperature() != null));
            problems.addAll(ofDragOut(wet.dragOut()));
        } else {
            problems.addAll(OutOfLiquor.problems(step));
        }
        if (step instanceof Step.Dry dry) {
            problems.addAll(of(dry.air()));
            problems.addAll(of(dry.film(), step.kind(), step.place(), step.temperature() != null));
        }
        problems.addAll(new Water(declared).ofGain(step));
        return problems;
    }

    /** A target points at what is declared and has what its unit needs. */
    public List<Problem> of(Target target) {
        List<Problem> problems = new ArrayList<>();
        if (target instanceof Target.OfPieces pieces) {
            problems.addAll(knownSpecies(pieces.species()));
            if (pieces.grade() instanceof GradeScope.Named named) {
                problems.addAll(knownGrade(named.name()));
            }
            if (pieces.after() != null) {
                problems.addAll(knownStep(pieces.after()));
            }
            if (pieces.limits().basis() == Basis.PER_MASS) {
                problems.addAll(needsLotDensity(pieces.limits().place(), "a limit by mass"));
            }
            if (pieces.limits().basis() == Basis.OF_START) {
                problems.addAll(startsAboveZero(pieces));
            }
            problems.addAll(new Water(declared).ofTarget(pieces));
        } else if (target instanceof Target.OfLiquor liquor) {
            problems.addAll(knownSpecies(liquor.species()));
            problems.addAll(exchanges(liquor.species().name(), liquor.species().place(), Medium.LIQUOR));
            problems.addAll(knownStep(liquor.step()));
            String kind = declared.steps().getOrDefault(liquor.step().name(), "soak");
            if (!kind.equals("soak") && !kind.equals("rinse")) {
                problems.add(new Problem(
                        liquor.step().place(),
                        "a liquor target needs a soak or a rinse: found \"" + liquor.step() + "\", a " + kind));
            }
        } else if (target instanceof Target.OfMass mass) {
            problems.addAll(needsLotDensity(mass.place(), "a total of mass"));
            problems.addAll(new Water(declared).needsMass(mass.place(), "a total of mass"));
            if (mass.after() != null) {
                problems.addAll(knownStep(mass.after()));
            }
        } else if (target instanceof Target.OfTotal total && total.total() == Goal.COST) {
            problems.addAll(needsPrices(total.place(), "a total of cost"));
        }
        return problems;
    }

    /** The least cost needs prices. */
    public List<Problem> of(Goal goal, Place place) {
        return goal == Goal.COST ? needsPrices(place, "minimise: cost") : List.of();
    }

    private List<Problem> needsPrices(Place place, String what) {
        return declared.priced()
                ? List.of()
                : List.of(new Problem(
                        place, what + " needs prices; add such as prices: {time: 40 EUR/h, liquor: 3.1 EUR/m3}"));
    }

    private List<Problem> needsLotDensity(Place place, String what) {
        return declared.lotHasDensity()
                ? List.of()
                : List.of(new Problem(
                        place, what + " needs the density of the pieces; add density to the lot, such as 1120 kg/m3"));
    }

    private List<Problem> startsAboveZero(Target.OfPieces target) {
        return declared.species(target.species().name())
                .filter(species -> species.start().isZero())
                .map(species -> List.of(new Problem(
                        target.limits().place(),
                        "a share of the start of " + species.name()
                                + " means nothing, it starts at zero; write a content such as 25 g/kg")))
                .orElse(List.of());
    }

    private List<Problem> exchanges(String name, Place place, Medium medium) {
        return declared.species(name)
                .filter(species -> !species.exchangesWith(medium))
                .map(species -> List.of(new Problem(
                        place,
                        name + " does not exchange with " + medium.word() + "; remove it here, or add " + medium.word()
                                + " to its exchanges-with")))
                .orElse(List.of());
    }

    private List<Problem> unnamed(Set<String> named, Medium medium, Place place, String what, String remedy) {
        Set<String> missing = new LinkedHashSet<>();
        declared.species().stream()
                .filter(species -> species.exchangesWith(medium))
                .map(Species::name)
                .filter(name -> !named.contains(name))
                .forEach(missing::add);
        return missing.stream()
                .map(name -> new Problem(place, what + name + remedy))
                .toList();
    }

    /** The reference is to a declared species. */
    public List<Problem> knownSpecies(Reference reference) {
        return known("species", reference, declared.speciesNames());
    }

    /** The reference is to a declared step. */
    public List<Problem> knownStep(Reference reference) {
        return known("step", reference, declared.steps().keySet());
    }

    /** The reference is to a declared grade. */
    public List<Problem> knownGrade(Reference reference) {
        return known("grade", reference, declared.grades());
    }

    private static List<Problem> known(String what, Reference reference, Collection<String> names) {
        return names.isEmpty() || names.contains(reference.name())
                ? List.of()
                : List.of(new Problem(
                        reference.place(),
                        "no " + what + " has this name: found \"" + reference + "\"; "
                                + Nearest.hint(reference.name(), names)));
    }

    private static Place startPlace(Start start) {
        return start instanceof Start.Uniform uniform
                ? uniform.content().place()
                : ((Start.Profile) start).points().get(0).content().place();
    }
}
