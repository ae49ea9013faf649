package org.soakwright.planner.batch;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

class LeastDistanceTest {
    /**
     * C. L. Lawson and R. J. Hanson, Solving Least Squares Problems (1974), chapter 23, section 7, the example of a line fitted under
     * constraints, after its change of variables (from memory): the answer (0.127, -0.255) is printed to three places.
     */
    @Test
    void theTextbookExampleComesOut() {
        double[][] rows = {{-0.207, 2.558}, {-0.392, -1.351}, {0.599, -1.206}};
        double[] limits = {-1.3, -0.084, 0.384};
        LeastDistance solved = LeastDistance.of(rows, limits, 2);
        assertTrue(solved.feasible);
        assertArrayEquals(new double[] {0.127, -0.255}, solved.point, 1e-3);
    }

    @Test
    void theOriginIsItsOwnNearestPointWhenAllowed() {
        LeastDistance solved = LeastDistance.of(new double[][] {{1, 0}, {0, 1}}, new double[] {-1, -2}, 2);
        assertArrayEquals(new double[] {0, 0}, solved.point);
    }

    @Test
    void contradictionsAreSeen() {
        assertFalse(LeastDistance.of(new double[][] {{1, 0}, {-1, 0}}, new double[] {1, 1}, 2).feasible);
    }

    /** Feasible, complementary, and the point a non-negative combination of the rows: necessary and sufficient. */
    @Test
    void theConditionsOfOptimalityHoldOverManyDraws() {
        SplittableRandom random = new SplittableRandom(7);
        int solvedCount = 0;
        double worst = 0;
        for (int draw = 0; draw < 5000; draw++) {
            int size = 2 + random.nextInt(4);
            int count = 1 + random.nextInt(10);
            double[][] rows = new double[count][size];
            double[] limits = new double[count];
            double scale = Math.pow(10, 4 * random.nextDouble() - 2);
            for (int i = 0; i < count; i++) {
                for (int k = 0; k < size; k++) {
                    rows[i][k] = random.nextDouble() - 0.5;
                }
                limits[i] = scale * (random.nextDouble() - 0.7);
            }
            LeastDistance solved = LeastDistance.of(rows, limits, size);
            if (!solved.feasible) {
                continue;
            }
            solvedCount++;
            for (double x : solved.point) {
                // Nearly contradictory rows meet far away: rounding is relative to that distance.
                scale = Math.max(scale, Math.abs(x));
            }
            double[] combination = new double[size];
            for (int i = 0; i < count; i++) {
                double slack = -limits[i];
                for (int k = 0; k < size; k++) {
                    slack += rows[i][k] * solved.point[k];
                    combination[k] += solved.multipliers[i] * rows[i][k];
                }
                assertTrue(solved.multipliers[i] >= 0);
                worst = Math.max(worst, -slack / scale);
                worst = Math.max(worst, Math.abs(slack * solved.multipliers[i]) / (scale * scale));
            }
            for (int k = 0; k < size; k++) {
                worst = Math.max(worst, Math.abs(combination[k] - solved.point[k]) / scale);
            }
        }
        System.out.println("least distance: " + solvedCount + " of 5000 draws solvable, worst condition " + worst);
        assertTrue(solvedCount > 3000);
        assertEquals(0, worst, 1e-9);
    }
}
