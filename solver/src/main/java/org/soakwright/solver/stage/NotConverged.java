package org.soakwright.solver.stage;

/** A root search met numbers it cannot trust; no value is returned in its place. */
public final class NotConverged extends ArithmeticException {
    private static final long serialVersionUID = 1;

    NotConverged(String what, double low, double high) {
        super(what + " did not converge between " + low + " and " + high);
    }
}
