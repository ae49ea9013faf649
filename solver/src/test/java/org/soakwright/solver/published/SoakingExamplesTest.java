package org.soakwright.solver.published;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.soakwright.solver.published.Dimensionless.CORE;
import static org.soakwright.solver.published.Dimensionless.MEAN;
import static org.soakwright.solver.published.Dimensionless.SURFACE;
import static org.soakwright.solver.published.Dimensionless.assertRelative;
import static org.soakwright.solver.published.Dimensionless.timeUntil;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.soakwright.solver.chain.Chain;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Probe;
import org.soakwright.solver.chain.Stage;
import org.soakwright.solver.chain.Start;
import org.soakwright.solver.chain.Surroundings;
import org.soakwright.solver.shape.Axis;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.stage.Surface;

/**
 * Worked examples of leaching, uptake and drying. Each asserts the answer recomputed from the exact series (mpmath,
 * all digits given) and, where the book's own is neither a slip nor too coarse a reading, the printed one with the
 * tolerance that its print or its chart supports. The printed examples were read as worked solutions of the textbooks'
 * problems.
 */
class SoakingExamplesTest {
    private static final double HOUR = 3600;

    private static Chain leaching(Axis axis, double length, double start, double diffusivity, double liquor) {
        Stage stage = new Stage(diffusivity, 1, new Surface.Open(), new Surroundings.Plenty(liquor), 0);
        return Chain.of(List.of(new Grade(axis, length, 1)), new Start.Uniform(start), List.of(stage));
    }

    /**
     * Geankoplis, Transport Processes and Unit Operations, 3rd ed., Example 7.1-1, p 431: urea out of an agar slab of
     * 10.16 mm into water, K = 1. The printed centre, 0.0275, is read 9.6 % high from the chart and is not asserted.
     */
    @Test
    void ureaLeavesAgar() {
        double d = 4.72e-10;
        Course whole = leaching(Axis.SLAB, 5.08e-3, 0.1, d, 0).follow(10 * HOUR);
        assertEquals(0.0250806, whole.value(CORE, 0), 0.5e-7);
        assertEquals(0.0159668, whole.value(MEAN, 0), 0.5e-7);

        double halfway = whole.value(new Probe.At(0, 0.5), 0);
        assertEquals(0.0177347, halfway, 0.5e-7);
        // Printed 0.0172: the chart's Y = 0.172 is read to 0.01.
        assertEquals(0.0172, halfway, 0.001);

        double thinner =
                leaching(Axis.SLAB, 2.54e-3, 0.1, d, 0).follow(10 * HOUR).value(CORE, 0);
        assertEquals(0.000191701, thinner, 0.5e-9);
        // Printed 2.0e-4: the chart's Y = 0.0020 is read to 0.0001.
        assertEquals(2.0e-4, thinner, 0.1e-4);
    }

    /**
     * Geankoplis, 3rd ed., Example 7.1-2, p 431: a semi-infinite solid. His K is c_liquid/c_solid = 2, ours the
     * inverse, 0.5; our k/(K D) is his K kc/D. A slab of 0.2 m is deep enough: its far side has not noticed.
     */
    @Test
    void aDeepSolidTakesUpThroughAFilm() {
        double depth = 0.2;
        double k = 2e-7;
        double d = 4e-9;
        double partition = 1 / 2.0;
        double t = 3e4;
        Stage stage = new Stage(d, partition, new Surface.Film(k), new Surroundings.Plenty(0.1), 0);
        Course course = Chain.of(List.of(new Grade(Axis.SLAB, depth, 1)), new Start.Uniform(0.01), List.of(stage))
                .follow(t);
        assertEquals(0.01, course.value(CORE, 0), 1e-16);
        assertEquals(1.09545, k * Math.sqrt(d * t) / (partition * d), 0.5e-5);
        assertEquals(1.095, k * Math.sqrt(d * t) / (partition * d), 0.0005);

        double surface = course.value(SURFACE, 0);
        assertEquals(0.0338861, surface, 0.5e-7);
        assertEquals(0.0677722, surface / partition, 0.5e-7);
        double within = course.value(new Probe.At(0, 1 - 0.010 / depth), 0);
        assertEquals(0.0205691, within, 0.5e-7);
        // Printed 3.48e-2, 6.96e-2 and 2.04e-2, from the chart's 1 - Y = 0.62 and 0.26, good to 0.025 of a change of
        // 0.04.
        assertEquals(3.48e-2, surface, 0.1e-2);
        assertEquals(6.96e-2, surface / partition, 0.2e-2);
        assertEquals(2.04e-2, within, 0.1e-2);
    }

