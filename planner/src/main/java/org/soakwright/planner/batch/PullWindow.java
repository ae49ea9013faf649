package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.DoublePredicate;
import org.soakwright.recipes.model.Time;
import org.soakwright.recipes.text.Unsound;

/**
 * How much earlier or later a step may end, later steps lasting as long as planned, before a target is missed.
 *
 * @param step from 0
 * @param earliest shortest duration, s, to the minute above; the least one looked at where none is too short
 * @param latest longest duration, s, to the minute below, of a free step no longer than the recipe offers; empty where a fixed step may
 *     last {@link #STRETCH} times its time
 * @param open whether no longer duration that was looked at misses a target
 */
public record PullWindow(int step, double earliest, OptionalDouble latest, boolean open) {
    /** How many times its planned duration a step is followed for. */
    static final double STRETCH = 3;

    private static final double SHORTEST = 0.05;
    private static final double MINUTE = 60;
    private static final int LOOKS = 40;

    /** One window for each step; none where the run misses a target as it is. */
    public static List<PullWindow> of(Run run) {
        List<PullWindow> windows = new ArrayList<>();
        if (!run.meetsTargets()) {
            return windows;
        }
        double[] planned = run.seconds();
        for (int i = 0; i < planned.length; i++) {
            int step = i;
            DoublePredicate meets = seconds -> meets(run, step, seconds);
            double at = planned[i];
            Time time = run.batch().recipe().steps().get(i).time();
            boolean free = time.isFree();
            double shortest = free ? time.seconds(0) : Math.max(MINUTE, SHORTEST * at);
            double longest = free ? Math.max(at, time.seconds(time.choices() - 1)) : STRETCH * at;
            double early = at <= shortest ? at : edge(meets, at, shortest);
            double late = at >= longest ? at : edge(meets, at, longest);
            double earliest = Math.min(at, MINUTE * Math.ceil(early / MINUTE - 1e-9));
            double latest = Math.max(at, MINUTE * Math.floor(late / MINUTE + 1e-9));
            windows.add(new PullWindow(
                    i,
                    earliest,
                    !free && late >= longest ? OptionalDouble.empty() : OptionalDouble.of(latest),
                    late >= longest));
        }
        return List.copyOf(windows);
    }

    private static boolean meets(Run run, int step, double seconds) {
        double[] changed = run.seconds();
        changed[step] = seconds;
        try {
            return run.batch().follow(changed).meetsTargets();
        } catch (Unsound tooShort) {
            return false;
        }
    }

    /** Going from a duration that meets the targets towards another, the last that still does before the first that does not. */
    private static double edge(DoublePredicate meets, double from, double to) {
        double good = from;
        for (int i = 1; i <= LOOKS; i++) {
            double next = from + (to - from) * i / LOOKS;
            if (!meets.test(next)) {
                double bad = next;
                while (Math.abs(bad - good) > 1) {
                    double middle = 0.5 * (good + bad);
                    if (meets.test(middle)) {
                        good = middle;
                    } else {
                        bad = middle;
                    }
                }
                return good;
            }
            good = next;
        }
        return to;
    }
}
