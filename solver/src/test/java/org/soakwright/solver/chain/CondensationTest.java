package org.soakwright.solver.chain;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Locale;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.soakwright.solver.shape.Axis;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.stage.Bath;
import org.soakwright.solver.stage.Bathing;
import org.soakwright.solver.stage.Conditions;
import org.soakwright.solver.stage.Mesh;
import org.soakwright.solver.stage.Product;
import org.soakwright.solver.stage.Ritz;
import org.soakwright.solver.stage.Surface;

/**
 * What the modes that are not there would have held joins the liquor at once, and the quickest that are there follow it. How fast the
 * error of that falls is known beforehand, and is what is found.
 */
class CondensationTest {
    private static final double LENGTH = 0.01;
    private static final double DIFFUSIVITY = 1e-9;

    /** A slab of content 1 in as much empty liquor as its capacity, Fo 0.3, cut into equal elements. */
    private static double errorOfMean(Axis axis, int elements, int degree) {
        double seconds = 0.3 * LENGTH * LENGTH / DIFFUSIVITY;
        Grade grade = new Grade(axis, LENGTH, 1);
        Bath.Vessel vessel = new Bath.Vessel(1, 0);
        Conditions conditions = new Conditions(DIFFUSIVITY, 1, new Surface.Open(), vessel);
        double[] ends = new double[elements + 1];
        for (int i = 0; i <= elements; i++) {
            ends[i] = (double) i / elements;
        }
        Product product = new Product(
                grade, conditions, List.of(new Ritz(axis, new Mesh(ends, degree), Double.POSITIVE_INFINITY)));
        double joined = product.missing() / (1 + product.missing());
        double[] begin = product.uniform().clone();
        for (int n = 0; n < begin.length; n++) {
            begin[n] *= 1 - joined;
        }
        double liquor = new Bathing(List.of(product), vessel, seconds)
                .pass(new double[][] {begin}, joined)
                .liquor();
        Stage stage = new Stage(DIFFUSIVITY, 1, new Surface.Open(), new Surroundings.Vessel(1, 0, 0, 0), 0);
        double exact = Chain.of(List.of(grade), new Start.Uniform(1), List.of(stage))
                .follow(seconds)
                .value(new Probe.Liquor(), 0);
        return Math.abs(liquor - exact);
    }

    /**
     * Twice the degree, as for any mean that Galerkin's method finds (Strang and Fix, An Analysis of the Finite Element Method, 1973,
     * chapter 6; from memory). Waves cut off and condensed reach the third order only.
     */
    @Test
    void parabolasInEqualElementsErrByTheFourthPowerOfTheirSize() {
        for (Axis axis : Axis.values()) {
            double before = errorOfMean(axis, 8, 2);
            double last = 0;
            for (int elements : new int[] {16, 32, 64}) {
                double error = errorOfMean(axis, elements, 2);
                last = Math.log(before / error) / Math.log(2);
                before = error;
            }
            double order = last;
            System.out.printf(Locale.ROOT, "condensation, %s: observed order %.2f%n", axis, order);
            assertTrue(order > 3.9 && order < 4.2, () -> axis + ": observed order " + order);
        }
    }

    @Test
    void theErrorFallsTenfoldWithEveryDegree() {
        for (Axis axis : Axis.values()) {
            double before = errorOfMean(axis, 2, 3);
            for (int degree = 4; degree <= 7; degree++) {
                double error = errorOfMean(axis, 2, degree);
                double ratio = before / error;
                int at = degree;
                assertTrue(
                        ratio > 8 || error < 1e-12, () -> axis + ", degree " + at + ": only " + ratio + " times less");
                before = error;
            }
        }
    }

    @Test
    void tooFineAWishIsAnsweredCoarserAndTheErrorSaysSo() {
        Grade brick = new Grade(
                List.of(
                        new org.soakwright.solver.shape.Side(Axis.SLAB, 0.03),
                        new org.soakwright.solver.shape.Side(Axis.SLAB, 0.05),
                        new org.soakwright.solver.shape.Side(Axis.SLAB, 0.1)),
                0.01,
                1);
        Stage dip = new Stage(1e-9, 1, new Surface.Open(), new Surroundings.Vessel(0.02, 0, 0, 0), 0);
        List<Start> starts = List.of(new Start.Uniform(1));
        RitzChain chain = new RitzChain(List.of(brick), starts, List.of(dip), Set.of());
        RitzCourse course = chain.follow(0.02);
        assertTrue(course.modes(0) <= Fineness.MOST_UNKNOWNS, () -> "unknowns " + course.modes(0));
        // One after the other: each axis alone is exact, and so early the three layers hardly meet.
        Reading mean = course.read(new Probe.Mean(0), 0);
        double layers = 2 * Math.sqrt(1e-9 * 0.02 / Math.PI);
        double lost = 1 - (1 - layers / 0.03) * (1 - layers / 0.05) * (1 - layers / 0.1);
        assertTrue(mean.error() > 1e-9, () -> "stated " + mean.error());
        assertTrue(
                Math.abs(1 - mean.value() - lost) < mean.error() + 2e-6,
                () -> "lost " + (1 - mean.value()) + ", short-time law " + lost + ", stated error " + mean.error());
    }
}
