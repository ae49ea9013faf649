package org.soakwright.planner.line;

import org.soakwright.planner.line.shop.Moments;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.Time;

/**
 * How long a leg may last: one of the durations that its step offers, and longer where it has to be held: without end, or for as long as
 * {@code hold-at-most} says. Of a step in fills, each may last and be held its part.
 */
final class Lasting {
    private Lasting() {}

    /**
     * The durations of a leg.
     *
     * @param planned where nothing shorter is to be chosen, s; 0 for any
     */
    static Moments of(Step step, double planned) {
        Time time = step.time();
        int fills = step.fills();
        Quantity hold = step.head().handling().holdAtMost();
        long shortest = whole(Math.max(time.seconds(0) / fills, planned));
        if (hold == null) {
            return Moments.of(shortest, Moments.NEVER);
        }
        long held = (long) Math.floor(hold.si() / fills + 1e-6);
        Moments all = held(time, fills, held);
        Moments left = all.within(shortest, Moments.NEVER);
        return left.isEmpty() ? Moments.of(all.last(), all.last()) : left;
    }

    private static Moments held(Time time, int fills, long held) {
        long longest = whole(time.seconds(time.choices() - 1) / fills);
        if (time instanceof Time.Between between && held + 1 >= between.grain().si() / fills) {
            return Moments.of(whole(time.seconds(0) / fills), longest + held);
        }
        Moments.Builder all = new Moments.Builder(time.choices());
        for (int c = 0; c < time.choices(); c++) {
            long choice = whole(time.seconds(c) / fills);
            all.add(choice, choice + held);
        }
        return all.built();
    }

    private static long whole(double seconds) {
        return (long) Math.ceil(seconds - 1e-6);
    }
}
