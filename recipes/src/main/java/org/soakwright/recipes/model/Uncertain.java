package org.soakwright.recipes.model;

/**
 * A quantity that is not known exactly.
 *
 * @param name what it is called in results, such as {@code diffusivity of salt}
 * @param quantity with its give-or-take
 */
public record Uncertain(String name, Quantity quantity) {}
