package org.soakwright.recipes.parsing;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.stream.DoubleStream;
import org.junit.jupiter.api.Test;

class SampleTest {
    private static Sample alike(double... sizes) {
        return new Sample(DoubleStream.of(sizes)
                .mapToObj(size -> new Sample.Piece(size, 1, 1))
                .toList());
    }

    private static Sample drawn(long seed, int pieces, double median, double sigma) {
        Random random = new Random(seed);
        List<Sample.Piece> drawn = new ArrayList<>();
        for (int i = 0; i < pieces; i++) {
            drawn.add(new Sample.Piece(median * Math.exp(sigma * random.nextGaussian()), 1, 1));
        }
        return new Sample(drawn);
    }

    @Test
    void theMedianIsTheGeometricMean() {
        // Logarithms to base 2 are 0, 1, 2, 3, 4: mean 2, standard deviation sqrt(2.5).
        Sample.Lognormal fitted = alike(16, 1, 4, 2, 8).lognormal();
        assertEquals(4, fitted.median(), 1e-14);
        assertEquals(Math.sqrt(2.5) * Math.log(2), fitted.sigma(), 1e-14);
    }

    @Test
    void aPieceOfDoubleWeightCountsInTheMedianAsTwo() {
        Sample weighed = new Sample(List.of(new Sample.Piece(2, 2, 1), new Sample.Piece(16, 1, 1)));
        assertEquals(alike(2, 2, 16).lognormal().median(), weighed.lognormal().median(), 1e-14);
        assertEquals(3, alike(2, 2, 16).worth(), 1e-14);
        assertEquals(9.0 / 5, weighed.worth(), 1e-14, "(2 + 1)^2 / (4 + 1), Kish (Survey Sampling, 1965)");
    }

    @Test
    void onePieceThatOutweighsAllOthersStillHasASpread() {
        // Of two pieces, whatever they weigh, half the square of their difference.
        Sample lopsided = new Sample(List.of(new Sample.Piece(1, 1e6, 1), new Sample.Piece(1.2, 1e-6, 1)));
        assertEquals(Math.log(1.2) / Math.sqrt(2), lopsided.lognormal().sigma(), 1e-5);
        Sample hopeless = new Sample(List.of(new Sample.Piece(1, 1e9, 1), new Sample.Piece(1.2, 1e-9, 1)));
        assertTrue(hopeless.lognormal().sigma() <= Math.log(1.2), "at the end of the digits it stays within the sizes");
    }

    @Test
    void whatWasDrawnFromALognormalIsFound() {
        for (long seed = 1; seed <= 20; seed++) {
            Sample.Lognormal fitted = drawn(seed, 20_000, 0.018, 0.2).lognormal();
            // Four standard errors: sigma / sqrt(n) of the logarithm, sigma / sqrt(2 n) of sigma.
            assertEquals(0, Math.log(fitted.median() / 0.018), 4 * 0.2 / Math.sqrt(20_000));
            assertEquals(0.2, fitted.sigma(), 4 * 0.2 / Math.sqrt(40_000));
        }
    }

    @Test
    void fiveInAHundredTrueLognormalsAreCalledDoubtful() {
        // What Lilliefors' limit says of itself. 2000 samples of 40: the rate's standard error is half a hundredth.
        int doubtful = 0;
        for (long seed = 1; seed <= 2000; seed++) {
            Sample sample = drawn(seed, 40, 0.018, 0.2);
            double limit = 0.895 / (Math.sqrt(40) - 0.01 + 0.85 / Math.sqrt(40));
            doubtful += sample.gap(List.of(sample.lognormal())) > limit ? 1 : 0;
        }
        assertEquals(0.05, doubtful / 2000.0, 0.015);
    }

    @Test
    void twoKindsOfPiecesAreNoLognormal() {
        List<Sample.Piece> mixed = new ArrayList<>(drawn(1, 100, 0.010, 0.03).pieces());
        mixed.addAll(drawn(2, 100, 0.020, 0.03).pieces());
        Sample sample = new Sample(mixed);
        assertTrue(sample.gap(List.of(sample.lognormal())) > 0.2);
        List<Sample.Lognormal> sorted =
                sample.split(2).stream().map(Sample::lognormal).toList();
        assertEquals(0.010, sorted.get(0).median(), 0.0001);
        assertEquals(0.020, sorted.get(1).median(), 0.0002);
        assertTrue(sample.gap(sorted) < 0.06, "sorted into two grades they are described");
    }

    @Test
    void theGapIsCountedOnBothSidesOfEachPiece() {
        // A step of one half at the median of the fit: from 0 to 1/2 just before, from 1/2 to 1 just after.
        Sample sample = alike(1, 1, 1, 1, 1);
        assertEquals(0.5, sample.gap(List.of(new Sample.Lognormal(1, 0.1))), 1e-15);
        assertEquals(0, sample.gap(List.of(sample.lognormal())), "all alike are described by one size");
    }

    @Test
    void partsHaveEqualMassAndGoFromSmallToLarge() {
        Random random = new Random(7);
        for (int trial = 0; trial < 500; trial++) {
            List<Sample.Piece> pieces = new ArrayList<>();
            int count = 5 + random.nextInt(60);
            for (int i = 0; i < count; i++) {
                double mass = Math.exp(3 * random.nextGaussian());
                pieces.add(new Sample.Piece(1 + random.nextInt(20), mass, 1));
            }
            Sample whole = new Sample(pieces);
            int parts = 2 + random.nextInt(5);
            List<Sample> split = whole.split(parts);
            assertEquals(parts, split.size());
            double largest = 0;
            double rows = 0;
            for (Sample part : split) {
                assertEquals(whole.mass() / parts, part.mass(), 1e-10 * whole.mass());
                assertTrue(part.pieces().get(0).size() >= largest);
                largest = part.pieces().get(part.pieces().size() - 1).size();
                rows += part.pieces().stream().mapToDouble(Sample.Piece::part).sum();
            }
            assertEquals(count, rows, 1e-9, "no piece is lost and none counts twice");
        }
    }

    @Test
    void gradesOfALognormalHaveItsQuantilesAsMedians() {
        // Two halves of a lognormal: the mean of the half normal is sqrt(2 / pi) from the middle, its variance 1 - 2 /
        // pi.
        List<Sample> halves = drawn(3, 100_000, 1, 0.1).split(2);
        double shift = 0.1 * Math.sqrt(2 / Math.PI);
        assertEquals(-shift, Math.log(halves.get(0).lognormal().median()), 0.001);
        assertEquals(shift, Math.log(halves.get(1).lognormal().median()), 0.001);
        assertEquals(0.1 * Math.sqrt(1 - 2 / Math.PI), halves.get(0).lognormal().sigma(), 0.001);
    }
}
