package org.soakwright.recipes.model;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Problem;

/** What the shapes of the pieces ask of a species. */
final class ShapeRules {
    private final Declared declared;

    ShapeRules(Declared declared) {
        this.declared = declared;
    }

    /** A profile runs along one axis. */
    List<Problem> ofStart(Start start) {
        if (!(start instanceof Start.Profile profile)) {
            return List.of();
        }
        return declared.shapes().entrySet().stream()
                .filter(grade -> grade.getValue().dimensions().size() > 1)
                .map(grade -> new Problem(
                        profile.place(),
                        "a profile belongs to one axis: found one beside the "
                                + grade.getValue().word() + " " + grade.getKey()
                                + "; write one content such as 190 g/kg"))
                .limit(1)
                .toList();
    }

    /** Every side finds its direction, and no direction is without a side. */
    List<Problem> ofGrain(String species, Diffusivities diffusivity) {
        if (!(diffusivity instanceof Diffusivities.ByGrain byGrain)) {
            return List.of();
        }
        List<Problem> problems = new ArrayList<>();
        declared.shapes().forEach((grade, shape) -> problems.addAll(missing(species, byGrain, grade, shape)));
        if (declared.shapes().size() == declared.grades().size()) {
            problems.addAll(unused(species, byGrain));
        }
        return problems;
    }

    /** One face can be covered alone where the first side has two that can be told apart. */
    List<Problem> ofSkin(@Nullable Skin skin) {
        return skin == null
                ? List.of()
                : declared.shapes().keySet().stream()
                        .flatMap(grade -> ofSkin(grade, skin).stream())
                        .limit(1)
                        .toList();
    }

    List<Problem> ofSkin(String grade, Skin skin) {
        Shape shape = declared.shapes().get(grade);
        return skin.face() == Faces.BOTH || shape == null || shape.dimensions().get(0) == Dimension.THICKNESS
                ? List.of()
                : List.of(new Problem(
                        skin.place(),
                        "only a slab and a brick have one face that can be covered alone: found face: one, and " + grade
                                + " is a " + shape.word() + "; write face: both"));
    }

    private static List<Problem> missing(String species, Diffusivities.ByGrain stated, String grade, Shape shape) {
        if (shape.grains().isEmpty()) {
            return List.of(new Problem(
                    stated.place(),
                    "a " + shape.word() + " has no direction, so " + grade + " needs one diffusivity of " + species
                            + ": found " + Word.list(stated.values().keySet())
                            + "; write one value such as 8e-10 m2/s"));
        }
        List<Grain> missing = shape.grains().stream()
                .filter(grain -> !stated.values().containsKey(grain))
                .toList();
        return missing.isEmpty()
                ? List.of()
                : List.of(new Problem(
                        stated.place(),
                        "the " + shape.word() + " " + grade + " needs the diffusivity of " + species
                                + " in each of its directions: found "
                                + Word.list(stated.values().keySet()) + "; add "
                                + Word.list(missing) + ", such as 8e-10 m2/s, or write one value for all"));
    }

    private List<Problem> unused(String species, Diffusivities.ByGrain stated) {
        Set<Grain> had = new LinkedHashSet<>();
        declared.shapes().values().forEach(shape -> had.addAll(shape.grains()));
        List<Problem> problems = new ArrayList<>();
        stated.values().forEach((grain, value) -> {
            if (!had.isEmpty() && !had.contains(grain)) {
                problems.add(new Problem(
                        value.value().place(),
                        "no piece has this direction: found " + grain.word() + " in the diffusivity of " + species
                                + "; the pieces have " + Word.list(had) + ", keep those"));
            }
        });
        return problems;
    }
}
