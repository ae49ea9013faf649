package org.soakwright.recipes.model;

import org.soakwright.recipes.text.Place;

/** How much liquor there is. */
public sealed interface LiquorVolume {
    Place place();

    /** Volume of liquor per mass of lot as loaded, m3/kg, above zero. */
    record Ratio(Quantity value) implements LiquorVolume {
        public Ratio {
            Rules.positive("the liquor's ratio", value);
        }

        @Override
        public Place place() {
            return value.place();
        }
    }

    /** A stated volume, m3, above zero. */
    record Volume(Quantity value) implements LiquorVolume {
        public Volume {
            Rules.positive("the liquor's volume", value);
        }

        @Override
        public Place place() {
            return value.place();
        }
    }

    /** So much that its strength never changes. */
    record Unlimited(Place place) implements LiquorVolume {}
}
