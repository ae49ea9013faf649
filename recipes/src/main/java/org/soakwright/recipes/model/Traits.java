package org.soakwright.recipes.model;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.function.UnaryOperator;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Unsound;

/**
 * What a species is beyond how it moves in the piece.
 *
 * @param substance null is none of those known
 * @param molarMass kg/mol, of a species that is none of those known; null is not stated
 * @param inLiquor how it moves in the liquor; null is not stated
 * @param skins of single grades, by name
 * @param skin of every grade; null is none
 */
public record Traits(
        @Nullable Substance substance,
        @Nullable Quantity molarMass,
        @Nullable Diffusivity inLiquor,
        Map<String, Skin> skins,
        @Nullable Skin skin) {
    public static final Traits NONE = new Traits(null, null, null, Map.of(), null);

    public Traits {
        Rules.positive("a molar mass", molarMass);
        if (substance != null && molarMass != null) {
            throw new Unsound(
                    molarMass.place(),
                    "the molar mass of " + substance.word() + " is known: found \"" + molarMass + "\"; remove it");
        }
        skins = Collections.unmodifiableMap(new LinkedHashMap<>(skins));
    }

    /** What covers the pieces of a grade. */
    public Optional<Skin> skin(String grade) {
        return Optional.ofNullable(skins.getOrDefault(grade, skin));
    }

    public Traits each(UnaryOperator<Quantity> change) {
        Map<String, Skin> changed = new LinkedHashMap<>(skins);
        changed.replaceAll((grade, one) -> one.each(change));
        return new Traits(
                substance,
                Quantity.each(molarMass, change),
                inLiquor == null ? null : inLiquor.each(change),
                changed,
                skin == null ? null : skin.each(change));
    }
}
