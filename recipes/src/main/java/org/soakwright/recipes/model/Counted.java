package org.soakwright.recipes.model;

/** What the content that a target on pieces limits is counted against. */
public sealed interface Counted {
    /** As loaded, the default. */
    Counted AS_LOADED = new OfPiece(Per.LOADED);

    /** The mass of the piece; a content by volume is of the piece as loaded. */
    record OfPiece(Per per) implements Counted {}

    /** The water in the piece. */
    record InPhase(Phase phase) implements Counted {}
}
