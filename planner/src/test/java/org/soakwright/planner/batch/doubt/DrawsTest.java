package org.soakwright.planner.batch.doubt;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.apache.commons.math3.distribution.NormalDistribution;
import org.junit.jupiter.api.Test;

class DrawsTest {
    @Test
    void theSameSizeGivesTheSameNumbers() {
        Draws one = new Draws(3, 4, 64);
        Draws other = new Draws(3, 4, 64);
        for (int i = 0; i < one.size(); i++) {
            assertArrayEquals(one.normals(i), other.normals(i));
        }
    }

    /** 64 points of one round in 64 equal cells of probability, by every number: one in each. */
    @Test
    void everyRoundPutsOneSampleInEachCell() {
        Draws draws = new Draws(5, 3, 64);
        NormalDistribution normal = new NormalDistribution();
        for (int r = 0; r < 3; r++) {
            for (int j = 0; j < 5; j++) {
                boolean[] met = new boolean[64];
                for (int i = 0; i < 64; i++) {
                    met[(int) (64 * normal.cumulativeProbability(draws.normals(64 * r + i)[j]))] = true;
                }
                for (boolean cell : met) {
                    assertTrue(cell);
                }
            }
        }
    }

    @Test
    void roundsDiffer() {
        Draws draws = new Draws(1, 2, 8);
        for (int i = 0; i < 8; i++) {
            assertTrue(draws.normals(i)[0] != draws.normals(8 + i)[0]);
        }
    }

    /** The mean of exp(z/2) is exp(1/8): independent samples would err by 6e-3, these by a twentieth. */
    @Test
    void meansAreFarBetterThanThoseOfIndependentSamples() {
        Draws draws = new Draws(4, 20, 512);
        double sum = 0;
        for (int i = 0; i < draws.size(); i++) {
            sum += Math.exp(0.5 * draws.normals(i)[2]);
        }
        assertEquals(Math.exp(0.125), sum / draws.size(), 3e-4);
    }

    @Test
    void thereAreNoDirectionsForMoreThanAThousandNumbers() {
        assertThrows(IllegalArgumentException.class, () -> new Draws(1001, 1, 1));
    }
}
