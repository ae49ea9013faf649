package org.soakwright.recipes.model;

import java.util.Collections;
import java.util.EnumSet;
import java.util.Set;
import java.util.function.UnaryOperator;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/**
 * Something dissolved that moves in the pieces.
 *
 * @param startVaries how the start differs from piece to piece, each piece uniform; null is not at all
 * @param diffusivityVaries how the diffusivity differs from piece to piece, in all directions and steps alike; null is not
 *     at all
 * @param partition (kg/m3 of piece) / (kg/m3 of liquor) at equilibrium, above zero
 * @param traits what it is, how it moves in the liquor, what skin holds it back
 * @param exchangesWith one medium or both; towards any other the piece is sealed for this species
 */
public record Species(
        Place place,
        String name,
        Start start,
        @Nullable Spread startVaries,
        Diffusivities diffusivity,
        @Nullable Spread diffusivityVaries,
        Partition partition,
        Traits traits,
        Set<Medium> exchangesWith) {
    public Species {
        Rules.named("a species", name, place);
        if (startVaries != null && start instanceof Start.Profile) {
            throw new Unsound(
                    startVaries.place(),
                    "a profile cannot vary from piece to piece; write one content, or remove varies");
        }
        if (startVaries != null && start.isZero()) {
            throw new Unsound(
                    startVaries.place(),
                    "a start of nothing is the same in every piece; remove varies, or write a content");
        }
        if (exchangesWith.isEmpty()) {
            throw new Unsound(place, name + " exchanges with nothing; write [liquor], [air] or [liquor, air]");
        }
        exchangesWith = Collections.unmodifiableSet(EnumSet.copyOf(exchangesWith));
    }

    public boolean exchangesWith(Medium medium) {
        return exchangesWith.contains(medium);
    }

    /** Whether it is the water of the piece: by its substance, or by its name where no substance is stated. */
    public boolean isWater() {
        return traits.substance() == null ? name.equals("water") : traits.substance() == Substance.WATER;
    }

    /** Whether a skin covers one of two wetted faces of a grade's pieces, so that they are not alike for it. */
    public boolean hasUnlikeFaces(Grade grade) {
        return grade.sides().get(0).faces() == Faces.BOTH
                && traits.skin(grade.name())
                        .filter(skin -> skin.face() == Faces.ONE)
                        .isPresent();
    }

    /** The same species with another diffusivity. */
    public Species withDiffusivity(Diffusivities other) {
        return new Species(place, name, start, startVaries, other, diffusivityVaries, partition, traits, exchangesWith);
    }

    /** The same species with another start. */
    public Species with(Start other) {
        return new Species(
                place, name, other, startVaries, diffusivity, diffusivityVaries, partition, traits, exchangesWith);
    }

    /** With its quantities changed; what varies from piece to piece stays. */
    public Species each(UnaryOperator<Quantity> change) {
        return new Species(
                place,
                name,
                start.each(change),
                startVaries,
                diffusivity.each(change),
                diffusivityVaries,
                partition.each(change),
                traits.each(change),
                exchangesWith);
    }
}
