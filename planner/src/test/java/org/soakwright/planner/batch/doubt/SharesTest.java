package org.soakwright.planner.batch.doubt;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.function.ToDoubleFunction;
import java.util.stream.IntStream;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.junit.jupiter.api.Test;

class SharesTest {
    private static final NormalDistribution NORMAL = new NormalDistribution();

    private static double[] shares(Draws draws, ToDoubleFunction<double[]> function) {
        double[] values = new double[draws.size()];
        for (int i = 0; i < values.length; i++) {
            values[i] = function.applyAsDouble(draws.normals(i));
        }
        return new Shares(draws, IntStream.range(0, values.length).toArray()).of(values);
    }

    /**
     * T. Ishigami and T. Homma, An importance quantification technique in uncertainty analysis for computer models, ISUMA '90 (1990) 398-403: sin x1 + 7 sin^2 x2 + 0.1
     * x3^4 sin x1, each even from -pi to pi. The variances are integrals in closed form: V1 = (1 + b pi^4/5)^2/2, V2 = a^2/8, V3 = 0, V = a^2/8 + b pi^4/5 + b^2
     * pi^8/18 + 1/2; as shares 0.3139, 0.4424 and 0.
     */
    @Test
    void sharesOfIshigamisFunction() {
        double pi4 = Math.pow(Math.PI, 4);
        double whole = 49.0 / 8 + 0.1 * pi4 / 5 + 0.01 * pi4 * pi4 / 18 + 0.5;
        double[] exact = {Math.pow(1 + 0.1 * pi4 / 5, 2) / 2 / whole, 49.0 / 8 / whole, 0};
        assertArrayEquals(new double[] {0.3139, 0.4424, 0}, exact, 5e-5);
        double[] found = shares(new Draws(3, 20, 512), z -> {
            double[] x = Arrays.stream(z)
                    .map(one -> Math.PI * (2 * NORMAL.cumulativeProbability(one) - 1))
                    .toArray();
            return Math.sin(x[0]) + 7 * Math.pow(Math.sin(x[1]), 2) + 0.1 * Math.pow(x[2], 4) * Math.sin(x[0]);
        });
        assertArrayEquals(exact, found, 2e-3);
        assertEquals(0, found[2]);
    }

    /** I. M. Sobol's product of (|4 u - 2| + a)/(1 + a): each variance 1/(3 (1 + a)^2), the whole the product of 1 plus each, less 1. */
    @Test
    void sharesOfSobolsFunction() {
        double[] a = {0, 1, 4.5, 9, 99, 99, 99, 99};
        double whole = -1
                + Arrays.stream(a)
                        .map(one -> 1 + 1 / (3 * (1 + one) * (1 + one)))
                        .reduce(1, (x, y) -> x * y);
        double[] exact = Arrays.stream(a)
                .map(one -> 1 / (3 * (1 + one) * (1 + one)) / whole)
                .toArray();
        double[] found = shares(new Draws(8, 20, 512), z -> {
            double product = 1;
            for (int j = 0; j < a.length; j++) {
                product *= (Math.abs(4 * NORMAL.cumulativeProbability(z[j]) - 2) + a[j]) / (1 + a[j]);
            }
            return product;
        });
        assertArrayEquals(exact, found, 4e-3);
    }

    /** The logarithm of a product of lognormals: shares are the squares of the sigmas. */
    @Test
    void sharesOfAProductOfLognormals() {
        double[] sigma = {0.3, 0.2, 0.1, 0};
        double[] found = shares(new Draws(4, 20, 512), z -> 3 + 0.3 * z[0] - 0.2 * z[1] + 0.1 * z[2]);
        for (int j = 0; j < 4; j++) {
            assertEquals(sigma[j] * sigma[j] / 0.14, found[j], 2e-3);
        }
        assertEquals(0, found[3]);
        assertEquals(List.of(0, 1, 2), Shares.ranked(found));
        // Known the first, what remains is the root of 0.05.
        assertEquals(Math.sqrt(0.05 / 0.14), Shares.remaining(found[0]), 2e-3);
    }

    /** The product itself: (exp(s_j^2) - 1)/(exp(sum s^2) - 1); the rest is what values do together. */
    @Test
    void sharesOfTheProductItself() {
        double[] sigma = {0.5, 0.3, 0.1};
        double[] found = shares(new Draws(3, 20, 512), z -> Math.exp(0.5 * z[0] + 0.3 * z[1] + 0.1 * z[2]));
        for (int j = 0; j < 3; j++) {
            assertEquals(Math.expm1(sigma[j] * sigma[j]) / Math.expm1(0.35), found[j], 5e-3);
        }
        assertTrue(Arrays.stream(found).sum() < 1);
    }

    @Test
    void whatDoesNotVaryHasNoShares() {
        assertArrayEquals(new double[2], shares(new Draws(2, 4, 64), z -> 25));
    }

    /** With few samples of many numbers only straight lines are fitted. */
    @Test
    void fewSamplesTellTheLargestAllTheSame() {
        double[] found = shares(new Draws(12, 1, 512), z -> z[7] + 0.3 * z[2]);
        assertEquals(List.of(7, 2), Shares.ranked(found));
        assertEquals(1 / 1.09, found[7], 0.02);
    }
}
