package org.soakwright.recipes.model;

import java.util.Locale;

/** A choice the language writes as one lower-case word. */
public interface Word {
    String name();

    /** As written in a recipe. */
    default String word() {
        return name().toLowerCase(Locale.ROOT);
    }
}
