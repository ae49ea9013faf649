package org.soakwright.recipes.model;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problem;

/** What a liquor and a film ask of the species whose solution they are worked out from. */
final class Solutions {
    private final Declared declared;

    Solutions(Declared declared) {
        this.declared = declared;
    }

    /** Contents that the liquor does not tell by itself belong to one known substance at a known temperature. */
    List<Problem> ofLiquor(Liquor liquor, boolean statesTemperature) {
        List<Problem> problems = new ArrayList<>();
        liquor.contents().forEach((name, content) -> {
            if (!liquor.tells(content)) {
                declared.species(name)
                        .ifPresent(species -> problems.addAll(ofContent(liquor, species, content, statesTemperature)));
            }
        });
        return problems;
    }

    private static List<Problem> ofContent(Liquor liquor, Species species, Content content, boolean statesTemperature) {
        Traits traits = species.traits();
        Substance substance = traits.substance();
        boolean known = substance != null && substance.hasKnownLiquor();
        return switch (content.basis()) {
            case PER_AMOUNT ->
                substance != null || traits.molarMass() != null
                        ? List.of()
                        : problem(
                                content,
                                "a content by amount needs the molar mass of " + species.name(),
                                "add molar-mass, such as 58.44 g/mol, or substance: sodium chloride to the species");
            case OF_SATURATION ->
                known
                        ? ofKnown(liquor, species, content, statesTemperature, "write the content as g/L")
                        : problem(
                                content,
                                "a share of saturation needs to know what " + species.name() + " is",
                                "add substance: sodium chloride or sucrose to the species, or write the content as g/L");
            default ->
                known
                        ? ofKnown(liquor, species, content, statesTemperature, "add density to the liquor")
                        : problem(
                                content,
                                "a content by mass needs the liquor's density",
                                "add density, such as 1080 kg/m3, or write the content as g/L");
        };
    }

    private static List<Problem> ofKnown(
            Liquor liquor, Species species, Content content, boolean statesTemperature, String way) {
        Optional<String> other = liquor.contents().entrySet().stream()
                .filter(entry -> !entry.getKey().equals(species.name()))
                .filter(entry -> entry.getValue().si() > 0)
                .map(Map.Entry::getKey)
                .findFirst();
        if (other.isPresent()) {
            return problem(
                    content,
                    "what a liquor weighs is known of one solute, and this one holds " + other.get() + " too",
                    way);
        }
        return statesTemperature
                ? List.of()
                : problem(
                        content,
                        "what the liquor weighs and dissolves depends on its temperature",
                        "add temperature to the step, such as 4 Cel, or " + way);
    }

    private static List<Problem> problem(Content content, String what, String remedy) {
        return List.of(new Problem(content.place(), what + ": found \"" + content + "\"; " + remedy));
    }

    /**
     * A film that is computed needs a temperature, a way along every slab, and to know how each species moves in liquor.
     *
     * @param kind of the step
     */
    List<Problem> ofFilm(@Nullable Film film, String kind, Place step, boolean statesTemperature) {
        if (!(film instanceof Film.Computed computed)) {
            return List.of();
        }
        if (kind.equals("dry")) {
            return List.of(new Problem(
                    computed.place(),
                    "a film in air from what moves it: not computed yet by this version; write negligible, or"
                            + " {coefficient: 1e-7 m/s}"));
        }
        List<Problem> problems = new ArrayList<>(length(computed));
        if (!statesTemperature) {
            problems.add(new Problem(
                    step, "the step has no temperature, and its film is worked out from it; add one such as 4 Cel"));
        }
        declared.species().stream()
                .filter(species -> species.exchangesWith(Medium.LIQUOR) && !isKnownInLiquor(species.traits()))
                .map(species -> new Problem(
                        computed.place(),
                        "the film is worked out from how " + species.name()
                                + " moves in the liquor, and nothing says so; add in-liquor, such as 1.5e-9 m2/s, or"
                                + " substance: sodium chloride or sucrose to the species"))
                .forEach(problems::add);
        return problems;
    }

    private static boolean isKnownInLiquor(Traits traits) {
        return traits.inLiquor() != null
                || (traits.substance() != null && traits.substance().hasKnownLiquor());
    }

    private List<Problem> length(Film.Computed film) {
        boolean anySlab = declared.shapes().containsValue(Shape.SLAB);
        Quantity length = film.length();
        if (length == null && anySlab && !(film instanceof Film.Packed)) {
            return List.of(new Problem(
                    film.place(),
                    "the film along a slab needs the length of its face in the direction of the flow, or its height in"
                            + " still liquor: found none; add such as length: 120 mm"));
        }
        boolean allRead = declared.shapes().size() == declared.grades().size();
        return length != null && allRead && !anySlab && !declared.shapes().isEmpty()
                ? List.of(new Problem(
                        length.place(),
                        "only a slab leaves the length of its face open: found length \"" + length
                                + "\" where no piece is a slab; remove it"))
                : List.of();
    }
}
