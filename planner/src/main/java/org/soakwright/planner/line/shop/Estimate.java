package org.soakwright.planner.line.shop;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * What comes of times, from tangents at times followed exactly. Misses are nearly straight in the times, so a tangent nearby is good to parts in
 * a thousand; where none is near, the times are followed and become the next tangent. Nothing is decided on an estimate: what is handed over
 * has been followed.
 */
final class Estimate {
    /** How far a tangent is trusted: the change it foretells. */
    private static final double TRUSTED = 0.15;

    private static final int MOST_TANGENTS = 400;

    /** Most that a tangent is taken to be off: 0.05 % of a content. What is off by more shows when it is followed. */
    private static final double MOST_OFF = 5e-4;

    private final Physics physics;
    private final List<Tangent> tangents = new ArrayList<>();

    Estimate(Physics physics) {
        this.physics = physics;
    }

    private record Tangent(long[] at, Physics.Reading reading) {
        double change(long[] times) {
            double most = 0;
            for (double[] slopes : reading.slopes()) {
                double sum = 0;
                for (int i = 0; i < times.length; i++) {
                    sum += Math.abs(slopes[i] * (times[i] - at[i]));
                }
                most = Math.max(most, sum);
            }
            return most;
        }

        /** Misses are mostly convex, so a tangent flatters: by about half the square of the change. */
        double[] misses(long[] times) {
            double[] misses = reading.misses().clone();
            double change = change(times);
            double off = Math.min(MOST_OFF, change * change / 2);
            for (int r = 0; r < misses.length; r++) {
                misses[r] += off;
                for (int i = 0; i < times.length; i++) {
                    misses[r] += reading.slopes()[r][i] * (times[i] - at[i]);
                }
            }
            return misses;
        }
    }

    /** How far each requirement is missed, about. */
    double[] misses(long[] times) {
        return near(times).misses(times);
    }

    /** How each miss goes with each time, about, 1/s. */
    double[][] slopes(long[] times) {
        return near(times).reading().slopes();
    }

    /** Exactly. */
    Physics.Reading exactly(long[] times) {
        Physics.Reading reading = physics.read(times);
        if (tangents.size() < MOST_TANGENTS && nearest(times, 1e-6) == null) {
            tangents.add(new Tangent(times.clone(), reading));
        }
        return reading;
    }

    private Tangent near(long[] times) {
        Tangent nearest = nearest(times, TRUSTED);
        if (nearest != null) {
            return nearest;
        }
        Tangent tangent = new Tangent(times.clone(), physics.read(times));
        if (tangents.size() < MOST_TANGENTS) {
            tangents.add(tangent);
        }
        return tangent;
    }

    private @Nullable Tangent nearest(long[] times, double within) {
        Tangent nearest = null;
        double least = within;
        for (Tangent tangent : tangents) {
            double change = tangent.change(times);
            if (change < least) {
                least = change;
                nearest = tangent;
            }
        }
        return nearest;
    }
}
