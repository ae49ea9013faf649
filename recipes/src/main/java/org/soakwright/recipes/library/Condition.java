package org.soakwright.recipes.library;

import java.util.EnumSet;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Product;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Reading;

/** When a caution is due. */
public sealed interface Condition {
    boolean holds(Facts facts);

    /** The time that the first {@link Held} in it counts, s; empty where it has none. */
    default OptionalDouble held(Facts facts) {
        return OptionalDouble.empty();
    }

    /** Every part holds; of no parts it always does. */
    record All(List<Condition> parts) implements Condition {
        public All {
            parts = List.copyOf(parts);
        }

        @Override
        public boolean holds(Facts facts) {
            return parts.stream().allMatch(part -> part.holds(facts));
        }

        @Override
        public OptionalDouble held(Facts facts) {
            return first(parts, facts);
        }
    }

    /** One part holds, or more. */
    record Any(List<Condition> parts) implements Condition {
        public Any {
            parts = List.copyOf(parts);
        }

        @Override
        public boolean holds(Facts facts) {
            return parts.stream().anyMatch(part -> part.holds(facts));
        }

        @Override
        public OptionalDouble held(Facts facts) {
            return first(parts, facts);
        }
    }

    private static OptionalDouble first(List<Condition> parts, Facts facts) {
        return parts.stream()
                .map(part -> part.held(facts))
                .filter(OptionalDouble::isPresent)
                .findFirst()
                .orElse(OptionalDouble.empty());
    }

    /** The product is one of these. */
    record OfProduct(Set<Product> products) implements Condition {
        public OfProduct {
            products = Set.copyOf(products);
        }

        @Override
        public boolean holds(Facts facts) {
            return facts.products().stream().anyMatch(products::contains);
        }
    }

    /** A species is called one of these. */
    record OfSpecies(WordList words) implements Condition {
        @Override
        public boolean holds(Facts facts) {
            return words.inAny(facts.species());
        }
    }

    /** Something is called one of these: for what no number tells. */
    record Called(WordList words) implements Condition {
        @Override
        public boolean holds(Facts facts) {
            return words.inAny(facts.names());
        }
    }

    /** Which steps: of these kinds, and as warm as that. A step of unknown temperature is in no window but the open one. */
    record Steps(Set<StepKind> kinds, Window temperature) {
        public Steps {
            kinds = Set.copyOf(kinds.isEmpty() ? EnumSet.allOf(StepKind.class) : kinds);
        }

        Stream<Facts.Stay> in(Facts facts) {
            return facts.steps().stream()
                    .filter(step -> kinds.contains(step.kind()))
                    .filter(step -> temperature.isOpen()
                            || (step.kelvin().isPresent()
                                    && temperature.holds(step.kelvin().getAsDouble())));
        }
    }

    /**
     * There is one such step.
     *
     * @param longerThan that it lasts; null is any time
     */
    record OneStep(Steps steps, @Nullable Quantity longerThan) implements Condition {
        @Override
        public boolean holds(Facts facts) {
            return steps.in(facts).anyMatch(step -> longerThan == null || step.seconds() > longerThan.si());
        }
    }

    /**
     * All such steps together.
     *
     * @param longerThan that they last
     */
    record Held(Steps steps, Quantity longerThan) implements Condition {
        @Override
        public boolean holds(Facts facts) {
            return seconds(facts) > longerThan.si();
        }

        @Override
        public OptionalDouble held(Facts facts) {
            return OptionalDouble.of(seconds(facts));
        }

        private double seconds(Facts facts) {
            return steps.in(facts).mapToDouble(Facts.Stay::seconds).sum();
        }
    }

    /** A liquor holds so much of a species so called. */
    record InLiquor(WordList words, Window content) implements Condition {
        @Override
        public boolean holds(Facts facts) {
            return facts.species().stream()
                    .filter(words::in)
                    .map(facts::liquor)
                    .anyMatch(found -> found.isPresent() && content.holds(found.getAsDouble()));
        }
    }

    /** A liquor is so large. */
    record InVessel(Window volume) implements Condition {
        @Override
        public boolean holds(Facts facts) {
            return facts.vessel().isPresent() && volume.holds(facts.vessel().getAsDouble());
        }
    }

    /** Pieces of some grade end with so much of a species so called. */
    record InPiece(WordList words, Reading reading, Window content) implements Condition {
        @Override
        public boolean holds(Facts facts) {
            return facts.species().stream()
                    .filter(words::in)
                    .flatMap(species -> facts.piece(species, reading).stream())
                    .anyMatch(content::holds);
        }
    }

    /** Pieces of some grade end with so much of a species so called in their water. */
    record InWaterPhase(WordList words, Reading reading, Window share) implements Condition {
        @Override
        public boolean holds(Facts facts) {
            return facts.species().stream()
                    .filter(words::in)
                    .flatMap(species -> facts.waterPhase(species, reading).stream())
                    .anyMatch(share::holds);
        }
    }
}
