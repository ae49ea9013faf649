package org.soakwright.recipes.model;

import java.util.Objects;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/** What a volume of liquor costs, money per m3, zero or more; a price that is not split is all supply. */
public record LiquorPrice(
        Place place, @Nullable Quantity supply, @Nullable Quantity disposal) {
    public LiquorPrice {
        Rules.notNegative("a price", supply);
        Rules.notNegative("a price", disposal);
        if (supply == null && disposal == null) {
            throw new Unsound(
                    place, "a liquor price names nothing; write supply, disposal or both, such as 3.1 EUR/m3");
        }
    }

    static Optional<LiquorPrice> of(Step step, @Nullable Prices prices) {
        LiquorPrice own = step.head().price();
        return Optional.ofNullable(own != null || prices == null ? own : prices.liquor());
    }

    /** Supply and disposal together, money per m3. */
    public double perM3() {
        return (supply == null ? 0 : supply.si()) + (disposal == null ? 0 : disposal.si());
    }

    /** One of the prices stated. */
    Quantity any() {
        return supply != null ? supply : Objects.requireNonNull(disposal);
    }
}