    /**
     * Geankoplis, 3rd ed., Example 9.9-1, p 553: wood of 25.4 mm dries from 0.29 to 0.09 in air at equilibrium with
     * 0.04.
     */
    @Test
    void woodDries() {
        Stage stage = new Stage(2.97e-6 / HOUR, 1, new Surface.Open(), new Surroundings.Air(0.04), 0);
        Chain chain = Chain.of(List.of(new Grade(Axis.SLAB, 12.7e-3, 1)), new Start.Uniform(0.29), List.of(stage));
        double hours = timeUntil(chain, MEAN, 0.09, 10 * HOUR, 100 * HOUR) / HOUR;
        assertEquals(30.8006, hours, 0.5e-4);
        assertEquals(30.8, hours, 0.05);
        // Printed from the chart 30.4 h, X = 0.56 read to 0.01.
        assertEquals(30.4, hours, 30.4 * 0.01 / 0.56);
    }

    /**
     * Geankoplis, 3rd ed., Example 9.9-2, p 555: a tapioca slab of 3 mm keeps 0.2 of its free moisture after 1.02 h.
     */
    @Test
    void tapiocaTellsItsDiffusivity() {
        double seconds = 1.02 * HOUR;
        double unit = timeUntil(leaching(Axis.SLAB, 1.5e-3, 1, 1, 0), MEAN, 0.2, 1e-7, 1e-5);
        double d = unit / seconds;
        assertEquals(3.47527e-10, d, 0.5e-15);
        // Printed 3.44e-10, X read to 0.01 of 0.56.
        assertRelative(3.44e-10, d, 0.01 / 0.56, "D");
    }

    /** Geankoplis, 3rd ed., Example 12.8-1, p 726: spheres of 2.0 mm give up 80 % in 3.11 h; how long for 1.5 mm? */
    @Test
    void smallerSeedsLeachSooner() {
        double d = timeUntil(leaching(Axis.SPHERE, 1e-3, 1, 1, 0), MEAN, 0.2, 1e-8, 1e-6) / (3.11 * HOUR);
        assertEquals(1.01392e-11, d, 0.5e-16);
        double hours = timeUntil(leaching(Axis.SPHERE, 0.75e-3, 1, d, 0), MEAN, 0.2, HOUR, 3 * HOUR) / HOUR;
        assertEquals(1.74937, hours, 0.5e-5);
        assertEquals(1.75, hours, 0.005);
    }

    /**
     * Treybal, Mass-Transfer Operations, Illustration 4.2, p 92: urea out of a gel slab of 30 mm through one face, 5
     * to 3 in 68 h.
     */
    @Test
    void aGelTellsItsDiffusivityAndTheTimeThroughOneFaceAndTwo() {
        double length = 0.03;
        double d = timeUntil(leaching(Axis.SLAB, length, 5, 1, 0), MEAN, 3, 1e-5, 1e-3) / (68 * HOUR);
        assertEquals(4.62034e-10, d, 0.5e-15);
        // Printed 4.70e-10: X = 0.128 from the chart, read to 0.005.
        assertRelative(4.70e-10, d, 0.005 / 0.128, "D");
        assertEquals(306.885, hoursTo1(length, d), 0.5e-3);

        double oneFace = hoursTo1(length, 4.70e-10);
        assertEquals(301.683, oneFace, 0.5e-3);
        assertEquals(302, oneFace, 0.5);
        double twoFaces = hoursTo1(length / 2, 4.70e-10);
        assertEquals(75.4208, twoFaces, 0.5e-4);
        assertEquals(75.5, twoFaces, 0.1);
        assertRelative(4, oneFace / twoFaces, 1e-12, "one face over two");
    }

    private static double hoursTo1(double length, double d) {
        return timeUntil(leaching(Axis.SLAB, length, 5, d, 0), MEAN, 1, 10 * HOUR, 1000 * HOUR) / HOUR;
    }

    /**
     * Treybal, Illustration 4.4, p 96: alumina spheres of 10 mm lose 90 % of their KCl in 4.75 h; then 90 % of their
     * K2CrO4, 0.28 g/cm3, into a stream that holds 0.02 g/cm3.
     */
    @Test
    void porousAluminaTellsItsTortuosity() {
        double radius = 5e-3;
        double chloride = timeUntil(leaching(Axis.SPHERE, radius, 1, 1, 0), MEAN, 0.1, 1e-7, 1e-4) / (4.75 * HOUR);
        double ratio = 1.84e-9 / chloride;
        assertEquals(2.67522e-10, chloride, 0.5e-15);
        assertEquals(6.87793, ratio, 0.5e-5);
        // Printed 2.63e-10 and 7.0: X = 0.18 from the chart, read to 0.005.
        assertRelative(2.63e-10, chloride, 0.005 / 0.18, "D");
        assertRelative(7.0, ratio, 0.005 / 0.18, "ratio");

        Chain chromate = leaching(Axis.SPHERE, radius, 280, 1.14e-9 / ratio, 20);
        double hours = timeUntil(chromate, MEAN, 28, HOUR, 100 * HOUR) / HOUR;
        assertEquals(12.6656, hours, 0.5e-4);
        // Printed 12.8 h: X = 0.30 and the ratio 7.0.
        assertRelative(12.8, hours, 0.005 / 0.30, "time");
    }
}
