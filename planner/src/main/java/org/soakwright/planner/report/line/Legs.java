package org.soakwright.planner.report.line;

import org.soakwright.planner.line.Leg;
import org.soakwright.planner.line.LoadPlan;

/** Legs in words. */
final class Legs {
    private Legs() {}

    /** {@code second water}, {@code washing, fill 2 of 3}. */
    static String name(LoadPlan.LegPlan leg) {
        Leg own = leg.leg();
        return own.fills() == 1 ? leg.name() : leg.name() + ", fill " + (own.fill() + 1) + " of " + own.fills();
    }
}
