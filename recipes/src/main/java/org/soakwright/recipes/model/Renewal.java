package org.soakwright.recipes.model;

import java.util.function.UnaryOperator;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/** How the liquor of a rinse is renewed. */
public sealed interface Renewal {
    /** The most fills one rinse may take. */
    int MOST_FILLS = 1000;

    /** With its quantities changed; fills stay. */
    default Renewal each(UnaryOperator<Quantity> change) {
        return this;
    }

    /** Fresh liquor runs in, m3/s, above zero, and the vessel overflows. */
    record Flow(Quantity rate) implements Renewal {
        public Flow {
            Rules.positive("the flow", rate);
        }

        @Override
        public Renewal each(UnaryOperator<Quantity> change) {
            return new Flow(change.apply(rate));
        }
    }

    /** Equal successive fills, 1 to 1000, each an equal part of the time. */
    record Fills(int count, Place place) implements Renewal {
        public Fills {
            check(count, place);
        }

        /** From a whole number of any size. */
        public static Fills of(long count, Place place) {
            check(count, place);
            return new Fills((int) count, place);
        }

        private static void check(long count, Place place) {
            if (count < 1 || count > MOST_FILLS) {
                throw new Unsound(place, "fills is a whole number from 1 to " + MOST_FILLS + ": found " + count);
            }
        }
    }

    /** Running water in plenty: the liquor is unlimited. */
    record Plenty() implements Renewal {}
}
