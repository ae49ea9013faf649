package org.soakwright.planner.line.shop;

/** How a job comes from one phase to the next. */
public sealed interface Joint {
    /**
     * It is lifted into another station, or back into the same: people and hoist are busy from the lift to the landing.
     *
     * @param least shortest time in the air, s
     * @param most longest, s
     */
    record Lift(long least, long most) implements Joint {
        public Lift {
            if (least < 0 || most < least) {
                throw new IllegalArgumentException("a lift lasts from " + least + " to " + most + " s");
            }
        }
    }

    /**
     * It stays where it is while people change what is around it.
     *
     * @param seconds it lies drained
     */
    record Change(long seconds) implements Joint {}

    /** It stays where it is, and nobody is needed. */
    record Onward() implements Joint {}

    default boolean stays() {
        return !(this instanceof Lift);
    }
}
