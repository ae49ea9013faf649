package org.soakwright.recipes.model;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.function.UnaryOperator;
import org.soakwright.recipes.text.Unsound;

/**
 * What a step states differently for some species.
 *
 * @param diffusivity by species, not scaled by temperature
 * @param partition by species
 */
public record Overrides(Map<String, Diffusivities> diffusivity, Map<String, Partition> partition) {
    public static final Overrides NONE = new Overrides(Map.of(), Map.of());

    public Overrides {
        diffusivity.values().forEach(stated -> {
            if (stated.dependsOnTemperature()) {
                throw new Unsound(
                        stated.place(),
                        "a step's own diffusivity holds at its temperature; write value, and give-or-take where it is"
                                + " known, alone");
            }
        });
        diffusivity = Collections.unmodifiableMap(new LinkedHashMap<>(diffusivity));
        partition = Collections.unmodifiableMap(new LinkedHashMap<>(partition));
    }

    /** With their quantities changed. */
    public Overrides each(UnaryOperator<Quantity> change) {
        Map<String, Diffusivities> changed = new LinkedHashMap<>(diffusivity);
        changed.replaceAll((species, one) -> one.each(change));
        Map<String, Partition> others = new LinkedHashMap<>(partition);
        others.replaceAll((species, one) -> one.each(change));
        return new Overrides(changed, others);
    }
}
