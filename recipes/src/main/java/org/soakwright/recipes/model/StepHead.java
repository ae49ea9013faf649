package org.soakwright.recipes.model;

import java.util.function.UnaryOperator;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Place;

/**
 * What every step has: a name of its own, a time, and what it states about temperature, properties and prices.
 *
 * @param gain by what part of its mass as loaded the lot is heavier at the end of the step than at its beginning, above
 *     -1; null is not stated
 */
public record StepHead(
        Place place,
        String name,
        Time time,
        @Nullable Quantity temperature,
        Overrides overrides,
        @Nullable LiquorPrice price,
        @Nullable Quantity gain,
        Handling handling) {
    public StepHead {
        Rules.named("a step", name, place);
        Rules.temperature(temperature);
        Rules.gain(gain);
    }

    public StepHead each(UnaryOperator<Quantity> change) {
        return new StepHead(
                place,
                name,
                time,
                Quantity.each(temperature, change),
                overrides.each(change),
                price,
                Quantity.each(gain, change),
                handling);
    }

    public StepHead withName(String other) {
        return new StepHead(place, other, time, temperature, overrides, price, gain, handling);
    }

    public StepHead withOverrides(Overrides other) {
        return new StepHead(place, name, time, temperature, other, price, gain, handling);
    }

    public StepHead withTime(Time other) {
        return new StepHead(place, name, other, temperature, overrides, price, gain, handling);
    }

    public StepHead withTemperature(@Nullable Quantity other) {
        return new StepHead(place, name, time, other, overrides, price, gain, handling);
    }

    public StepHead withHandling(Handling other) {
        return new StepHead(place, name, time, temperature, overrides, price, gain, other);
    }
}
