package org.soakwright.recipes.model;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/** How long a step takes: stated, or for the planner to choose from a finite list of durations. */
public sealed interface Time {
    /** The most durations a step may offer the planner. */
    int MOST_CHOICES = 1_000_000;

    Place place();

    /** The duration to follow: the fixed or the planned one, if there is one. */
    Optional<Quantity> definite();

    /** How many durations there are to choose from. */
    int choices();

    /** The duration of a choice in seconds, choices counting from 0 and rising with it. */
    double seconds(int choice);

    default boolean isFree() {
        return !(this instanceof Fixed);
    }

    /** One duration, above zero and up to 36525 d, as every time here. */
    record Fixed(Quantity duration) implements Time {
        public Fixed {
            Rules.require(Rules.ifNoTime("a time", duration));
        }

        @Override
        public Place place() {
            return duration.place();
        }

        @Override
        public Optional<Quantity> definite() {
            return Optional.of(duration);
        }

        @Override
        public int choices() {
            return 1;
        }

        @Override
        public double seconds(int choice) {
            return duration.si();
        }
    }

    /** From one duration in steps of the grain, up to the last step that does not pass the other. */
    record Between(
            Place place,
            Quantity from,
            Quantity to,
            Quantity grain,
            @Nullable Quantity planned) implements Time {
        public Between {
            Rules.requireAll(List.of(
                    Rules.ifNoTime("`from`", from),
                    Rules.ifNoTime("`to`", to),
                    Rules.ifNoTime("`grain`", grain),
                    Rules.ifNoTime("`planned`", planned)));
            if (!(from.si() < to.si())) {
                throw new Unsound(
                        to.place(), "`to` must be longer than `from`: found \"" + to + "\" after \"" + from + "\"");
            }
            if (grain.si() > to.si() - from.si()) {
                throw new Unsound(
                        grain.place(),
                        "the grain is longer than the range: found \"" + grain + "\" for " + from + " to " + to
                                + "; write a shorter grain or a wider range");
            }
            if (steps(from, to, grain).compareTo(BigDecimal.valueOf(MOST_CHOICES - 1)) > 0) {
                throw new Unsound(
                        grain.place(),
                        "the grain is too fine: found \"" + grain + "\", more than 1 000 000 durations; write a longer"
                                + " grain");
            }
            if (planned != null && (planned.si() < from.si() || planned.si() > to.si())) {
                throw new Unsound(
                        planned.place(),
                        "`planned` lies outside the range: found \"" + planned + "\"; write one from " + from + " to "
                                + to);
            }
        }

        private static BigDecimal steps(Quantity from, Quantity to, Quantity grain) {
            return seconds(to).subtract(seconds(from)).divide(seconds(grain), 0, RoundingMode.FLOOR);
        }

        /** Exact: every unit of time is a whole number of seconds. */
        private static BigDecimal seconds(Quantity duration) {
            return duration.value().multiply(duration.unit().numerator());
        }

        @Override
        public Optional<Quantity> definite() {
            return Optional.ofNullable(planned);
        }

        @Override
        public int choices() {
            return steps(from, to, grain).intValueExact() + 1;
        }

        @Override
        public double seconds(int choice) {
            return from.si() + choice * grain.si();
        }
    }

    /** One of several durations, rising. */
    record AnyOf(
            Place place, List<Quantity> durations, @Nullable Quantity planned) implements Time {
        public AnyOf {
            if (durations.isEmpty()) {
                throw new Unsound(place, "`any-of` offers nothing; write one or more times such as [6 h, 9 h]");
            }
            Rules.requireAll(durations.stream()
                    .map(duration -> Rules.ifNoTime("a time", duration))
                    .toList());
            durations = durations.stream()
                    .sorted(Comparator.comparingDouble(Quantity::si))
                    .toList();
            for (int i = 1; i < durations.size(); i++) {
                if (durations.get(i).si() == durations.get(i - 1).si()) {
                    throw new Unsound(
                            durations.get(i).place(),
                            "`any-of` offers one time twice: found \"" + durations.get(i) + "\" and \""
                                    + durations.get(i - 1) + "\"; remove one");
                }
            }
            if (planned != null && durations.stream().noneMatch(duration -> duration.si() == planned.si())) {
                throw new Unsound(
                        planned.place(), "`planned` is not one of the times offered: found \"" + planned + "\"");
            }
        }

        @Override
        public Optional<Quantity> definite() {
            return Optional.ofNullable(planned);
        }

        @Override
        public int choices() {
            return durations.size();
        }

        @Override
        public double seconds(int choice) {
            return durations.get(choice).si();
        }
    }
}
