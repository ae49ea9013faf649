package org.soakwright.recipes.model;

import java.util.Optional;
import org.soakwright.recipes.text.Place;

/** Time in which the pieces are in nothing: before a step, or between two of its fills. They rest at the conditions of the step they come from. */
public sealed interface Gap {
    /** How long it lasts, s. */
    double seconds();

    /** Whether there is any. */
    default boolean lasts() {
        return seconds() > 0;
    }

    /** Where it is stated; empty where there is none. */
    default Optional<Place> place() {
        return Optional.empty();
    }

    /** The next step or fill begins at once. */
    record None() implements Gap {
        @Override
        public double seconds() {
            return 0;
        }
    }

    /** The pieces drain and are brought to another vessel. */
    record Transfer(Quantity between) implements Gap {
        @Override
        public double seconds() {
            return between.si();
        }

        @Override
        public Optional<Place> place() {
            return Optional.of(between.place());
        }
    }

    /** The pieces stay drained in their vessel until it is filled again. */
    record Refilling(Changeover changeover) implements Gap {
        @Override
        public double seconds() {
            return changeover.seconds();
        }

        @Override
        public Optional<Place> place() {
            return Optional.of(changeover.place());
        }
    }
}
