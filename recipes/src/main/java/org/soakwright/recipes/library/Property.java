package org.soakwright.recipes.library;

import java.util.Optional;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Word;
import org.soakwright.recipes.text.Kind;

/** What the figure of an entry is of. */
public enum Property implements Word {
    /** Of the species in the material. */
    DIFFUSIVITY(Kind.DIFFUSIVITY),
    /** One diffusivity over another, which the entry names; a plain number. */
    DIFFUSIVITY_RATIO(null),
    /** Only how strongly a diffusivity rises with temperature. */
    ACTIVATION_ENERGY(Kind.MOLAR_ENERGY),
    /** (kg/m3 of piece) / (kg/m3 of liquor) at equilibrium, as in a recipe; a plain number. */
    PARTITION(null),
    /** The least share of air by volume at which a vapour burns. */
    LOWER_FLAMMABLE_LIMIT(Kind.FRACTION);

    private final @Nullable Kind kind;

    Property(@Nullable Kind kind) {
        this.kind = kind;
    }

    /** The kind of its values; empty for a plain number. */
    public Optional<Kind> kind() {
        return Optional.ofNullable(kind);
    }
}
