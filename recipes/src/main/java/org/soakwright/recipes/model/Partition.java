package org.soakwright.recipes.model;

import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Shown;
import org.soakwright.recipes.text.Unsound;

/** (kg/m3 of piece) / (kg/m3 of liquor) at equilibrium: a number above zero. */
public record Partition(double value, Place place) {
    public Partition {
        if (!(value > 0 && Double.isFinite(value))) {
            throw new Unsound(
                    place,
                    "a partition must be above zero: found " + Shown.number(value) + "; write a number such as 0.8");
        }
    }
}
