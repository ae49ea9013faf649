package org.soakwright.recipes.model.line;

import java.util.List;
import java.util.Optional;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/**
 * Water, steam or power that vessels share.
 *
 * @param atMost what all of them together draw at any time, above zero: a flow, a mass per time or a power
 */
public record Utility(Place place, String name, Quantity atMost) {
    /** What a utility can be counted in. */
    public static final List<Kind> KINDS = List.of(Kind.FLOW, Kind.MASS_FLOW, Kind.POWER);

    public Utility {
        if (name.isBlank()) {
            throw new Unsound(place, "a utility has no name; write one such as water");
        }
        atMost.positive("the limit of " + name);
        if (KINDS.stream().noneMatch(kind -> kind.has(atMost.unit()))) {
            throw new Unsound(
                    atMost.place(),
                    "the limit of " + name + " is a flow, a mass per time or a power: found \"" + atMost
                            + "\"; write such as 60 L/min, 300 kg/h or 40 kW");
        }
    }

    /** What it is counted in. */
    public Kind kind() {
        Optional<Kind> kind =
                KINDS.stream().filter(one -> one.has(atMost.unit())).findFirst();
        return kind.orElseThrow();
    }
}
