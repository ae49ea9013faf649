package org.soakwright.recipes.model.line;

import java.time.ZonedDateTime;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/**
 * A time in which a vessel cannot be used, not even to hold a lot.
 *
 * @param vessel which of its group, from 1; 0 is every one of them
 * @param to when it can be used again, after {@code from}
 */
public record Outage(
        Place place,
        int vessel,
        ZonedDateTime from,
        ZonedDateTime to,
        @Nullable String reason) {
    /** Every vessel of the group. */
    public static final int EVERY = 0;

    public Outage {
        if (vessel < 0) {
            throw new Unsound(place, "vessels count from 1: found " + vessel + "; write such as vessel: 2");
        }
        Minutes.require("the begin of an outage", from, place);
        Minutes.require("the end of an outage", to, place);
        if (!from.toInstant().isBefore(to.toInstant())) {
            throw new Unsound(
                    place,
                    "an outage ends after it begins: found from \"" + from.toLocalDateTime() + "\" to \""
                            + to.toLocalDateTime() + "\"; write a later to");
        }
    }

    /** Whether the vessel of that number, from 1, is out. */
    public boolean concerns(int number) {
        return vessel == EVERY || vessel == number;
    }
}
