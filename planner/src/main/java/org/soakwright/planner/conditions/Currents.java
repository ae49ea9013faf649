package org.soakwright.planner.conditions;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Film;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Shape;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.text.Unsound;
import org.soakwright.solver.transport.Bed;
import org.soakwright.solver.transport.Body;
import org.soakwright.solver.transport.Buoyancy;
import org.soakwright.solver.transport.Estimate;
import org.soakwright.solver.transport.Fluid;
import org.soakwright.solver.transport.Medium;
import org.soakwright.solver.transport.Solution;
import org.soakwright.solver.transport.Water;

/** The liquor of one step as the films around its pieces meet it. */
public final class Currents {
    private final Recipe recipe;
    private final Step.Wet step;
    private final Film.Computed film;
    private final Quantity temperature;

    /**
     * The liquor of a step whose film is computed.
     *
     * @throws Unsound where the step states no temperature
     */
    public Currents(Recipe recipe, Step.Wet step, Film.Computed film) {
        this.recipe = recipe;
        this.step = step;
        this.film = film;
        Quantity stated = step.temperature();
        if (stated == null) {
            throw new Unsound(
                    film.place(), "a film that is computed needs the step's temperature; add one such as 4 Cel");
        }
        temperature = stated;
    }

    /** Whether the density of the liquor moves it, so that the film needs to know how much that differs at the pieces. */
    public boolean driven() {
        return film instanceof Film.Still || (film instanceof Film.Past past && past.alsoStill());
    }

    /**
     * The film around a grade's pieces.
     *
     * @param buoyancy counted only where it {@link #driven moves} the liquor
     */
    public Estimate film(Species species, Grade grade, Buoyancy buoyancy) {
        Medium medium = new Medium(fluid(), diffusivity(species));
        if (film instanceof Film.Packed packed) {
            Bed bed = new Bed(packed.speed().si(), packed.voids().si());
            return org.soakwright.solver.transport.Film.packed(piece(grade), medium, bed);
        }
        Body body = body(grade);
        if (film instanceof Film.Past past) {
            Estimate flowing = org.soakwright.solver.transport.Film.past(
                    body, medium, past.speed().si());
            return past.alsoStill()
                    ? org.soakwright.solver.transport.Film.together(
                            flowing, org.soakwright.solver.transport.Film.still(body, medium, buoyancy))
                    : flowing;
        }
        return film instanceof Film.Stirred stirred
                ? org.soakwright.solver.transport.Film.stirred(
                        body, medium, stirred.power().si())
                : org.soakwright.solver.transport.Film.still(body, medium, buoyancy);
    }

    /**
     * How much denser the liquor is at the pieces than away from them.
     *
     * @param away what it holds of each species there, kg/m3
     * @param more what it holds more at the pieces, kg/m3; may be negative
     * @param warmer what it is warmer at the pieces, K
     */
    public Buoyancy buoyancy(Map<Species, Double> away, Map<Species, Double> more, double warmer) {
        double byContent = 0;
        for (Map.Entry<Species, Double> entry : more.entrySet()) {
            double there = away.getOrDefault(entry.getKey(), 0.0);
            byContent += density(entry.getKey(), there + entry.getValue()) - density(entry.getKey(), there);
        }
        double byTemperature = warmer == 0 ? 0 : water(temperature.si() + warmer) - water(temperature.si());
        return new Buoyancy(byContent, byTemperature);
    }

    /** The species whose content changes the density of the liquor in a way that is known. */
    public static List<Species> weighing(Recipe recipe) {
        return recipe.species().stream()
                .filter(species -> Solutes.solution(species).isPresent())
                .toList();
    }

    /** What moves in the liquor, m2/s. */
    private double diffusivity(Species species) {
        return Sources.at(temperature, () -> Solutes.inLiquor(species, temperature.si()))
                .orElseThrow(() -> new Unsound(
                        film.place(),
                        "a film that is computed needs to know how " + species.name()
                                + " moves in the liquor; add in-liquor to it, such as {value: 1.5e-9 m2/s, at: 25 Cel,"
                                + " scaling: viscosity}, or its substance"))
                .value();
    }

    /** The strongest solute whose solution is known decides; without one the liquor is taken for water. */
    private Fluid fluid() {
        @Nullable Species strongest = null;
        for (Species species : weighing(recipe)) {
            if (strongest == null || content(species) > content(strongest)) {
                strongest = species;
            }
        }
        if (strongest == null || content(strongest) == 0) {
            return Sources.at(temperature, () -> Water.fluid(temperature.si()));
        }
        Solution solution = Solutes.solution(strongest).orElseThrow();
        double content = content(strongest);
        return Sources.at(
                temperature,
                () -> solution.fluid(
                        solution.fraction(content, temperature.si()).value(), temperature.si()));
    }

    private double content(Species species) {
        return step.liquor().kgPerM3(species.name());
    }

    private double density(Species species, double content) {
        Optional<Solution> solution = Solutes.solution(species);
        if (solution.isEmpty()) {
            return 0;
        }
        double kelvin = temperature.si();
        return Sources.at(temperature, () -> {
            Solution known = solution.get();
            double most = known.saturationContent(kelvin).value();
            double fraction =
                    known.fraction(Math.max(0, Math.min(content, most)), kelvin).value();
            return known.density(fraction, kelvin).value();
        });
    }

    private double water(double kelvin) {
        return Sources.at(temperature, () -> Water.density(kelvin)).value();
    }

    /** A slab is met along its face; a bed counts every piece by its surface. */
    private Body body(Grade grade) {
        double[] sizes =
                grade.sides().stream().mapToDouble(side -> side.size().si()).toArray();
        return switch (grade.shape()) {
            case SLAB -> new Body.Plate(length(grade));
            case CYLINDER -> new Body.Cylinder(sizes[0]);
            case SPHERE -> new Body.Sphere(sizes[0]);
            case SHORT_CYLINDER -> new Body.ShortCylinder(sizes[0], sizes[1]);
            case BRICK -> new Body.Brick(sizes[0], sizes[1], sizes[2]);
        };
    }

    /** A piece of a bed. */
    private Body.Bounded piece(Grade grade) {
        if (grade.shape() != Shape.SLAB && body(grade) instanceof Body.Bounded bounded) {
            return bounded;
        }
        throw new Unsound(
                film.place(),
                "a bed is of pieces that end: found " + grade.shape().word()
                        + "; write a brick, short-cylinder or sphere, or another film");
    }

    private double length(Grade grade) {
        Quantity length = film.length();
        if (length == null) {
            throw new Unsound(
                    film.place(),
                    "the film on the slab " + grade.name()
                            + " needs the length of its face, along the flow or upright in still liquor; add length to"
                            + " the film, such as 120 mm");
        }
        return length.si();
    }
}
