package org.soakwright.recipes.model;

/** Which of the two faces at the ends of a side are wetted. */
public enum Faces implements Word {
    ONE,
    BOTH
}
