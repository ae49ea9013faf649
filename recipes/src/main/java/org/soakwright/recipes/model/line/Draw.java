package org.soakwright.recipes.model.line;

import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.text.Place;

/** What a vessel draws of a utility while a lot is in it. */
public sealed interface Draw {
    Place place();

    /** Always the same, zero or more, in a unit of the utility's kind. */
    record Steady(Quantity value) implements Draw {
        public Steady {
            value.notNegative("what a vessel draws");
        }

        @Override
        public Place place() {
            return value.place();
        }
    }

    /** The flow of the rinse that runs in it; nothing in any other step. */
    record Flow(Place place) implements Draw {}
}
