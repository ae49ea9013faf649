package org.soakwright.solver.chain;

import java.util.List;
import org.soakwright.solver.shape.Side;

/**
 * The highest or lowest place in a piece of several sides. A grid, so much denser towards the surface that it sees what a liquor leaves
 * beneath an open face when it turns, finds the neighbourhood; windows of five
 * points a side, halved about their best, narrow it down until the place is known to 1e-8 of each side, where the value is flat. Cores and
 * faces, the usual places, are known at once: there the profile falls away on both or on the only side.
 */
final class Summit {
    private static final double PLACE = 1e-8;
    private static final int MOST_WINDOWS = 200;
    /** A window widens no further, to either side. */
    private static final double WIDEST = 0.1;

    private static final int GRID = 24;

    private static final double[] FROM_CORE = {0, 0.5, 0.8, 0.95, 0.99, 1};
    private static final double[] BETWEEN_FACES = {0, 0.005, 0.025, 0.1, 0.25, 0.5, 0.75, 0.9, 0.975, 0.995, 1};

    private Summit() {}

    /** Contents at all combinations of positions, the last side's running fastest. */
    interface Body {
        double[] grid(double[][] positions);
    }

    /** By side. */
    static double[] place(Body body, List<Side> shape, double sign) {
        int sides = shape.size();
        double[][] positions = new double[sides][];
        for (int s = 0; s < sides; s++) {
            positions[s] = shape.get(s).twoFaced() ? betweenFaces() : fromCore();
        }
        double[] best = new double[sides];
        double[] span = new double[sides];
        int[] at = best(body.grid(positions), positions, sign);
        for (int s = 0; s < sides; s++) {
            double[] side = positions[s];
            best[s] = side[at[s]];
            span[s] = Math.max(
                    at[s] > 0 ? side[at[s]] - side[at[s] - 1] : 0,
                    at[s] < side.length - 1 ? side[at[s] + 1] - side[at[s]] : 0);
        }
        if (settled(body, shape, best, sign)) {
            return best;
        }
        for (int i = 0; i < MOST_WINDOWS && widest(span) > PLACE; i++) {
            double[][] window = new double[sides][5];
            for (int s = 0; s < sides; s++) {
                for (int p = 0; p < 5; p++) {
                    // The middle first, so that it is kept where nothing is better.
                    double step = p == 0 ? 0 : 0.5 * (p < 3 ? p - 3 : p - 2);
                    window[s][p] = Math.min(1, Math.max(0, best[s] + step * span[s]));
                }
            }
            at = best(body.grid(window), window, sign);
            // As long as one side still moves outwards none is narrowed, and that one is widened again: a ridge may run
            // across them.
            boolean moved = false;
            boolean[] outwards = new boolean[sides];
            for (int s = 0; s < sides; s++) {
                outwards[s] = (at[s] == 1 || at[s] == 4) && window[s][at[s]] != best[s];
                moved |= outwards[s];
                best[s] = window[s][at[s]];
            }
            for (int s = 0; s < sides; s++) {
                span[s] = outwards[s] ? Math.min(WIDEST, 2 * span[s]) : moved ? span[s] : 0.5 * span[s];
            }
        }
        return best;
    }

    /**
     * Whether a place of cores and faces only is best close by: at a core, where the profile is even, by its curvature; at a face by its
     * slope. Both are looked at twice, at distances where neither rounding nor the next term decides.
     */
    private static boolean settled(Body body, List<Side> shape, double[] place, double sign) {
        double[][] near = new double[place.length][];
        for (int s = 0; s < place.length; s++) {
            if (place[s] == 0 && shape.get(s).twoFaced()) {
                near[s] = new double[] {0, 1e-4, 1e-3};
            } else if (place[s] == 0) {
                near[s] = new double[] {0, 0.01, 0.04};
            } else if (place[s] == 1) {
                near[s] = new double[] {1, 1 - 1e-4, 1 - 1e-3};
            } else {
                return false;
            }
        }
        double[] values = body.grid(near);
        double tip = sign * values[0];
        int stride = values.length;
        for (int s = 0; s < place.length; s++) {
            stride /= 3;
            double first = tip - sign * values[stride];
            double second = tip - sign * values[2 * stride];
            double expected = place[s] == 0 && !shape.get(s).twoFaced() ? 16 : 10;
            if (!(first > 0 && second > 0 && Math.abs(second / first / expected - 1) < 0.2)) {
                return false;
            }
        }
        return true;
    }

    /** A few positions a side, more of them where the profile is steep: what two profiles are compared at. */
    static double[][] looks(List<Side> shape) {
        return shape.stream()
                .map(side -> side.twoFaced() ? BETWEEN_FACES.clone() : FROM_CORE.clone())
                .toArray(double[][]::new);
    }

    private static double[] fromCore() {
        double[] side = new double[GRID + 1];
        for (int i = 0; i <= GRID; i++) {
            double fromSurface = (double) (GRID - i) / GRID;
            side[i] = 1 - fromSurface * fromSurface * fromSurface;
        }
        return side;
    }

    /** Each half as from the core. */
    private static double[] betweenFaces() {
        double[] half = fromCore();
        double[] side = new double[2 * GRID + 1];
        for (int i = 0; i <= GRID; i++) {
            side[GRID + i] = 0.5 + 0.5 * half[i];
            side[GRID - i] = 0.5 - 0.5 * half[i];
        }
        return side;
    }

    private static double widest(double[] spans) {
        double widest = 0;
        for (double span : spans) {
            widest = Math.max(widest, span);
        }
        return widest;
    }

    private static int[] best(double[] values, double[][] positions, double sign) {
        int found = 0;
        for (int i = 1; i < values.length; i++) {
            if (sign * values[i] > sign * values[found]) {
                found = i;
            }
        }
        int[] at = new int[positions.length];
        for (int s = positions.length - 1; s >= 0; s--) {
            at[s] = found % positions[s].length;
            found /= positions[s].length;
        }
        return at;
    }
}
