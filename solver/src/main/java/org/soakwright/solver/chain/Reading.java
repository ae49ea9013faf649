package org.soakwright.solver.chain;

/**
 * A value read from a chain.
 *
 * @param value kg/m3
 * @param error bound on the numerical error of value, kg/m3: modes left out, rounding and departure of the modes from
 *     orthogonality, carried through all stages so far
 * @param modes modes evaluated over all stages so far
 * @param method how the value was reached
 */
public record Reading(double value, double error, int modes, Method method) {
    /** Representations of the profile. */
    public enum Method {
        /** Superposed modes, projected exactly from stage to stage. */
        MODES,
        /** Sums of products of one-axis solutions, one for each new surrounding. */
        PRODUCTS,
        /** Products of polynomial modes of the sides, with the liquor by an inverse Laplace transform. */
        POLYNOMIALS
    }
}
