package org.soakwright.planner.report.compare;

import java.util.Optional;
import java.util.OptionalDouble;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Unit;

/**
 * The same quantity in both batches, in one unit.
 *
 * @param a empty where the first has none
 */
public record Measure(String unit, OptionalDouble a, OptionalDouble b) {
    /** What the second has more than the first; empty where either has none. */
    public OptionalDouble difference() {
        return a.isPresent() && b.isPresent()
                ? OptionalDouble.of(b.getAsDouble() - a.getAsDouble())
                : OptionalDouble.empty();
    }

    /** Whether at least one of the two has it. */
    boolean isAny() {
        return a.isPresent() || b.isPresent();
    }

    /** Two contents in the unit of the first; empty where they are counted differently, so that no difference says anything. */
    static Optional<Measure> of(Optional<Side.Content> a, Optional<Side.Content> b) {
        if (a.isEmpty() || b.isEmpty()) {
            return Optional.of(a.or(() -> b).map(Side.Content::unit).orElse(""))
                    .map(unit -> new Measure(unit, value(a), value(b)));
        }
        String unit = a.get().unit();
        if (unit.equals(b.get().unit())) {
            return Optional.of(new Measure(unit, value(a), value(b)));
        }
        return converted(b.get(), unit).map(value -> new Measure(unit, value(a), OptionalDouble.of(value)));
    }

    private static OptionalDouble value(Optional<Side.Content> content) {
        return content.map(one -> OptionalDouble.of(one.value())).orElse(OptionalDouble.empty());
    }

    private static Optional<Double> converted(Side.Content content, String symbol) {
        for (Kind kind : new Kind[] {Kind.PER_MASS, Kind.PER_VOLUME}) {
            Optional<Unit> from = kind.unit(content.unit());
            Optional<Unit> to = kind.unit(symbol);
            if (from.isPresent() && to.isPresent()) {
                return Optional.of(to.get().fromSi(from.get().toSi(java.math.BigDecimal.valueOf(content.value()))));
            }
        }
        return Optional.empty();
    }
}
