package org.soakwright.solver.transport;

/** An iteration met numbers it cannot trust or did not come to rest; no value is returned in its place. */
public final class NotSettled extends ArithmeticException {
    private static final long serialVersionUID = 1;

    NotSettled(String what, int evaluations, double last, String unit) {
        super(what + " did not settle within " + evaluations + " evaluations; last " + Figure.shown(last, unit));
    }
}
