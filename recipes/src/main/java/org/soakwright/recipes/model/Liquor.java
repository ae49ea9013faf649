package org.soakwright.recipes.model;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.OptionalDouble;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/**
 * The liquor of a step, per fill.
 *
 * @param contents what the fresh liquor holds of each species named, in the order written
 * @param othersZero whether species not named are absent; else each that exchanges with liquor is named
 * @param density of the liquor, required where a content is by mass
 */
public record Liquor(
        Place place,
        LiquorVolume volume,
        Map<String, Content> contents,
        boolean othersZero,
        @Nullable Quantity density) {
    public Liquor {
        contents = Collections.unmodifiableMap(new LinkedHashMap<>(contents));
        Rules.positive("the liquor's density", density);
        if (density == null) {
            contents.values().stream()
                    .filter(content -> content.basis() == Basis.PER_MASS && content.si() > 0)
                    .findFirst()
                    .ifPresent(content -> {
                        throw new Unsound(
                                content.place(),
                                "a content by mass needs the liquor's density: found \"" + content
                                        + "\"; add density, such as 1080 kg/m3, or write the content as g/L");
                    });
        }
    }

    /** What the fresh liquor holds of a species, kg/m3. */
    public double kgPerM3(String species) {
        Content content = contents.get(species);
        return content == null ? 0 : kgPerM3(content);
    }

    /** A content of this liquor as kg/m3. */
    public double kgPerM3(Content content) {
        if (content.basis() != Basis.PER_MASS || content.si() == 0) {
            return content.si();
        }
        if (density == null) {
            throw new IllegalStateException("the liquor has no density");
        }
        return content.si() * density.si();
    }

    /** The volume per fill, m3; empty where it is unlimited. */
    public OptionalDouble volumeM3(Lot lot) {
        if (volume instanceof LiquorVolume.Volume stated) {
            return OptionalDouble.of(stated.value().si());
        }
        if (volume instanceof LiquorVolume.Ratio ratio) {
            return OptionalDouble.of(ratio.value().si() * lot.massKg().orElseThrow());
        }
        return OptionalDouble.empty();
    }

    public boolean isUnlimited() {
        return volume instanceof LiquorVolume.Unlimited;
    }
}
