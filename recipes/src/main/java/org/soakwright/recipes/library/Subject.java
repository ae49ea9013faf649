package org.soakwright.recipes.library;

/**
 * What an entry is about.
 *
 * @param composition of the material and the liquor, as far as the source tells; may be empty
 * @param direction in the material, such as across the fibres; empty where it has none or the source does not say
 * @param relativeTo what a ratio is taken to; empty for everything else
 */
public record Subject(String species, String material, String composition, String direction, String relativeTo) {}
