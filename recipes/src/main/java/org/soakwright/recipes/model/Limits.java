package org.soakwright.recipes.model;

import java.util.List;
import java.util.Objects;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problem;
import org.soakwright.recipes.text.Unit;
import org.soakwright.recipes.text.Unsound;

/** An upper limit, a lower one, or both for a band; each zero or more, in one basis. */
public record Limits(
        Place place,
        Basis basis,
        @Nullable Quantity atMost,
        @Nullable Quantity atLeast) {
    public Limits {
        Rules.requireAll(List.of(problems("`at-most`", basis, atMost), problems("`at-least`", basis, atLeast)));
        if (atMost == null && atLeast == null) {
            throw new Unsound(place, "a target needs a limit; add at-most, at-least or both");
        }
        if (atMost != null && atLeast != null) {
            if (basis != Basis.OF_START && Basis.of(atMost.unit()) != Basis.of(atLeast.unit())) {
                throw new Unsound(
                        atLeast.place(),
                        "the limits of a band are both by mass or both by volume: found \"" + atLeast + "\" and \""
                                + atMost + "\"");
            }
            if (atLeast.si() > atMost.si()) {
                throw new Unsound(
                        atLeast.place(),
                        "`at-least` is above `at-most`: found \"" + atLeast + "\" above \"" + atMost + "\"");
            }
        }
    }

    /** What a piece holds can grow beyond its start, but not beyond the whole. */
    private static List<Problem> problems(String what, Basis basis, @Nullable Quantity limit) {
        return basis == Basis.OF_START ? Rules.ifNegative(what, limit) : Rules.ifNoLimit(what, limit);
    }

    /** No more than the whole where that is what the limits count against. */
    List<Problem> beyondTheWhole() {
        return Stream.of(Rules.ifNoContent("`at-most`", atMost), Rules.ifNoContent("`at-least`", atLeast))
                .flatMap(List::stream)
                .filter(problem -> basis != Basis.OF_START)
                .toList();
    }

    /** The unit in which the target is shown. */
    public Unit unit() {
        return atMost != null ? atMost.unit() : Objects.requireNonNull(atLeast).unit();
    }
}
