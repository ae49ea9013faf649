package org.soakwright.recipes.model;

import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/** What makes a target whole in itself. */
final class TargetRules {
    private TargetRules() {}

    /** Only the mass as loaded has a share of the start or a content by volume; the water has neither. */
    static void check(Place place, Limits limits, Counted counted) {
        boolean beyond =
                counted.equals(new Counted.OfPiece(Per.DRY)) || counted.equals(new Counted.InPhase(Phase.MOISTURE));
        if (!beyond) {
            Rules.require(limits.beyondTheWhole());
        }
        if (counted.equals(Counted.AS_LOADED)) {
            return;
        }
        String found = counted instanceof Counted.OfPiece piece
                ? "per: " + piece.per().word()
                : "phase: " + ((Counted.InPhase) counted).phase().word();
        if (limits.basis() == Basis.OF_START) {
            throw new Unsound(
                    place,
                    "a share of the start is counted as loaded: found " + found + " beside `of: start`; remove one of"
                            + " them");
        }
        if (limits.basis() != Basis.PER_MASS) {
            throw new Unsound(
                    limits.place(),
                    "a limit with " + found + " is by mass: found one in " + limits.unit()
                            + "; write such as 25 g/kg or 3 %");
        }
    }

    static void ordered(Place place, @Nullable Quantity atMost, @Nullable Quantity atLeast) {
        if (atMost == null && atLeast == null) {
            throw new Unsound(place, "a target needs a limit; add at-most, at-least or both");
        }
        if (atMost != null && atLeast != null && atLeast.si() > atMost.si()) {
            throw new Unsound(
                    atLeast.place(),
                    "`at-least` is above `at-most`: found \"" + atLeast + "\" above \"" + atMost + "\"");
        }
    }
}
