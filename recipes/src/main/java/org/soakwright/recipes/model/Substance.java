package org.soakwright.recipes.model;

/** What a species is, where the properties of its liquor are known. */
public enum Substance implements Word {
    SODIUM_CHLORIDE,
    SUCROSE,
    WATER;

    /** Whether the density, the saturation and the diffusivity of its solution in water are known. */
    public boolean hasKnownLiquor() {
        return this != WATER;
    }

    @Override
    public String word() {
        return Word.super.word().replace('-', ' ');
    }
}
