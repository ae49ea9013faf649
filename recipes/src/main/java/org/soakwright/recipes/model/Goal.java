package org.soakwright.recipes.model;

/** What is to be least, and what a total can be of. */
public enum Goal implements Word {
    TIME,
    COST,
    LIQUOR
}
