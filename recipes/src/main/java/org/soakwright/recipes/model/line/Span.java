package org.soakwright.recipes.model.line;

import java.time.Instant;

/** A time in which equally many people are there; {@code to} is the first instant after it. */
public record Span(Instant from, Instant to, int heads) {
    public Span {
        if (!from.isBefore(to) || heads < 0) {
            throw new IllegalArgumentException("a span has a length and zero heads or more: " + from + " " + to);
        }
    }
}
