package org.soakwright.solver.transport;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.solver.Require;

/**
 * A property from a correlation.
 *
 * @param value SI, finite
 * @param within how far the source says it may be off, as a share of value; at least 0; 0 where what was stated is only
 *     carried on
 * @param cautions what lies outside the source's range; empty inside it
 */
public record Quantity(double value, double within, List<Caution> cautions) {
    public Quantity {
        cautions = List.copyOf(cautions);
        Require.finite("value", value, "SI");
        Require.notNegative("error", within, "1");
    }

    /** The same quantity multiplied by one known exactly. */
    Quantity times(double factor) {
        return new Quantity(value * factor, within, cautions);
    }

    /** The product; errors add, cautions are joined. */
    Quantity times(Quantity other) {
        return new Quantity(value * other.value, within + other.within, join(cautions, other.cautions));
    }

    /** The ratio; errors add, cautions are joined. */
    Quantity over(Quantity other) {
        return new Quantity(value / other.value, within + other.within, join(cautions, other.cautions));
    }

    static List<Caution> join(List<Caution> one, List<Caution> other) {
        List<Caution> all = new ArrayList<>(one);
        for (Caution caution : other) {
            if (!all.contains(caution)) {
                all.add(caution);
            }
        }
        return all;
    }
}
