package org.soakwright.recipes.model;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
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
                        "a step's own diffusivity holds at its temperature; remove at and activation-energy");
            }
        });
        diffusivity = Collections.unmodifiableMap(new LinkedHashMap<>(diffusivity));
        partition = Collections.unmodifiableMap(new LinkedHashMap<>(partition));
    }
}
