package org.soakwright.recipes.model;

/** What is on the bench, which decides the cautions that apply. */
public enum Product implements Word {
    FOOD,
    FLAMMABLE,
    CORROSIVE,
    OTHER
}
