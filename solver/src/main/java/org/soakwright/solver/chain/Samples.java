package org.soakwright.solver.chain;

import java.util.Arrays;
import org.soakwright.solver.stage.Modes;

/** The waves of one grade at given positions, by position and mode; found as far as they are asked for and kept for the next look. */
final class Samples {
    private final Modes modes;
    private final int grade;
    private final double[] positions;
    private final double[][] rows;
    private int known;

    Samples(Modes modes, int grade, double[] positions) {
        this.modes = modes;
        this.grade = grade;
        this.positions = positions.clone();
        rows = new double[positions.length][0];
    }

    boolean isAt(double[] others) {
        return Arrays.equals(positions, others);
    }

    /** Rows by position, holding at least so many modes. */
    double[][] of(int count) {
        if (count > known) {
            for (int i = 0; i < rows.length; i++) {
                rows[i] = Arrays.copyOf(rows[i], count);
                for (int n = known; n < count; n++) {
                    rows[i][n] = modes.at(grade, n, positions[i]);
                }
            }
            known = count;
        }
        return rows;
    }
}
