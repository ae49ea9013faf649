package org.soakwright.recipes.model;

/** The resistance between the piece and what is around it. */
public sealed interface Film {
    /** None worth counting. */
    record Negligible() implements Film {}

    /** A mass transfer coefficient, m/s, above zero; in drying referred to the content of the piece. */
    record Coefficient(Quantity value) implements Film {
        public Coefficient {
            Rules.positive("a film coefficient", value);
        }
    }
}
