package org.soakwright.recipes.library;

import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.text.Unsound;

/** More than one value and less than another, neither included; null leaves a side open. */
public record Window(@Nullable Quantity above, @Nullable Quantity below) {
    /** Open on both sides. */
    public static final Window ANY = new Window(null, null);

    public Window {
        if (above != null && below != null && !(above.si() < below.si())) {
            throw new Unsound(
                    below.place(), "`below` lies over `above`: found \"" + below + "\" after \"" + above + "\"");
        }
    }

    boolean isOpen() {
        return above == null && below == null;
    }

    boolean holds(double si) {
        return (above == null || si > above.si()) && (below == null || si < below.si());
    }
}
