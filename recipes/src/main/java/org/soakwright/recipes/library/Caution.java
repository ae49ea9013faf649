package org.soakwright.recipes.library;

import java.util.function.DoubleFunction;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/**
 * What whoever runs a batch should know beside the numbers.
 *
 * @param when it is due
 * @param text without its last full stop; {@code {held}} stands for the time that {@code when} counts
 */
public record Caution(Place place, String id, Condition when, String text, Weight weight, Authority source) {
    private static final String HELD = "{held}";

    public Caution {
        if (text.endsWith(".")) {
            throw new Unsound(place, "the text of a caution ends without a full stop, its source follows; remove it");
        }
    }

    public boolean isDue(Facts facts) {
        return when.holds(facts);
    }

    /** Whether the plan may not be used as it stands: it is due, it stops, and nobody answers for the plan. */
    public boolean stops(Facts facts) {
        return weight instanceof Weight.Stops
                && isDue(facts)
                && facts.allowedBy().isEmpty();
    }

    /**
     * The caution with its source.
     *
     * @param duration how to write seconds
     */
    public String shown(Facts facts, DoubleFunction<String> duration) {
        String held = text.contains(HELD)
                ? text.replace(HELD, duration.apply(when.held(facts).orElseThrow()))
                : text;
        return held + " (" + source.cited() + ").";
    }
}
