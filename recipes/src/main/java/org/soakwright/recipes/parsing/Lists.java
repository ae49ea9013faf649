package org.soakwright.recipes.parsing;

import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Source;

/** Where the lists lie that a recipe names. */
@FunctionalInterface
public interface Lists {
    /**
     * The list of a name.
     *
     * @param place where the recipe names it
     * @throws org.soakwright.recipes.text.Unsound where it cannot be had
     */
    Source list(String name, Place place);
}
