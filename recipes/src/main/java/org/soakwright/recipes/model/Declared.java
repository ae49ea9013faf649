package org.soakwright.recipes.model;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/**
 * What a recipe declares, as far as it could be read: a name counts even where what stands under it is broken, so that
 * one mistake is reported once.
 *
 * @param speciesNames every species written
 * @param species those that could be read
 * @param steps every step written, with its kind
 * @param grades every grade written
 * @param shapes of the grades whose shape could be read
 * @param lotHasDensity whether the lot states a density
 * @param lotHasMoisture whether the lot states a moisture
 * @param statesGain whether some step states a gain
 * @param priced whether anything has a price in the recipe
 */
public record Declared(
        Set<Product> products,
        Set<String> speciesNames,
        List<Species> species,
        Map<String, String> steps,
        Set<String> grades,
        Map<String, Shape> shapes,
        boolean lotHasDensity,
        boolean lotHasMoisture,
        boolean statesGain,
        boolean priced) {
    public Declared {
        products = Collections.unmodifiableSet(new LinkedHashSet<>(products));
        speciesNames = Collections.unmodifiableSet(new LinkedHashSet<>(speciesNames));
        species = List.copyOf(species);
        steps = Collections.unmodifiableMap(new LinkedHashMap<>(steps));
        grades = Collections.unmodifiableSet(new LinkedHashSet<>(grades));
        shapes = Collections.unmodifiableMap(new LinkedHashMap<>(shapes));
    }

    Optional<Species> species(String name) {
        return species.stream().filter(one -> one.name().equals(name)).findFirst();
    }
}
