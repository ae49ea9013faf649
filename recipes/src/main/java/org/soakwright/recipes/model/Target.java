package org.soakwright.recipes.model;

import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/** What the batch has to reach. */
public sealed interface Target {
    Place place();

    /** How surely it is to be met; null is not said, or it is never uncertain. */
    default @Nullable Quantity confidence() {
        return null;
    }

    /**
     * A limit on what is read off the pieces.
     *
     * @param after the step at whose end it is read; null is the end of the recipe
     * @param counted against what the limits count
     * @param confidence that the target is met; null is the recipe's own
     * @param share of the pieces looked at, by mass, that meet the limits, above 0 and below 1; null is not counted
     */
    record OfPieces(
            Place place,
            Reference species,
            Reading reading,
            Limits limits,
            GradeScope grade,
            @Nullable Reference after,
            @Nullable Quantity share,
            Counted counted,
            @Nullable Quantity confidence)
            implements Target {
        public OfPieces {
            TargetRules.check(place, limits, counted);
            Rules.confidence(confidence);
            if (grade instanceof GradeScope.WholeLot && reading != Reading.MEAN && share == null) {
                throw new Unsound(
                        place,
                        "the whole lot has only a mean: found reading " + reading.word()
                                + " with grade lot; write reading: mean, a grade, or the share of its pieces such as 95 %");
            }
            if (share != null && !(share.si() > 0 && share.si() < 1)) {
                throw new Unsound(
                        share.place(),
                        "the share of the pieces lies above 0 % and below 100 %: found \"" + share
                                + "\"; write such as 95 %");
            }
        }

        /** Counted as loaded, with the recipe's own confidence. */
        public OfPieces(
                Place place,
                Reference species,
                Reading reading,
                Limits limits,
                GradeScope grade,
                @Nullable Reference after,
                @Nullable Quantity share) {
            this(place, species, reading, limits, grade, after, share, Counted.AS_LOADED, null);
        }
    }

    /**
     * A limit on the liquor at the end of a step, in its last fill.
     *
     * @param confidence that the target is met; null is the recipe's own
     */
    record OfLiquor(
            Place place,
            Reference step,
            Reference species,
            Limits limits,
            @Nullable Quantity confidence) implements Target {
        public OfLiquor {
            Rules.require(limits.beyondTheWhole());
            Rules.confidence(confidence);
            if (limits.basis() == Basis.OF_START) {
                throw new Unsound(place, "a liquor target is a content such as 30 g/L; remove `of: start`");
            }
        }
    }

    /**
     * Limits on the mass of the lot at the end of a step: kg, or parts of the mass as loaded; above zero, one or both.
     *
     * @param after the step at whose end it is weighed; null is the end of the recipe
     * @param confidence that the target is met; null is the recipe's own
     */
    record OfMass(
            Place place,
            boolean ofStart,
            @Nullable Quantity atMost,
            @Nullable Quantity atLeast,
            @Nullable Reference after,
            @Nullable Quantity confidence)
            implements Target {
        public OfMass {
            Rules.positive("a limit on the mass", atMost);
            Rules.positive("a limit on the mass", atLeast);
            Rules.confidence(confidence);
            TargetRules.ordered(place, atMost, atLeast);
        }
    }

    /** A limit on a total: seconds, m3 of liquor, or money; above zero. */
    record OfTotal(Place place, Goal total, Quantity atMost) implements Target {
        public OfTotal {
            Rules.positive("the limit of a total", atMost);
        }
    }
}
