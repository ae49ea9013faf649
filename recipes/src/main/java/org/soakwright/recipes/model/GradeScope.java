package org.soakwright.recipes.model;

/** Which pieces a target looks at. */
public sealed interface GradeScope {
    /** Every grade meets it. */
    record Each() implements GradeScope {}

    /** The lot's mean by mass meets it. */
    record WholeLot() implements GradeScope {}

    /** One grade meets it. */
    record Named(Reference name) implements GradeScope {}
}
