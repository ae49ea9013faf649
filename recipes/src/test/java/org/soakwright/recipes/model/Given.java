package org.soakwright.recipes.model;

import java.math.BigDecimal;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Place;

/** Short ways to the values that tests state. */
final class Given {
    private Given() {}

    static Quantity quantity(String value, String unit, Kind kind) {
        return new Quantity(new BigDecimal(value), kind.unit(unit).orElseThrow(), new Place("f", 1, 1));
    }

    static Quantity time(String value, String unit) {
        return quantity(value, unit, Kind.DURATION);
    }
}
