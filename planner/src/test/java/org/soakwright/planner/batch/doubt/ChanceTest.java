package org.soakwright.planner.batch.doubt;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import org.junit.jupiter.api.Test;

class ChanceTest {
    /** Of ten thousand passes none says that the chance is 1: up to 1 - 0.025^(1/n) may fail. */
    @Test
    void allPassingIsNotCertainty() {
        boolean[] all = new boolean[10_000];
        Arrays.fill(all, true);
        Chance chance = Chance.of(all, 20);
        assertEquals(1, chance.value());
        assertEquals(1, chance.high());
        assertEquals(Math.pow(0.025, 1e-4), chance.low(), 1e-9);
    }

    /** Clopper and Pearson, The use of confidence or fiducial limits, Biometrika 26 (1934): for 1 of 10 at 95 %, 0.0025 to 0.4450 (from memory). */
    @Test
    void fewSamplesHaveTheIntervalOfIndependentOnes() {
        boolean[] one = new boolean[10];
        one[3] = true;
        Chance chance = Chance.of(one, 1);
        assertEquals(0.1, chance.value(), 1e-15);
        assertEquals(0.0025, chance.low(), 5e-5);
        assertEquals(0.4450, chance.high(), 5e-5);
    }

    /** A half-space of chance 0.3 by two numbers: intervals of other draws hold it about as often as they say. */
    @Test
    void theIntervalHoldsTheTruth() {
        double level = -0.5244005127080407;
        int held = 0;
        int tries = 60;
        double width = 0;
        Draws draws = new Draws(2 * tries, 20, 128);
        for (int t = 0; t < tries; t++) {
            boolean[] passes = new boolean[draws.size()];
            for (int i = 0; i < passes.length; i++) {
                double[] z = draws.normals(i);
                passes[i] = (z[2 * t] + z[2 * t + 1]) / Math.sqrt(2) <= level;
            }
            Chance chance = Chance.of(passes, 20);
            held += chance.low() <= 0.3 && 0.3 <= chance.high() ? 1 : 0;
            width += (chance.high() - chance.low()) / tries;
        }
        // Binomial of 60 at 0.95: 51 or fewer happen once in two hundred.
        assertTrue(held >= 52, "held " + held + " of " + tries);
        assertTrue(
                width < 0.7 * 2 * 1.96 * Math.sqrt(0.21 / 2560), "much narrower than of independent samples: " + width);
    }
}
