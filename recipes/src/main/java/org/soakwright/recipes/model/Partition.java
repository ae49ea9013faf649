package org.soakwright.recipes.model;

import java.util.function.UnaryOperator;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Shown;
import org.soakwright.recipes.text.Unsound;

/** (kg/m3 of piece) / (kg/m3 of liquor) at equilibrium: a number above zero. */
public record Partition(Quantity amount) {
    public Partition {
        if (!(amount.si() > 0)) {
            throw new Unsound(
                    amount.place(),
                    "a partition must be above zero: found " + Shown.number(amount.si())
                            + "; write a number such as 0.8");
        }
    }

    public double value() {
        return amount.si();
    }

    public Place place() {
        return amount.place();
    }

    public Partition each(UnaryOperator<Quantity> change) {
        return new Partition(change.apply(amount));
    }
}
