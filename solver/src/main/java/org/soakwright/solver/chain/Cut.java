package org.soakwright.solver.chain;

import java.util.List;
import org.soakwright.solver.shape.Side;

/** A cut through the core of a piece along two of its sides. */
final class Cut {
    private Cut() {}

    /** The core's position on each side. */
    static double[][] throughCore(List<Side> shape) {
        return shape.stream().map(side -> new double[] {side.core()}).toArray(double[][]::new);
    }

    /** By position down, then across. */
    static double[][] of(Summit.Body body, List<Side> shape, int first, int second, double[] across, double[] down) {
        int sides = shape.size();
        if (first == second || first < 0 || second < 0 || first >= sides || second >= sides) {
            throw new IllegalArgumentException(
                    "a cut runs along two of " + sides + " sides, found " + first + " and " + second);
        }
        double[][] positions = throughCore(shape);
        positions[first] = across;
        positions[second] = down;
        double[] values = body.grid(positions);
        double[][] cut = new double[down.length][across.length];
        for (int d = 0; d < down.length; d++) {
            for (int a = 0; a < across.length; a++) {
                cut[d][a] = first < second ? values[a * down.length + d] : values[d * across.length + a];
            }
        }
        return cut;
    }
}
