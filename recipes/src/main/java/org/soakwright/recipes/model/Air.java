package org.soakwright.recipes.model;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.function.UnaryOperator;
import org.soakwright.recipes.text.Place;

/** The air of a drying step: the content of the piece towards which its surface goes, for each species that can. */
public record Air(Place place, Map<String, Content> equilibrium) {
    public Air {
        equilibrium = Collections.unmodifiableMap(new LinkedHashMap<>(equilibrium));
    }

    public Air each(UnaryOperator<Quantity> change) {
        Map<String, Content> changed = new LinkedHashMap<>(equilibrium);
        changed.replaceAll((species, content) -> content.each(change));
        return new Air(place, changed);
    }
}
