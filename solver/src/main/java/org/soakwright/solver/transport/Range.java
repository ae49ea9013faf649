package org.soakwright.solver.transport;

import java.util.List;

/** Between which values of one quantity a source holds. */
record Range(String what, double low, double high, String unit, String source) {
    void refuse(double value) {
        if (!(value >= low && value <= high)) {
            throw new OutOfRange(this, value);
        }
    }

    void note(double value, List<Caution> cautions) {
        if (!(value >= low && value <= high)) {
            cautions.add(new Caution.Outside(what, value, low, high, unit, source));
        }
    }
}
