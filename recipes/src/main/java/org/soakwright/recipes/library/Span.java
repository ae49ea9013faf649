package org.soakwright.recipes.library;

import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/** From one value to another that is no smaller; a single value is both. */
public record Span(Quantity from, Quantity to) {
    public Span {
        if (from.si() > to.si()) {
            throw new Unsound(
                    to.place(),
                    "a range rises: found \"" + to + "\" after \"" + from + "\"; write the smaller value first");
        }
    }

    /** A single value. */
    public static Span of(Quantity value) {
        return new Span(value, value);
    }

    public boolean isOne() {
        return from.si() == to.si();
    }

    public Place place() {
        return from.place();
    }

    /** {@code 4 Cel}, or {@code 4 Cel to 20 Cel}. */
    @Override
    public String toString() {
        return isOne() ? from.toString() : from + " to " + to;
    }
}
