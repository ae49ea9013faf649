package org.soakwright.solver.published;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Locale;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import org.junit.jupiter.api.Test;
import org.soakwright.solver.chain.Chain;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Probe;
import org.soakwright.solver.chain.Stage;
import org.soakwright.solver.chain.Start;
import org.soakwright.solver.chain.Surroundings;
import org.soakwright.solver.shape.Axis;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.shape.Side;
import org.soakwright.solver.stage.Surface;

/**
 * Slabs whose faces have different coefficients, against the classical series: H. S. Carslaw and J. C. Jaeger, Conduction of Heat in
 * Solids, 2nd edition, Oxford 1959, sections 3.10 and 3.11 (from memory; the same as case X33 of K. D. Cole, J. V. Beck,
 * A. Haji-Sheikh and B. Litkouhi, Heat Conduction Using Green's Functions, 2nd edition 2011, from memory): rates are squares of the roots of
 * tan b = b (B1 + B2)/(b^2 - B1 B2), waves cos b x + (B1/b) sin b x.
 */
class TwoFilmsTest {
    private static final GaussIntegrator RULE = new GaussIntegratorFactory().legendreHighPrecision(16);
    private static final double[] BIOTS = {1e-3, 0.05, 0.4, 1.3, 7, 60, 2e3};

    /** Of unit thickness, diffusivity and partition: coefficients are Biot numbers. */
    private static Chain slab(double back, double front, Start start) {
        Stage stage = new Stage(1, 1, faces(back, front), new Surroundings.Plenty(0), 0);
        return Chain.of(List.of(new Grade(List.of(Side.betweenFaces(1, 0)), 1, 1)), start, List.of(stage));
    }

    private static Surface faces(double back, double front) {
        return new Surface.Faces(face(back), face(front));
    }

    private static Surface face(double biot) {
        return biot == 0 ? new Surface.Sealed() : Double.isInfinite(biot) ? new Surface.Open() : new Surface.Film(biot);
    }

    /** The n-th root, n from 1, by bisection: the phase that the two films take, b - atan(B1/b) - atan(B2/b), rises through (n - 1) pi. */
    private static double root(double back, double front, int n) {
        double low = (n - 1) * Math.PI;
        double high = n * Math.PI;
        for (int i = 0; i < 200 && high - low > Math.ulp(high); i++) {
            double b = 0.5 * (low + high);
            double phase = b - Math.atan2(back, b) - Math.atan2(front, b);
            if (phase < (n - 1) * Math.PI) {
                low = b;
            } else {
                high = b;
            }
        }
        return 0.5 * (low + high);
    }

    @Test
    void theRootsAreThoseOfTheEquationWithTheTangent() {
        for (double back : BIOTS) {
            for (double front : BIOTS) {
                for (int n = 1; n <= 3; n++) {
                    double b = root(back, front, n);
                    double left = Math.sin(b) * (b * b - back * front);
                    double right = Math.cos(b) * b * (back + front);
                    assertEquals(left, right, 1e-12 * (b * b + back * front + b * (back + front)));
                }
            }
        }
    }

    @Test
    void theSlowestRateIsTheSquareOfTheFirstRoot() {
        double worst = 0;
        int pairs = 0;
        for (double back : BIOTS) {
            for (double front : BIOTS) {
                double b = root(back, front, 1);
                double next = root(back, front, 2);
                // So long that nothing else is left.
                double seconds = 45 / (next * next - b * b);
                Course course = slab(back, front, new Start.Uniform(1)).follow(seconds);
                double rate = -course.gradient(new Probe.Mean(0), 0)[0] / course.value(new Probe.Mean(0), 0);
                worst = Math.max(worst, Math.abs(rate / (b * b) - 1));
                pairs++;
            }
        }
        System.out.println(String.format(
                Locale.ROOT, "two films: slowest rates of %d pairs of Biot numbers within %.1e", pairs, worst));
        assertTrue(worst < 1e-13, "off by " + worst);
    }

    @Test
    void openAndSealedFacesAreLimitsOfTheSameEquation() {
        double open = Double.POSITIVE_INFINITY;
        assertEquals(Math.PI * Math.PI, rate(open, open), 1e-11);
        assertEquals(Math.PI * Math.PI / 4, rate(0, open), 1e-12);
        assertEquals(Math.PI * Math.PI / 4, rate(open, 0), 1e-12);
        for (double biot : BIOTS) {
            // b cot b = -B, and b tan b = B.
            double held = bisected(b -> b * Math.cos(b) + biot * Math.sin(b), Math.PI / 2, Math.PI);
            double sealed = bisected(b -> biot * Math.cos(b) - b * Math.sin(b), 0, Math.PI / 2);
            assertEquals(1, rate(open, biot) / (held * held), 1e-11);
            assertEquals(1, rate(biot, open) / (held * held), 1e-11);
            assertEquals(1, rate(0, biot) / (sealed * sealed), 1e-11);
            assertEquals(1, rate(biot, 0) / (sealed * sealed), 1e-11);
        }
    }

