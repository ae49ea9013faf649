package org.soakwright.recipes.model;

import java.math.BigDecimal;
import java.util.List;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Place;

/** Short ways to the values that tests state. */
final class Given {
    private Given() {}

    static Quantity quantity(String value, String unit, Kind kind) {
        return new Quantity(new BigDecimal(value), kind.unit(unit).orElseThrow(), new Place("f", 1, 1));
    }

    static Quantity fraction(double fraction) {
        return quantity(Double.toString(fraction), "1", Kind.FRACTION);
    }

    static Side side(Dimension dimension, String millimetres) {
        return new Side(dimension, quantity(millimetres, "mm", Kind.LENGTH), Faces.BOTH);
    }

    static Grade grade(String name, Shape shape, double share, Side... sides) {
        return new Grade(new Place("f", 1, 1), name, shape, List.of(sides), share, null, null, null);
    }

    static Quantity time(String value, String unit) {
        return quantity(value, unit, Kind.DURATION);
    }
}
