package org.soakwright.recipes.model;

import java.util.List;
import java.util.function.UnaryOperator;
import org.soakwright.recipes.text.Place;

/** What part of the piece is water, by mass of the piece at that time: as loaded and at the end of the recipe. */
public record Moisture(Place place, Quantity start, Quantity end) {
    public Moisture {
        Rules.requireAll(List.of(
                Rules.ifNotWithin("the moisture of a piece", start, "56 %"),
                Rules.ifNotWithin("the moisture of a piece", end, "56 %")));
    }

    public Moisture each(UnaryOperator<Quantity> change) {
        return new Moisture(place, change.apply(start), change.apply(end));
    }
}
