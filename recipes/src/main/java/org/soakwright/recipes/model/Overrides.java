package org.soakwright.recipes.model;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * What a step states differently for some species.
 *
 * @param diffusivity m2/s by species, not scaled by temperature
 * @param partition by species
 */
public record Overrides(Map<String, Quantity> diffusivity, Map<String, Partition> partition) {
    public static final Overrides NONE = new Overrides(Map.of(), Map.of());

    public Overrides {
        diffusivity.values().forEach(value -> Rules.positive("a diffusivity", value));
        diffusivity = Collections.unmodifiableMap(new LinkedHashMap<>(diffusivity));
        partition = Collections.unmodifiableMap(new LinkedHashMap<>(partition));
    }
}
