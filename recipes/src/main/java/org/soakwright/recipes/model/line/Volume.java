package org.soakwright.recipes.model.line;

import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/**
 * What a vessel holds: pieces and liquor together fill no more than the usable part.
 *
 * @param gross to the brim, m3, above zero
 * @param usable the part of it that may be filled, above 0 % and up to 100 %
 */
public record Volume(Place place, Quantity gross, Quantity usable) {
    public Volume {
        gross.positive("the gross volume");
        if (!(usable.si() > 0 && usable.si() <= 1)) {
            throw new Unsound(
                    usable.place(),
                    "the usable part lies above 0 % and up to 100 %: found \"" + usable + "\"; write such as 90 %");
        }
    }

    public double usableM3() {
        return gross.si() * usable.si();
    }
}
