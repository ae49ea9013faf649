package org.soakwright.recipes.model;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.function.UnaryOperator;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/**
 * The liquor of a step, per fill.
 *
 * @param contents what the fresh liquor holds of each species named, in the order written
 * @param othersZero whether species not named are absent; else each that exchanges with liquor is named
 * @param density of the liquor; where it is null, a content by mass needs a species whose liquor is known
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
        contents.values().forEach(content -> {
            if (content.per() != Per.LOADED) {
                throw new Unsound(content.place(), "a liquor has no dry mass; remove per");
            }
        });
    }

    /** With its quantities changed. */
    public Liquor each(UnaryOperator<Quantity> change) {
        Map<String, Content> changed = new LinkedHashMap<>(contents);
        changed.replaceAll((species, content) -> content.each(change));
        return new Liquor(place, volume.each(change), changed, othersZero, Quantity.each(density, change));
    }

    /** The same liquor with other contents. */
    public Liquor with(Map<String, Content> others) {
        return new Liquor(place, volume, others, othersZero, density);
    }

    /** What the fresh liquor holds of a species, kg/m3. */
    public double kgPerM3(String species) {
        Content content = contents.get(species);
        return content == null ? 0 : kgPerM3(content);
    }

    /** Whether a content is known from what the liquor states: by volume, by mass with a density, or none at all. */
    public boolean tells(Content content) {
        return content.si() == 0
                || content.basis() == Basis.PER_VOLUME
                || (content.basis() == Basis.PER_MASS && density != null);
    }

    /**
     * A content of this liquor as kg/m3.
     *
     * @throws IllegalStateException where the properties of its solution are needed, as {@link #tells} says
     */
    public double kgPerM3(Content content) {
        if (content.basis() == Basis.PER_VOLUME || content.si() == 0) {
            return content.si();
        }
        if (content.basis() != Basis.PER_MASS || density == null) {
            throw new IllegalStateException("the liquor does not tell what " + content + " is");
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
