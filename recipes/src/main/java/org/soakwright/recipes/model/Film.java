package org.soakwright.recipes.model;

import java.util.List;
import java.util.function.UnaryOperator;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Place;

/** The resistance between the piece and what is around it. */
public sealed interface Film {
    /** With its quantities changed. */
    Film each(UnaryOperator<Quantity> change);

    /** None worth counting. */
    record Negligible() implements Film {
        @Override
        public Film each(UnaryOperator<Quantity> change) {
            return this;
        }
    }

    /** A mass transfer coefficient, m/s, above zero; in drying referred to the content of the piece. */
    record Coefficient(Quantity value) implements Film {
        public Coefficient {
            Rules.positive("a film coefficient", value);
        }

        @Override
        public Film each(UnaryOperator<Quantity> change) {
            return new Coefficient(change.apply(value));
        }
    }

    /** Computed from what moves the liquor. */
    sealed interface Computed extends Film {
        Place place();

        /** Metres along a slab in the direction of the flow, or of its height in still liquor; null is not stated. */
        @Nullable
        Quantity length();
    }

    /** Nothing but its own density moves the liquor. */
    record Still(Place place, @Nullable Quantity length) implements Computed {
        public Still {
            Rules.positive("the length along a face", length);
        }

        @Override
        public Film each(UnaryOperator<Quantity> change) {
            return new Still(place, Quantity.each(length, change));
        }
    }

    /**
     * The liquor flows past each piece.
     *
     * @param speed m/s, above zero
     * @param alsoStill whether it is so slow that its own density moves the liquor too
     */
    record Past(
            Place place,
            Quantity speed,
            boolean alsoStill,
            @Nullable Quantity length) implements Computed {
        public Past {
            Rules.positive("a speed", speed);
            Rules.positive("the length along a face", length);
        }

        @Override
        public Film each(UnaryOperator<Quantity> change) {
            return new Past(place, change.apply(speed), alsoStill, Quantity.each(length, change));
        }
    }

    /** A stirrer keeps the pieces afloat, with so much power per volume of liquor, W/m3, above zero. */
    record Stirred(Place place, Quantity power, @Nullable Quantity length) implements Computed {
        public Stirred {
            Rules.positive("a stirrer's power", power);
            Rules.positive("the length along a face", length);
        }

        @Override
        public Film each(UnaryOperator<Quantity> change) {
            return new Stirred(place, change.apply(power), Quantity.each(length, change));
        }
    }

    /**
     * The liquor is pumped through a bed of pieces.
     *
     * @param speed of the liquor over the whole section of the bed, as if it were empty, m/s, above zero
     * @param voids the part of the bed that is liquor, above 0 and below 1
     */
    record Packed(Place place, Quantity speed, Quantity voids) implements Computed {
        public Packed {
            Rules.requireAll(List.of(
                    Rules.ifNotPositive("a speed", speed), Rules.ifNotWithin("the void of a bed", voids, "40 %")));
        }

        @Override
        public @Nullable Quantity length() {
            return null;
        }

        @Override
        public Film each(UnaryOperator<Quantity> change) {
            return new Packed(place, change.apply(speed), change.apply(voids));
        }
    }
}
