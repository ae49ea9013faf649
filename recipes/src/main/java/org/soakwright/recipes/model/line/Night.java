package org.soakwright.recipes.model.line;

import java.time.LocalTime;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/** When moves are better left undone, by the clock on the wall; usually across midnight. */
public record Night(Place place, LocalTime from, LocalTime to) {
    private static final LocalTime EVENING = LocalTime.of(22, 0);
    private static final LocalTime MORNING = LocalTime.of(6, 0);

    public Night {
        Minutes.require("the begin of the night", from, place);
        Minutes.require("the end of the night", to, place);
        if (from.equals(to)) {
            throw new Unsound(
                    place,
                    "a night is not the whole day: found \"" + from + "\" twice; write such as {from: \"22:00\", to:"
                            + " \"06:00\"}");
        }
    }

    /** From 22:00 to 06:00. */
    public static Night usual(Place place) {
        return new Night(place, EVENING, MORNING);
    }

    public boolean contains(LocalTime time) {
        return Minutes.after(from, time) < Minutes.between(from, to);
    }
}
