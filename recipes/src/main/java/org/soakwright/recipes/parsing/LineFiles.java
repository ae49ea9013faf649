package org.soakwright.recipes.parsing;

import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Source;

/** The files that a line names. */
public interface LineFiles {
    /**
     * The list of lots of a name.
     *
     * @param place where the line names it
     * @throws org.soakwright.recipes.text.Unsound where it cannot be had
     */
    Source lots(String name, Place place);

    /**
     * The recipe of a name.
     *
     * @param place where it is named
     * @throws org.soakwright.recipes.text.Unsound with its own problems, where it cannot be had or is not whole
     */
    Recipe recipe(String name, Place place);
}
