package org.soakwright.planner.report.line;

import java.util.Locale;
import java.util.Optional;
import org.soakwright.planner.line.LoadPlan;
import org.soakwright.planner.line.shop.Placed;

/**
 * Something people do.
 *
 * @param into the leg that it leads to; empty for unloading
 * @param from a vessel; empty where it comes from outside
 * @param to a vessel; empty where it goes outside
 * @param heads how many people
 * @param free how many more are there all the while with nothing else to do
 * @param lifts how many are on the move at once at most while it lasts, itself included where it needs the hoist
 * @param stage as many moves of the load are before it
 */
record Move(
        Placed.Task.Kind kind,
        LoadPlan load,
        Optional<LoadPlan.LegPlan> into,
        Optional<String> from,
        Optional<String> to,
        long start,
        long end,
        long heads,
        long free,
        long lifts,
        boolean hoist,
        int stage) {
    /** {@code load}, {@code transfer}, {@code changeover}, {@code unload}. */
    String word() {
        return kind == Placed.Task.Kind.CHANGE ? "changeover" : kind.name().toLowerCase(Locale.ROOT);
    }

    String loadName() {
        return load.load().name();
    }

    /** {@code second water}, {@code washing, fill 2 of 3}. */
    String step() {
        return into.map(Legs::name).orElse("");
    }

    /** {@code Lift L1 from tank 1 into tank 2}. */
    String sentence() {
        return switch (kind) {
            case LOAD -> "Load " + loadName() + " into " + to.orElse("");
            case TRANSFER -> "Lift " + loadName() + " from " + from.orElse("") + " into " + to.orElse("");
            case CHANGE -> "Change the liquor of " + loadName() + " in " + to.orElse("");
            case UNLOAD -> "Take " + loadName() + " out of " + from.orElse("");
        };
    }
}
