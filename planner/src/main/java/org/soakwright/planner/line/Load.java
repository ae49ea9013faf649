package org.soakwright.planner.line;

import java.util.List;
import java.util.stream.Collectors;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.line.Order;

/**
 * What goes through the line together: a lot, a part of one that no vessel holds whole, or several small ones of one recipe.
 *
 * @param recipe as written, with the mass of this load
 * @param shares one or more
 */
public record Load(Recipe recipe, String recipeFile, double kg, List<Share> shares) {
    /**
     * A lot, or a part of it.
     *
     * @param part from 1
     * @param parts 1 where the lot is whole
     */
    public record Share(Order order, int part, int parts, double kg) {
        public String name() {
            return parts == 1 ? order.lot() : order.lot() + " (" + part + " of " + parts + ")";
        }
    }

    public Load {
        shares = List.copyOf(shares);
    }

    public String name() {
        return shares.stream().map(Share::name).collect(Collectors.joining(" + "));
    }
}
