package org.soakwright.recipes.model;

import java.util.Objects;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/**
 * What time and liquor cost; what has no price counts as nothing.
 *
 * @param time money per second, zero or more
 */
public record Prices(
        Place place, @Nullable Quantity time, @Nullable LiquorPrice liquor) {
    public Prices {
        Rules.notNegative("a price", time);
        if (time == null && liquor == null) {
            throw new Unsound(
                    place, "prices names nothing; write time, such as 40 EUR/h, or liquor, such as 3.1 EUR/m3");
        }
    }

    /** Money per second. */
    public double perSecond() {
        return time == null ? 0 : time.si();
    }

    /** The three-letter code of the money counted in. */
    public String currency() {
        return Counting.currency(
                time != null ? time : Objects.requireNonNull(liquor).any());
    }
}
