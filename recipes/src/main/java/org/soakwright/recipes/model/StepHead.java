package org.soakwright.recipes.model;

import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Place;

/** What every step has: a name of its own, a time, and what it states about temperature, properties and prices. */
public record StepHead(
        Place place,
        String name,
        Time time,
        @Nullable Quantity temperature,
        Overrides overrides,
        @Nullable LiquorPrice price) {
    public StepHead {
        Rules.named("a step", name, place);
        Rules.temperature(temperature);
    }

    public StepHead withTime(Time other) {
        return new StepHead(place, name, other, temperature, overrides, price);
    }

    public StepHead withTemperature(@Nullable Quantity other) {
        return new StepHead(place, name, time, other, overrides, price);
    }
}
