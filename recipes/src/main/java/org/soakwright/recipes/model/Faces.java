package org.soakwright.recipes.model;

/** Which faces of a slab are wetted. */
public enum Faces implements Word {
    ONE,
    BOTH
}
