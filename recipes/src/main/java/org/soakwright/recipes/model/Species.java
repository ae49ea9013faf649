package org.soakwright.recipes.model;

import java.util.Collections;
import java.util.EnumSet;
import java.util.Set;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/**
 * Something dissolved that moves in the pieces.
 *
 * @param partition (kg/m3 of piece) / (kg/m3 of liquor) at equilibrium, above zero
 * @param exchangesWith one medium or both; towards any other the piece is sealed for this species
 */
public record Species(
        Place place,
        String name,
        Start start,
        Diffusivity diffusivity,
        Partition partition,
        Set<Medium> exchangesWith) {
    public Species {
        Rules.named("a species", name, place);
        if (exchangesWith.isEmpty()) {
            throw new Unsound(place, name + " exchanges with nothing; write [liquor], [air] or [liquor, air]");
        }
        exchangesWith = Collections.unmodifiableSet(EnumSet.copyOf(exchangesWith));
    }

    public boolean exchangesWith(Medium medium) {
        return exchangesWith.contains(medium);
    }
}
