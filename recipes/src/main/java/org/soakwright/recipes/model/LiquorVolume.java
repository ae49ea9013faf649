package org.soakwright.recipes.model;

import java.util.function.UnaryOperator;
import org.soakwright.recipes.text.Place;

/** How much liquor there is. */
public sealed interface LiquorVolume {
    Place place();

    /** With its quantity changed. */
    LiquorVolume each(UnaryOperator<Quantity> change);

    /** Volume of liquor per mass of lot as loaded, m3/kg, above zero. */
    record Ratio(Quantity value) implements LiquorVolume {
        public Ratio {
            Rules.positive("the liquor's ratio", value);
        }

        @Override
        public Place place() {
            return value.place();
        }

        @Override
        public LiquorVolume each(UnaryOperator<Quantity> change) {
            return new Ratio(change.apply(value));
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

        @Override
        public LiquorVolume each(UnaryOperator<Quantity> change) {
            return new Volume(change.apply(value));
        }
    }

    /** So much that its strength never changes. */
    record Unlimited(Place place) implements LiquorVolume {
        @Override
        public LiquorVolume each(UnaryOperator<Quantity> change) {
            return this;
        }
    }
}
