package org.soakwright.planner.batch;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.soakwright.planner.batch.doubt.Draws;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Uncertain;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/**
 * What of a recipe is not known exactly, each value by a standard normal number of its own: lognormal with the stated value as median and the
 * give-or-take as coefficient of variation; temperatures normal in kelvins.
 */
final class Uncertainty {
    private final Recipe recipe;
    private final List<Uncertain> all;
    private final Map<Place, Integer> byPlace = new HashMap<>();
    private final double[] sigma;

    private Uncertainty(Recipe recipe) {
        this.recipe = recipe;
        all = recipe.uncertain();
        if (all.size() > Draws.MOST_DIMENSIONS) {
            throw new Unsound(
                    all.get(Draws.MOST_DIMENSIONS).quantity().place(),
                    "more than " + Draws.MOST_DIMENSIONS + " values have a give-or-take: found " + all.size()
                            + "; keep those that matter");
        }
        sigma = new double[all.size()];
        for (int j = 0; j < sigma.length; j++) {
            Quantity stated = all.get(j).quantity();
            Quantity about = stated.giveOrTake();
            double size = about == null ? 0 : about.si();
            byPlace.put(stated.place(), j);
            sigma[j] = stated.isTemperature() ? size : Math.sqrt(Math.log1p(size * size));
        }
    }

    static Uncertainty of(Recipe recipe) {
        return new Uncertainty(recipe);
    }

    boolean isEmpty() {
        return all.isEmpty();
    }

    int size() {
        return all.size();
    }

    /** What a value is called. */
    String name(int value) {
        return all.get(value).name();
    }

    /**
     * The recipe as it would be, every value known.
     *
     * @param normals by value
     * @throws Unsound where that is no recipe
     */
    Recipe drawn(double[] normals) {
        return recipe.each(quantity -> {
            if (quantity.giveOrTake() == null) {
                return quantity;
            }
            Integer value = byPlace.get(quantity.place());
            if (value == null) {
                throw new IllegalStateException("a give-or-take that the recipe does not list: " + quantity.place());
            }
            return quantity.withSi(drawn(quantity, sigma[value] * normals[value]));
        });
    }

    private static double drawn(Quantity stated, double off) {
        return stated.isTemperature() ? stated.si() + off : stated.si() * Math.exp(off);
    }
}
