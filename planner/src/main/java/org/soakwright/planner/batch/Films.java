package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.jspecify.annotations.Nullable;
import org.soakwright.planner.conditions.Currents;
import org.soakwright.recipes.model.Film;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.Medium;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Skin;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Step;
import org.soakwright.solver.stage.Surface;
import org.soakwright.solver.stage.Surfaces;
import org.soakwright.solver.transport.Buoyancy;
import org.soakwright.solver.transport.Estimate;

/** What lies between pieces and liquor in every step, by species and grade: films stated or computed, and skins. */
final class Films {
    private final Recipe recipe;
    /** By step, then grade; null where no density moves the liquor. */
    private final List<List<@Nullable Buoyancy>> buoyancies;

    private Films(Recipe recipe, List<List<@Nullable Buoyancy>> buoyancies) {
        this.recipe = recipe;
        this.buoyancies = buoyancies;
    }

    /**
     * The films of a recipe. Where the liquor is moved by its own density, that is found from what the pieces give off in steps of
     * these durations.
     */
    static Films of(Recipe recipe, double[] seconds) {
        Films films = new Films(recipe, new ArrayList<>());
        for (int i = 0; i < recipe.steps().size(); i++) {
            films.buoyancies.add(
                    new ArrayList<>(Collections.nCopies(recipe.lot().grades().size(), (@Nullable Buoyancy) null)));
            if (films.driven(i)) {
                new StillLiquor(recipe, films, i, seconds).settle();
            }
        }
        return films;
    }

    /** The same films for a recipe whose values differ a little: what moves still liquor is kept, all else computed again. */
    Films again(Recipe other) {
        return new Films(other, buoyancies);
    }

    /** Whether any step's liquor is moved by its own density, so that its film depends on how long the steps last. */
    boolean anyDriven() {
        return buoyancies.stream().anyMatch(step -> step.stream().anyMatch(one -> one != null));
    }

    boolean driven(int step) {
        return currents(step).filter(Currents::driven).isPresent();
    }

    void set(int step, int grade, Buoyancy buoyancy) {
        buoyancies.get(step).set(grade, buoyancy);
    }

    /** How much denser the liquor is at a grade's pieces on average, kg/m3; empty where that does not move it. */
    OptionalDouble difference(int step, int grade) {
        Buoyancy buoyancy = buoyancies.get(step).get(grade);
        return buoyancy == null ? OptionalDouble.empty() : OptionalDouble.of(buoyancy.size());
    }

    /** The film of a species around a grade's pieces, where it is computed. */
    Optional<Estimate> estimate(int step, Species species, int grade) {
        if (!species.exchangesWith(Medium.LIQUOR)) {
            return Optional.empty();
        }
        Buoyancy buoyancy = buoyancies.get(step).get(grade);
        Grade pieces = recipe.lot().grades().get(grade);
        return currents(step)
                .map(currents -> currents.film(species, pieces, buoyancy == null ? new Buoyancy(0) : buoyancy));
    }

    /** The surfaces of a species' classes in a step that it exchanges in. */
    Surfaces surfaces(int step, Species species, List<Population> populations) {
        List<Surface> surfaces = new ArrayList<>();
        for (int j = 0; j < populations.size(); j++) {
            surfaces.addAll(Collections.nCopies(populations.get(j).count(), surface(step, species, j)));
        }
        Surface first = surfaces.get(0);
        return surfaces.stream().allMatch(first::equals) ? new Surfaces.Alike(first) : new Surfaces.ByGrade(surfaces);
    }

    /** The surface of a grade's pieces for a species in a step that it exchanges in. */
    Surface surface(int step, Species species, int grade) {
        double film = coefficient(step, species, grade);
        Surface bare = Double.isInfinite(film) ? new Surface.Open() : new Surface.Film(film);
        Grade pieces = recipe.lot().grades().get(grade);
        Optional<Skin> skin = species.traits().skin(pieces.name());
        if (skin.isEmpty()) {
            return bare;
        }
        double permeance = skin.get().permeance().si();
        // In air both count contents of the piece.
        boolean air = recipe.steps().get(step) instanceof Step.Dry;
        Surface covered =
                Surface.inSeries(film, permeance / (air ? species.partition().value() : 1));
        return twoFaced(species, pieces) ? new Surface.Faces(covered, bare) : covered;
    }

    /** The part of a difference across film and skin that lies in the film, 1; all of it where there is no skin. */
    double inFilm(int step, Species species, int grade) {
        double film = coefficient(step, species, grade);
        return species.traits()
                .skin(recipe.lot().grades().get(grade).name())
                .map(skin -> skin.permeance().si() / (skin.permeance().si() + film))
                .orElse(1.0);
    }

    /** Whether a skin covers one of the two wetted faces of a grade's pieces, so that they are not alike. */
    static boolean twoFaced(Species species, Grade grade) {
        return species.hasUnlikeFaces(grade);
    }

    /** m/s; infinite where there is no film. */
    private double coefficient(int step, Species species, int grade) {
        Film film = film(recipe.steps().get(step));
        if (film instanceof Film.Coefficient stated) {
            return stated.value().si();
        }
        return estimate(step, species, grade).map(Estimate::coefficient).orElse(Double.POSITIVE_INFINITY);
    }

    private Optional<Currents> currents(int step) {
        return recipe.steps().get(step) instanceof Step.Wet wet && wet.film() instanceof Film.Computed computed
                ? Optional.of(new Currents(recipe, wet, computed))
                : Optional.empty();
    }

    private static Film film(Step step) {
        if (step instanceof Step.Wet wet) {
            return wet.film();
        }
        return step instanceof Step.Dry dry ? dry.film() : new Film.Negligible();
    }
}