    private static double rate(double back, double front) {
        Course course = slab(back, front, new Start.Uniform(1)).follow(7);
        return -course.gradient(new Probe.Mean(0), 0)[0] / course.value(new Probe.Mean(0), 0);
    }

    private static double bisected(java.util.function.DoubleUnaryOperator falling, double from, double to) {
        double low = from;
        double high = to;
        for (int i = 0; i < 100; i++) {
            double middle = 0.5 * (low + high);
            if (falling.applyAsDouble(middle) > 0) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return 0.5 * (low + high);
    }

    /** The whole series from a start that rises from back to front, at places across and as means. */
    @Test
    void profilesFollowTheSeries() {
        Start start = new Start.Polyline(List.of(new Start.Point(0, 20), new Start.Point(1, 80)));
        double worst = 0;
        for (double back : BIOTS) {
            for (double front : BIOTS) {
                for (double seconds : new double[] {3e-3, 0.04, 0.5}) {
                    Course course = slab(back, front, start).follow(seconds);
                    for (double x : new double[] {0, 0.03, 0.2, 0.5, 0.77, 1}) {
                        double expected = series(back, front, seconds, x);
                        worst = Math.max(worst, Math.abs(course.profile(0, 0, x)[0] - expected) / 80);
                    }
                    double back0 = course.value(new Probe.At(0, 0), 0);
                    double front1 = course.value(new Probe.At(0, 1), 0);
                    assertEquals(0.5 * (back0 + front1), course.value(new Probe.Surface(0), 0), 1e-12);
                    assertEquals(course.profile(0, 0, 0.5)[0], course.value(new Probe.Core(0), 0), 1e-12);
                }
            }
        }
        System.out.println(String.format(Locale.ROOT, "two films: profiles off by %.1e of the start", worst));
        assertTrue(worst < 1e-11, "off by " + worst);
    }

    private static double series(double back, double front, double seconds, double x) {
        double sum = 0;
        for (int n = 1; n < 60; n++) {
            double b = root(back, front, n);
            if (b * b * seconds > 40) {
                break;
            }
            double weight = integral(y -> (20 + 60 * y) * wave(b, back, y), n);
            double norm = integral(y -> wave(b, back, y) * wave(b, back, y), n);
            sum += weight / norm * wave(b, back, x) * Math.exp(-b * b * seconds);
        }
        return sum;
    }

    /** Scaled so that a large Biot number at the back does no harm. */
    private static double wave(double b, double back, double x) {
        return (b * Math.cos(b * x) + back * Math.sin(b * x)) / (b + back);
    }

    private static double integral(java.util.function.DoubleUnaryOperator of, int waves) {
        double sum = 0;
        double half = 0.5 / waves;
        for (int p = 0; p < waves; p++) {
            for (int g = 0; g < RULE.getNumberOfPoints(); g++) {
                double y = (2 * p + 1 + RULE.getPoint(g)) * half;
                sum += half * RULE.getWeight(g) * of.applyAsDouble(y);
            }
        }
        return sum;
    }

    /** J. Crank, The Mathematics of Diffusion, 2nd edition, Oxford 1975, section 4.3 (from memory): a sealed face is a plane of symmetry. */
    @Test
    void withOneFaceSealedItIsHalfOfASlabTwiceAsThick() {
        for (double biot : new double[] {0.4, 7, Double.POSITIVE_INFINITY}) {
            Stage both = new Stage(1, 1, face(biot), new Surroundings.Plenty(0), 0);
            Chain doubled = Chain.of(
                    List.of(new Grade(List.of(Side.betweenFaces(2, 0)), 1, 1)), new Start.Uniform(100), List.of(both));
            Chain symmetrical = Chain.of(List.of(new Grade(Axis.SLAB, 1, 1)), new Start.Uniform(100), List.of(both));
            for (double seconds : new double[] {0.01, 0.1, 1}) {
                Course half = slab(0, biot, new Start.Uniform(100)).follow(seconds);
                Course whole = doubled.follow(seconds);
                Course waves = symmetrical.follow(seconds);
                assertEquals(waves.value(new Probe.Mean(0), 0), half.value(new Probe.Mean(0), 0), 1e-10);
                assertEquals(waves.value(new Probe.Mean(0), 0), whole.value(new Probe.Mean(0), 0), 1e-10);
                for (double x : new double[] {0, 0.3, 0.9, 1}) {
                    double expected = waves.profile(0, 0, x)[0];
                    assertEquals(expected, half.profile(0, 0, x)[0], 1e-6);
                    assertEquals(expected, whole.profile(0, 0, 0.5 + x / 2)[0], 1e-6);
                    assertEquals(expected, whole.profile(0, 0, 0.5 - x / 2)[0], 1e-6);
                }
            }
        }
    }
}
