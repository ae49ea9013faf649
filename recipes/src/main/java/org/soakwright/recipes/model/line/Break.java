package org.soakwright.recipes.model.line;

import java.time.LocalTime;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/** A time of a shift in which nobody moves lots; one at or before {@code from} ends past midnight. */
public record Break(Place place, LocalTime from, LocalTime to) {
    public Break {
        Minutes.require("the begin of a break", from, place);
        Minutes.require("the end of a break", to, place);
        if (from.equals(to)) {
            throw new Unsound(
                    place,
                    "a break ends after it begins: found \"" + from + "\" twice; write such as {from: \"12:00\", to:"
                            + " \"12:30\"}");
        }
    }
}
