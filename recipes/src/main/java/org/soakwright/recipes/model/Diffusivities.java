package org.soakwright.recipes.model;

import java.util.Collections;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.function.UnaryOperator;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/** How fast a species moves in a piece: alike in every direction, or by the direction of the grain. */
public sealed interface Diffusivities {
    Place place();

    /**
     * In one direction.
     *
     * @param grain null for a piece that has no direction, a sphere
     * @throws IllegalStateException where none is stated, which a {@link Recipe} rules out for its own pieces
     */
    Diffusivity of(@Nullable Grain grain);

    /** Every one stated. */
    List<Diffusivity> all();

    /** The same directions with each diffusivity changed. */
    Diffusivities map(UnaryOperator<Diffusivity> change);

    /** With the quantities of each changed. */
    default Diffusivities each(UnaryOperator<Quantity> change) {
        return map(one -> one.each(change));
    }

    /** Whether any of them depends on the temperature of a step. */
    default boolean dependsOnTemperature() {
        return all().stream().anyMatch(Diffusivity::dependsOnTemperature);
    }

    /** One value for every direction. */
    record Alike(Diffusivity value) implements Diffusivities {
        @Override
        public Place place() {
            return value.value().place();
        }

        @Override
        public Diffusivity of(@Nullable Grain grain) {
            return value;
        }

        @Override
        public List<Diffusivity> all() {
            return List.of(value);
        }

        @Override
        public Diffusivities map(UnaryOperator<Diffusivity> change) {
            return new Alike(change.apply(value));
        }
    }

    /** One value for each direction stated, one or more. */
    record ByGrain(Place place, Map<Grain, Diffusivity> values) implements Diffusivities {
        public ByGrain {
            if (values.isEmpty()) {
                throw new Unsound(
                        place,
                        "a diffusivity names no direction; write such as {along: 3e-10 m2/s, across: 2e-10 m2/s}");
            }
            values = Collections.unmodifiableMap(new EnumMap<>(values));
        }

        @Override
        public Diffusivity of(@Nullable Grain grain) {
            Diffusivity value = grain == null ? null : values.get(grain);
            if (value == null) {
                throw new IllegalStateException("no diffusivity in the direction " + grain);
            }
            return value;
        }

        @Override
        public List<Diffusivity> all() {
            return List.copyOf(values.values());
        }

        @Override
        public Diffusivities map(UnaryOperator<Diffusivity> change) {
            Map<Grain, Diffusivity> changed = new EnumMap<>(values);
            changed.replaceAll((grain, value) -> change.apply(value));
            return new ByGrain(place, changed);
        }
    }
}
