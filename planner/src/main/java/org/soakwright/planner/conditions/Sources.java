package org.soakwright.planner.conditions;

import java.util.function.Supplier;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.text.Unsound;
import org.soakwright.solver.transport.OutOfRange;

/** Published properties asked for at what a recipe states: beyond what their source covers, the recipe is refused at that place. */
final class Sources {
    private Sources() {}

    /**
     * The property.
     *
     * @param stated what it is asked for at
     * @throws Unsound where that is beyond the source
     */
    static <T> T at(Quantity stated, Supplier<T> property) {
        try {
            return property.get();
        } catch (OutOfRange beyond) {
            Unsound unsound = new Unsound(
                    stated.place(),
                    "no property is known there: found \"" + stated + "\"; " + beyond.getMessage()
                            + "; state the density, the film coefficient or the diffusivity itself");
            unsound.initCause(beyond);
            throw unsound;
        }
    }
}
