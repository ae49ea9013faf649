package org.soakwright.recipes.model;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problem;

/** What can be counted against the water, the dry mass or the mass at present, and where the recipe says so twice. */
final class Water {
    private static final String WATER =
            "a species with substance: water, or moisture to the lot, such as {start: 56 %, end: 78 %}";

    private final Declared declared;

    Water(Declared declared) {
        this.declared = declared;
    }

    private boolean mayHaveSpecies() {
        return declared.species().stream().anyMatch(Species::isWater)
                || declared.species().size() < declared.speciesNames().size();
    }

    private boolean hasSpecies() {
        return declared.species().stream().anyMatch(Species::isWater);
    }

    private boolean isKnown() {
        return declared.lotHasMoisture() || mayHaveSpecies();
    }

    List<Problem> ofTarget(Target.OfPieces target) {
        if (target.counted() instanceof Counted.InPhase phase) {
            return ofPhase(target, phase.phase());
        }
        Per per = ((Counted.OfPiece) target.counted()).per();
        return per == Per.PRESENT ? needsMass(target.place(), "per: present") : ofPer(per, target.place());
    }

    private List<Problem> ofPhase(Target.OfPieces target, Phase phase) {
        boolean itself = declared.species(target.species().name())
                .filter(Species::isWater)
                .isPresent();
        if (itself) {
            return List.of(new Problem(
                    target.place(),
                    "the water has no content in itself: found phase: " + phase.word() + " for "
                            + target.species().name() + "; remove phase, or name another species"));
        }
        return isKnown()
                ? List.of()
                : List.of(new Problem(
                        target.place(),
                        "phase: " + phase.word() + " needs the water of the pieces: found none; add " + WATER));
    }

    /** What a start or an equilibrium per dry mass needs. */
    List<Problem> of(Content content) {
        return ofPer(content.per(), content.place());
    }

    private List<Problem> ofPer(Per per, Place place) {
        return per != Per.DRY || isKnown()
                ? List.of()
                : List.of(new Problem(place, "per: dry needs the water of the pieces: found none; add " + WATER));
    }

    /** What the mass at any other time than the start needs. */
    List<Problem> needsMass(Place place, String what) {
        return declared.statesGain() || isKnown()
                ? List.of()
                : List.of(new Problem(
                        place,
                        what + " needs to know how the mass changes: found nothing that says so; add gain to a step,"
                                + " such as gain: 12 %, " + WATER));
    }

    /** A gain is what the water makes of the mass, so it is not stated beside it. */
    List<Problem> ofGain(Step step) {
        Quantity gain = step.head().gain();
        return gain == null || !hasSpecies()
                ? List.of()
                : List.of(new Problem(
                        gain.place(),
                        "the water of the pieces gives the gain: found gain \"" + gain
                                + "\" beside a species that is the water; remove one of them"));
    }

    /** The water is a species or a moisture, and one species. */
    static List<Problem> problems(@Nullable Moisture moisture, List<Species> species) {
        List<Problem> problems = new ArrayList<>();
        if (moisture != null && species.stream().anyMatch(Species::isWater)) {
            problems.add(new Problem(
                    moisture.place(),
                    "the water of the pieces is stated twice: found moisture beside a species that is the water; remove"
                            + " one of them"));
        }
        species.stream()
                .filter(one -> one.traits().substance() == Substance.WATER)
                .skip(1)
                .map(one -> new Problem(
                        one.place(), "two species are the water: found " + one.name() + " again; remove one substance"))
                .forEach(problems::add);
        return problems;
    }
}
