package org.soakwright.planner.line.shop;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;

/**
 * What comes of times, from tangents at times followed exactly. Misses are nearly straight in the times, so a tangent nearby is good to parts in
 * a thousand; where none is near, the times are followed and become the next tangent. Nothing is decided on an estimate: what is handed over
 * has been followed.
 */
final class Estimate {
    /** How far a tangent is trusted: the change it foretells. */
    private static final double TRUSTED = 0.15;

    /** A tangent so near is not worth looking further. */
    private static final double NEAR = 0.03;

    private static final int MOST_TANGENTS = 300;

    /** How much nearer a tangent had to be to be worth looking at one more of them. */
    private static final double WORTH = 1e-3;

    /** A tangent no further away is at the same times. */
    private static final double SAME = 1e-6;

    /** Most that a tangent is taken to be off: 0.05 % of a content. What is off by more shows when it is followed. */
    private static final double MOST_OFF = 5e-4;

    private final Physics physics;
    private final List<Tangent> tangents = new ArrayList<>();
    /** Of every tangent its times and how steep it is in each, one after the other: all of them are looked through again and again. */
    private double[] near = new double[0];

    private int last;
    private boolean rising;

    Estimate(Physics physics) {
        this.physics = physics;
    }

    /** At times that were followed. */
    static final class Tangent {
        private final long[] at;
        private final Physics.Reading reading;
        /** The steepest of all misses by each time. */
        private final double[] steepest;

        Tangent(long[] at, Physics.Reading reading) {
            this.at = at.clone();
            this.reading = reading;
            steepest = new double[at.length];
            for (double[] slopes : reading.slopes()) {
                for (int i = 0; i < steepest.length; i++) {
                    steepest[i] = Math.max(steepest[i], Math.abs(slopes[i]));
                }
            }
        }

        int size() {
            return reading.misses().length;
        }

        /** By each time, 1/s. */
        double[] slopes(int requirement) {
            return reading.slopes()[requirement];
        }

        /** Misses are mostly convex, so a tangent flatters: by about half the square of the change. */
        double miss(int requirement, long[] times) {
            double miss = reading.misses()[requirement];
            double change = 0;
            double[] slopes = reading.slopes()[requirement];
            for (int i = 0; i < times.length; i++) {
                double step = slopes[i] * (times[i] - at[i]);
                miss += step;
                change += Math.abs(step);
            }
            return miss + Math.min(MOST_OFF, change * change / 2);
        }
    }

    /** Whether more time has ever been seen to harm. */
    boolean rises() {
        return rising;
    }

    /** How many tangents there are: what was worked out holds until there are more. */
    int tangents() {
        return tangents.size();
    }

    /** What change a tangent foretells, at most; beyond a limit no more than that it is beyond. */
    private double change(int tangent, long[] times, double limit) {
        double sum = 0;
        int base = 2 * times.length * tangent;
        for (int i = 0; i < times.length && sum < limit; i++) {
            sum += near[base + 2 * i + 1] * Math.abs(times[i] - near[base + 2 * i]);
        }
        return sum;
    }

    private void add(Tangent tangent) {
        // Where nothing is asked there is nothing to remember, and jobs of any length may share it.
        if (tangent.size() > 0 && tangents.size() < MOST_TANGENTS) {
            last = tangents.size();
            tangents.add(tangent);
            int length = tangent.at.length;
            int base = 2 * length * last;
            if (base + 2 * length > near.length) {
                near = Arrays.copyOf(near, 2 * (base + 2 * length));
            }
            for (int i = 0; i < length; i++) {
                near[base + 2 * i] = tangent.at[i];
                near[base + 2 * i + 1] = tangent.steepest[i];
            }
        }
        for (int r = 0; r < tangent.size() && !rising; r++) {
            for (int i = 0; i < tangent.at.length; i += 2) {
                rising |= tangent.slopes(r)[i] > 0;
            }
        }
    }

    /** Exactly. */
    Physics.Reading exactly(long[] times) {
        Physics.Reading reading = physics.read(times);
        if (tangents.size() < MOST_TANGENTS) {
            for (int i = 0; i < tangents.size(); i++) {
                if (change(i, times, SAME) < SAME) {
                    return reading;
                }
            }
            add(new Tangent(times, reading));
        }
        return reading;
    }

    /** Where it is known exactly, those nearest to just meeting everything first. */
    List<Followed> followed() {
        return tangents.stream()
                .sorted(Comparator.comparingDouble(tangent -> Math.abs(tangent.reading.worst())))
                .map(tangent -> new Followed(tangent.at.clone(), tangent.reading))
                .toList();
    }

    /** A tangent near some times. */
    Tangent near(long[] times) {
        int count = tangents.isEmpty() ? -1 : tangents.size();
        double least = TRUSTED;
        int nearest = -1;
        for (int n = 0; n <= count && (nearest < 0 || n * WORTH < least - NEAR); n++) {
            // The one that served last serves again most often, and those made lately before older ones.
            int i = n == 0 ? last : count - n;
            double change = change(i, times, least);
            if (change < least) {
                least = change;
                nearest = i;
            }
        }
        if (nearest >= 0) {
            last = nearest;
            return tangents.get(nearest);
        }
        Tangent tangent = new Tangent(times, physics.read(times));
        add(tangent);
        return tangent;
    }
}
