package org.soakwright.recipes.model;

import java.util.function.UnaryOperator;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/** How much product the lot holds. */
public sealed interface Amount {
    Place place();

    /** With its quantities changed; counts stay. */
    Amount each(UnaryOperator<Quantity> change);

    /** By mass, as loaded. */
    sealed interface Weighed extends Amount {
        double kg();
    }

    /** By the mass of all pieces together. */
    record ByMass(Quantity mass) implements Weighed {
        public ByMass {
            Rules.positive("the mass", mass);
        }

        @Override
        public double kg() {
            return mass.si();
        }

        @Override
        public Place place() {
            return mass.place();
        }

        @Override
        public Amount each(UnaryOperator<Quantity> change) {
            return new ByMass(change.apply(mass));
        }
    }

    /** By containers, one or more, that each hold the same mass. */
    record InContainers(Place place, long count, Quantity each) implements Weighed {
        public InContainers {
            if (count < 1) {
                throw new Unsound(
                        place, "a lot fills one container or more: found " + count + "; write a count such as 24");
            }
            Rules.positive("the mass in each container", each);
        }

        @Override
        public double kg() {
            return count * each.si();
        }

        @Override
        public Amount each(UnaryOperator<Quantity> change) {
            return new InContainers(place, count, change.apply(each));
        }
    }

    /** By the volume of the pieces themselves, without the gaps between them. */
    record ByVolume(Quantity volume) implements Amount {
        public ByVolume {
            Rules.positive("the volume", volume);
        }

        @Override
        public Place place() {
            return volume.place();
        }

        @Override
        public Amount each(UnaryOperator<Quantity> change) {
            return new ByVolume(change.apply(volume));
        }
    }

    /** By the number of pieces, one or more. */
    record ByCount(long count, Place place) implements Amount {
        public ByCount {
            if (count < 1) {
                throw new Unsound(
                        place, "a lot holds one piece or more: found " + count + "; write a count such as 500");
            }
        }

        @Override
        public Amount each(UnaryOperator<Quantity> change) {
            return this;
        }
    }
}
