package org.soakwright.recipes.model;

import org.soakwright.recipes.text.Place;

/** A name written to point at something declared elsewhere in the recipe. */
public record Reference(String name, Place place) {
    @Override
    public String toString() {
        return name;
    }
}
