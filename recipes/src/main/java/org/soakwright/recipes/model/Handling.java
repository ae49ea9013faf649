package org.soakwright.recipes.model;

import org.jspecify.annotations.Nullable;

/**
 * How a lot comes to a step and what the step asks of those who work there.
 *
 * @param stays whether the lot remains in the vessel of the step before
 * @param changeover before a step whose lot stays, and between the fills of a step; null is none
 * @param attended whether somebody has to be there as long as the step runs
 * @param holdAtMost how much longer than its longest time the step may be held where the crew or the next vessel is late; null is not said
 */
public record Handling(
        boolean stays,
        @Nullable Changeover changeover,
        boolean attended,
        @Nullable Quantity holdAtMost) {
    /** Nothing is said of it. */
    public static final Handling NONE = new Handling(false, null, false, null);

    public Handling {
        Rules.notNegative("`hold-at-most`", holdAtMost);
        Rules.require(Rules.ifTooLong(holdAtMost));
    }

    public Handling withStays(boolean other) {
        return new Handling(other, changeover, attended, holdAtMost);
    }

    public Handling withChangeover(@Nullable Changeover other) {
        return new Handling(stays, other, attended, holdAtMost);
    }
}
