package org.soakwright.planner.batch.doubt;

import org.apache.commons.math3.distribution.NormalDistribution;
import org.apache.commons.math3.random.SobolSequenceGenerator;

/**
 * Standard normal numbers, several for each sample, spread evenly: Sobol's sequence (Joe and Kuo's directions), in several rounds of the same
 * points, each scrambled digit by digit (A. B. Owen, Randomly permuted (t,m,s)-nets and (t,s)-sequences, 1995): a digit is turned or not by
 * chance, for each row of digits before it anew. A round is unbiased and independent of the others, so that what rounds disagree in tells the error of
 * sampling. Always the same numbers for the same size.
 */
public final class Draws {
    /** What the sequence has directions for. */
    public static final int MOST_DIMENSIONS = 1000;

    private static final long SEED = 19_670_403L;
    private static final int BITS = 52;
    /** Digits beyond these no two points of a round share the digits before: all are turned at once. */
    private static final int NESTED = 20;

    private static final double SCALE = 0x1p52;
    private static final NormalDistribution NORMAL = new NormalDistribution(null, 0, 1);

    private final int rounds;
    private final double[][] normals;

    /**
     * Draws.
     *
     * @param dimensions numbers for each sample
     * @param rounds independent rounds, at least 1
     * @param perRound samples of a round, best a power of two
     */
    public Draws(int dimensions, int rounds, int perRound) {
        if (dimensions < 1 || dimensions > MOST_DIMENSIONS || rounds < 1 || perRound < 1) {
            throw new IllegalArgumentException("no draws of " + rounds + " rounds of " + perRound + " samples of "
                    + dimensions + " numbers; at most " + MOST_DIMENSIONS);
        }
        this.rounds = rounds;
        normals = new double[rounds * perRound][dimensions];
        long[][] points = points(dimensions, perRound);
        for (int r = 0; r < rounds; r++) {
            for (int j = 0; j < dimensions; j++) {
                long seed = mixed(mixed(SEED + r) + j);
                for (int i = 0; i < perRound; i++) {
                    // The middle of the last digit's cell: never 0 or 1.
                    double uniform = (scrambled(points[i][j], seed) + 0.5) / SCALE;
                    normals[r * perRound + i][j] = NORMAL.inverseCumulativeProbability(uniform);
                }
            }
        }
    }

    private static long scrambled(long point, long seed) {
        long turned = 0;
        for (int bit = 0; bit < NESTED; bit++) {
            int place = BITS - 1 - bit;
            long before = point >>> (place + 1);
            // A leading one keeps rows of zeros of different lengths apart.
            long coin = mixed(seed ^ mixed(before | 1L << bit)) >>> (Long.SIZE - 1);
            turned |= coin << place;
        }
        long rest = mixed(seed ^ mixed(~(point >>> (BITS - NESTED)))) >>> (Long.SIZE - (BITS - NESTED));
        return point ^ turned ^ rest;
    }

    /** A number like chance from another: the finaliser of SplitMix64 (G. L. Steele, D. Lea and C. H. Flood, 2014). */
    private static long mixed(long from) {
        long z = from + 0x9E3779B97F4A7C15L;
        z = (z ^ (z >>> 30)) * 0xBF58476D1CE4E5B9L;
        z = (z ^ (z >>> 27)) * 0x94D049BB133111EBL;
        return z ^ (z >>> 31);
    }

    private static long[][] points(int dimensions, int count) {
        SobolSequenceGenerator sequence = new SobolSequenceGenerator(dimensions);
        long[][] points = new long[count][dimensions];
        for (long[] point : points) {
            double[] next = sequence.nextVector();
            for (int j = 0; j < dimensions; j++) {
                point[j] = (long) (next[j] * SCALE);
            }
        }
        return points;
    }

    /** Samples of all rounds. */
    public int size() {
        return normals.length;
    }

    public int rounds() {
        return rounds;
    }

    /** Numbers for each sample. */
    public int dimensions() {
        return normals[0].length;
    }

    /** The numbers of a sample, from 0; rounds one after the other. */
    public double[] normals(int sample) {
        return normals[sample].clone();
    }

    double normal(int sample, int dimension) {
        return normals[sample][dimension];
    }
}
