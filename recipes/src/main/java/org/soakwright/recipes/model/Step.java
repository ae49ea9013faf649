package org.soakwright.recipes.model;

import java.util.function.UnaryOperator;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Place;

/** One stage of the chain as written. */
public sealed interface Step permits Step.Wet, Step.Rest, Step.Dry {
    StepHead head();

    /** soak, rinse, rest or dry. */
    String kind();

    /** The same step with another head. */
    Step with(StepHead head);

    /** With its quantities changed; its times stay. */
    Step each(UnaryOperator<Quantity> change);

    default Place place() {
        return head().place();
    }

    default String name() {
        return head().name();
    }

    default Time time() {
        return head().time();
    }

    default @Nullable Quantity temperature() {
        return head().temperature();
    }

    /** How many fills of liquor follow each other, each an equal part of the time; 1 where there are none to tell apart. */
    default int fills() {
        return 1;
    }

    /** What lies between two of its fills; nothing where it has but one. */
    default Gap gapBetweenFills() {
        Changeover changeover = head().handling().changeover();
        return fills() == 1 || changeover == null ? new Gap.None() : new Gap.Refilling(changeover);
    }

    /** A step in liquor. */
    sealed interface Wet extends Step permits Soak, Rinse {
        Liquor liquor();

        Film film();

        /** Liquor clinging to the pieces when they leave, m3 per kg of lot as loaded; null is none. */
        @Nullable
        Quantity dragOut();

        /** The same step with another liquor. */
        Wet with(Liquor liquor);

        /** The same step with another film. */
        Wet with(Film film);
    }

    /** In one liquor for the whole time. */
    record Soak(
            StepHead head,
            Liquor liquor,
            Film film,
            @Nullable Quantity dragOut) implements Wet {
        public Soak {
            Rules.notNegative("drag-out", dragOut);
        }

        @Override
        public String kind() {
            return "soak";
        }

        @Override
        public Soak with(StepHead other) {
            return new Soak(other, liquor, film, dragOut);
        }

        @Override
        public Soak with(Liquor other) {
            return new Soak(head, other, film, dragOut);
        }

        @Override
        public Soak with(Film other) {
            return new Soak(head, liquor, other, dragOut);
        }

        @Override
        public Soak each(UnaryOperator<Quantity> change) {
            return new Soak(head.each(change), liquor.each(change), film.each(change), Quantity.each(dragOut, change));
        }
    }

    /** In liquor that is renewed: by flow, by fills, or without limit. */
    record Rinse(
            StepHead head,
            Liquor liquor,
            Renewal renewal,
            Film film,
            @Nullable Quantity dragOut) implements Wet {
        public Rinse {
            Rules.notNegative("drag-out", dragOut);
            StepRules.renewed(head, liquor, renewal);
        }

        @Override
        public String kind() {
            return "rinse";
        }

        @Override
        public Rinse with(StepHead other) {
            return new Rinse(other, liquor, renewal, film, dragOut);
        }

        @Override
        public Rinse with(Liquor other) {
            return new Rinse(head, other, renewal, film, dragOut);
        }

        @Override
        public Rinse with(Film other) {
            return new Rinse(head, liquor, renewal, other, dragOut);
        }

        @Override
        public int fills() {
            return renewal instanceof Renewal.Fills several ? several.count() : 1;
        }

        public Rinse with(Renewal other) {
            return new Rinse(head, liquor, other, film, dragOut);
        }

        @Override
        public Rinse each(UnaryOperator<Quantity> change) {
            return new Rinse(
                    head.each(change),
                    liquor.each(change),
                    renewal.each(change),
                    film.each(change),
                    Quantity.each(dragOut, change));
        }
    }

    /** In nothing: no species leaves or enters, the profile evens out. */
    record Rest(StepHead head) implements Step {
        @Override
        public String kind() {
            return "rest";
        }

        @Override
        public Rest with(StepHead other) {
            return new Rest(other);
        }

        @Override
        public Rest each(UnaryOperator<Quantity> change) {
            return new Rest(head.each(change));
        }
    }

    /** In air: only species that exchange with air move, towards the equilibrium content. */
    record Dry(StepHead head, Air air, Film film) implements Step {
        @Override
        public String kind() {
            return "dry";
        }

        @Override
        public Dry with(StepHead other) {
            return new Dry(other, air, film);
        }

        @Override
        public Dry each(UnaryOperator<Quantity> change) {
            return new Dry(head.each(change), air.each(change), film.each(change));
        }
    }
}
