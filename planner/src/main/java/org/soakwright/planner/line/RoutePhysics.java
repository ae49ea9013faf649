package org.soakwright.planner.line;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import org.soakwright.planner.batch.Batch;
import org.soakwright.planner.batch.LeastTime;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.line.shop.Physics;

/** What goes on in the pieces of a route, followed exactly; what was followed once is remembered. */
final class RoutePhysics implements Physics {
    private static final int MOST_REMEMBERED = 20_000;

    private final Route route;
    private final Batch batch;
    private final List<long[]> styles;
    private final Map<Times, Reading> known = new LinkedHashMap<>();
    private @Nullable List<Cut> certain;

    /**
     * A route's physics.
     *
     * @param batch of {@link Route#run()}
     * @param styles durations of the legs to begin with
     */
    RoutePhysics(Route route, Batch batch, List<long[]> styles) {
        this.route = route;
        this.batch = batch;
        this.styles = List.copyOf(styles);
    }

    /** An array that can be looked up. */
    private record Times(long[] values) {
        @Override
        public boolean equals(Object other) {
            return other instanceof Times times && Arrays.equals(values, times.values);
        }

        /** Times are mostly whole minutes, of which the usual sum with powers of 31 makes the same number over and over. */
        @Override
        public int hashCode() {
            long hash = values.length;
            for (long value : values) {
                hash = (hash ^ value) * 0x9E3779B97F4A7C15L;
                hash ^= hash >>> 32;
            }
            return (int) hash;
        }
    }

    @Override
    public Reading read(long[] times) {
        Times key = new Times(times.clone());
        Reading reading = known.get(key);
        if (reading == null) {
            Run.Misses misses = follow(times).misses();
            List<double[]> slopes = new ArrayList<>();
            for (double[] bySteps : misses.slopes()) {
                slopes.add(route.byTimes(bySteps));
            }
            reading = new Reading(misses.values(), slopes.toArray(double[][]::new));
            if (known.size() < MOST_REMEMBERED) {
                known.put(key, reading);
            }
        }
        return reading;
    }

    @Override
    public List<long[]> styles() {
        return styles;
    }

    @Override
    public List<Cut> certain() {
        if (certain == null) {
            certain = LeastTime.of(route.run()).stream()
                    .map(bound -> new Cut(route.byTimes(bound.weights()), bound.seconds()))
                    .toList();
        }
        return certain;
    }

    Run follow(long[] times) {
        return batch.follow(route.seconds(times));
    }
}
