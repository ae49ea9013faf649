package org.soakwright.planner.batch.doubt;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.junit.jupiter.api.Test;

class PercentileTest {
    private static final NormalDistribution NORMAL = new NormalDistribution();

    @Test
    void aPercentileOfALognormalIsItsClosedForm() {
        Draws draws = new Draws(3, 20, 512);
        double[] values = new double[draws.size()];
        for (int i = 0; i < values.length; i++) {
            double[] z = draws.normals(i);
            values[i] = Math.exp(0.3 * z[0] - 0.2 * z[1] + 0.1 * z[2]);
        }
        for (double level : new double[] {0.05, 0.5, 0.9, 0.99}) {
            double exact = Math.exp(Math.sqrt(0.14) * NORMAL.inverseCumulativeProbability(level));
            Percentile found = Percentile.of(values, 20, level);
            assertTrue(Math.abs(found.value() - exact) < 4 * found.error(), level + " " + found + " for " + exact);
            assertTrue(found.error() < 0.02 * exact);
        }
    }

    @Test
    void theWorstCountsWhereItLies() {
        double[] values = {1, 2, 3, 4, 5, 6, 7, 8, 9, Double.POSITIVE_INFINITY};
        assertEquals(5.5, Percentile.of(values, 1, 0.5).value());
        assertEquals(Double.POSITIVE_INFINITY, Percentile.of(values, 1, 0.95).value());
    }

    /** But for what the curve bends over the ranks it takes in. */
    @Test
    void aSmoothPercentileIsThePercentileOfWhatItKnows() {
        double[] values = new double[256];
        for (int i = 0; i < values.length; i++) {
            values[i] = NORMAL.inverseCumulativeProbability((i + 0.5) / 256);
        }
        assertEquals(1.2816, new SmoothPercentile(256, 0.9).of(values), 0.01);
        assertEquals(0, new SmoothPercentile(256, 0.5).of(values), 1e-12);
    }

    /** Where samples change places nothing jumps, and the weights are the derivatives. */
    @Test
    void weightsAreDerivatives() {
        SmoothPercentile percentile = new SmoothPercentile(64, 0.8);
        double[] at = new double[64];
        double[] slope = new double[64];
        for (int i = 0; i < at.length; i++) {
            at[i] = Math.sin(7.0 * i);
            slope[i] = Math.cos(3.0 * i);
        }
        double h = 1e-7;
        double[] weights = percentile.weights(at);
        double expected = 0;
        double[] moved = at.clone();
        for (int i = 0; i < at.length; i++) {
            expected += weights[i] * slope[i];
            moved[i] += h * slope[i];
        }
        assertEquals(expected, (percentile.of(moved) - percentile.of(at)) / h, 1e-6);
        assertEquals(1, Arrays.stream(weights).sum(), 1e-12);
    }
}
