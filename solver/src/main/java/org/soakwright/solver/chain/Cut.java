package org.soakwright.solver.chain;

/** A cut through the core of a piece along two of its sides. */
final class Cut {
    private Cut() {}

    /** By position down, then across. */
    static double[][] of(Summit.Body body, int sides, int first, int second, double[] across, double[] down) {
        if (first == second || first < 0 || second < 0 || first >= sides || second >= sides) {
            throw new IllegalArgumentException(
                    "a cut runs along two of " + sides + " sides, found " + first + " and " + second);
        }
        double[][] positions = new double[sides][1];
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
