package org.soakwright.planner.batch;

import java.util.Collections;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.soakwright.recipes.model.Reading;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.text.Unit;

/**
 * Where things stand when a step ends.
 *
 * @param from running clock at the step's beginning, s from the start of the batch
 * @param seconds how long it lasted, s: without what lies between its fills
 * @param liquor by species that exchanges with it, for a step in liquor; of the last fill
 * @param means the lot's mean by mass of each species
 * @param pieces each grade
 * @param massKg of the lot; empty where the recipe does not say how it changes
 */
public record StepEnd(
        Step step,
        double from,
        double seconds,
        List<Liquor> liquor,
        List<LotMean> means,
        List<Piece> pieces,
        OptionalDouble massKg) {
    /** Shares of the pieces, by mass, whose readings are told where pieces differ; 1. */
    public static final List<Double> SHARES = List.of(0.01, 0.05, 0.1, 0.25, 0.5, 0.75, 0.9, 0.95, 0.99);

    /** Running clock at its end, s. */
    public double to() {
        return ending(seconds);
    }

    /** Running clock at its end if it lasted so long. */
    public double ending(double other) {
        return from + other + (step.fills() - 1) * step.gapBetweenFills().seconds();
    }

    /** Running clock when a fill, from 0, comes in. */
    public double fillFrom(int fill) {
        return from + fill * (seconds / step.fills() + step.gapBetweenFills().seconds());
    }

    /** Running clock when a fill, from 0, is let go. */
    public double fillTo(int fill) {
        return fill == step.fills() - 1 ? to() : fillFrom(fill) + seconds / step.fills();
    }

    /** What the liquor holds of a species at the beginning, what clung to the pieces mixed in, and at the end; kg/m3 = g/L. */
    public record Liquor(String species, double start, double end) {}

    /** The lot's mean of a species, in its unit. */
    public record LotMean(String species, double value, Unit unit) {}

    /** One grade. */
    public record Piece(String name, List<Content> species) {}

    /**
     * The readings of one species in one grade, averaged by mass where its pieces differ.
     *
     * @param values by reading, in the unit
     * @param distribution by reading, what a {@link #SHARES share} of the pieces reads at most, in the unit; empty where all are alike
     * @param error bound on the numerical error of every reading, in the unit
     */
    public record Content(
            String species,
            Map<Reading, Double> values,
            Map<Reading, List<Double>> distribution,
            double error,
            Unit unit) {
        public Content {
            values = Collections.unmodifiableMap(new EnumMap<>(values));
            distribution = distribution.isEmpty() ? Map.of() : Collections.unmodifiableMap(new EnumMap<>(distribution));
        }

        public double value(Reading reading) {
            Double value = values.get(reading);
            if (value == null) {
                throw new IllegalArgumentException("not read: " + reading);
            }
            return value;
        }
    }
}
