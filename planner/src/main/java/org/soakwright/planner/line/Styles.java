package org.soakwright.planner.line;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.soakwright.planner.line.shop.Phase;

/**
 * Ways to share the work among the legs: the planned one first, then each leg that can be longer made long and short in turn. They are directions:
 * how far to go in each is worked out as the lot is placed.
 */
final class Styles {
    private static final double LONG = 2.2;
    private static final double SHORT = 0.35;

    /** Styles that hardly differ are one. */
    private static final double ALIKE = 0.02;

    private Styles() {}

    /**
     * The styles of a route.
     *
     * @param planned durations of its legs when the recipe is planned alone, s
     */
    static List<long[]> of(List<Phase> phases, double[] planned) {
        double[] beyond = new double[planned.length];
        double all = 0;
        int free = 0;
        for (int k = 0; k < planned.length; k++) {
            beyond[k] = Math.max(0, planned[k] - phases.get(k).shortest());
            all += beyond[k];
            free += phases.get(k).longest() > phases.get(k).shortest() && beyond[k] > 0 ? 1 : 0;
        }
        List<long[]> styles = new ArrayList<>();
        add(styles, phases, planned);
        if (free < 2) {
            return styles;
        }
        double usual = all / free;
        for (int k = 0; k < planned.length; k++) {
            if (beyond[k] > 0) {
                for (double factor : new double[] {LONG, SHORT}) {
                    double[] other = planned.clone();
                    other[k] = phases.get(k).shortest() + factor * Math.max(beyond[k], 0.3 * usual);
                    add(styles, phases, other);
                }
            }
        }
        return styles;
    }

    private static void add(List<long[]> styles, List<Phase> phases, double[] durations) {
        long[] style = new long[durations.length];
        for (int k = 0; k < style.length; k++) {
            style[k] = phases.get(k).atLeast(durations[k]);
        }
        if (styles.stream().noneMatch(other -> alike(other, style))) {
            styles.add(style);
        }
    }

    private static boolean alike(long[] one, long[] other) {
        double sum = Arrays.stream(one).sum();
        double difference = 0;
        for (int k = 0; k < one.length; k++) {
            difference += Math.abs(one[k] - other[k]);
        }
        return difference <= ALIKE * sum;
    }
}
