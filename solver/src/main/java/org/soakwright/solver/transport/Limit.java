package org.soakwright.solver.transport;

/** Between which values of a group a correlation holds. */
record Limit(Group group, double low, double high) {
    static Limit atLeast(Group group, double low) {
        return new Limit(group, low, Double.POSITIVE_INFINITY);
    }

    static Limit atMost(Group group, double high) {
        return new Limit(group, Double.NEGATIVE_INFINITY, high);
    }

    Range of(String source) {
        return new Range(group.title, low, high, group.unit, source);
    }
}
