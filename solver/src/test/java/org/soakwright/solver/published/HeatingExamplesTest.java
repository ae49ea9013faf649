package org.soakwright.solver.published;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.soakwright.solver.published.Dimensionless.CORE;
import static org.soakwright.solver.published.Dimensionless.MEAN;
import static org.soakwright.solver.published.Dimensionless.SURFACE;
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
 * Worked examples of heating and cooling, which obey the same equation: temperature for content, thermal diffusivity
 * for D, K = 1, and h times diffusivity over conductivity for the film coefficient, so that Bi = h L / conductivity.
 * Each asserts the answer recomputed from the exact series (mpmath, all digits given) and, where the book's own is
 * neither a slip nor too coarse a reading, the printed one with the tolerance that its print or its chart supports.
 * The printed examples were read as worked solutions of the textbooks' problems.
 */
class HeatingExamplesTest {
    private static final double HOUR = 3600;
    private static final double MINUTE = 60;
    private static final double ICE_POINT = 273.15;

    /** A body, what it is made of and the film around it; temperatures in K. */
    private static Chain body(
            Axis axis, double length, double diffusivity, double hOverConductivity, double start, double around) {
        Surface film = new Surface.Film(hOverConductivity * diffusivity);
        Stage stage = new Stage(diffusivity, 1, film, new Surroundings.Plenty(around), 0);
        return Chain.of(List.of(new Grade(axis, length, 1)), new Start.Uniform(start), List.of(stage));
    }

    private static double kelvin(double celsius) {
        return celsius + ICE_POINT;
    }

    /**
     * Geankoplis, Transport Processes and Unit Operations, 3rd ed., Example 5.3-3, p 342: a can of pea puree, ends
     * insulated. The printed 104.4 C is a chart reading 1.7 K low and is not asserted.
     */
    @Test
    void aCanOfPureeIsHeatedInSteam() {
        Chain can = body(Axis.CYLINDER, 34.05e-3, 2.007e-7, 4540 / 0.830, kelvin(29.4), kelvin(115.6));
        assertEquals(kelvin(106.077), can.follow(0.75 * HOUR).value(CORE, 0), 0.5e-3);
    }

    /**
     * Geankoplis, 3rd ed., Example 5.3-2, p 338: butter of 46.2 mm, its top in warmer air. Printed from charts, the
     * unaccomplished change Y read to 0.01 of 19.5 K, temperatures to 0.1 K.
     */
    @Test
    void butterWarmsFromItsTop() {
        double thickness = 46.2e-3;
        double conductivity = 0.197;
        double diffusivity = conductivity / (998 * 2300);
        Course course = body(Axis.SLAB, thickness, diffusivity, 8.52 / conductivity, 277.6, 297.1)
                .follow(5 * HOUR);
        double chart = 0.01 * (297.1 - 277.6) + 0.05;

        double top = course.value(SURFACE, 0);
        assertEquals(292.389, top, 0.5e-3);
        assertEquals(292.2, top, chart);
        double within = course.value(new Probe.At(0, 1 - 25.4e-3 / thickness), 0);
        assertEquals(288.313, within, 0.5e-3);
        assertEquals(288.3, within, chart);
        double bottom = course.value(CORE, 0);
        assertEquals(287.169, bottom, 0.5e-3);
        assertEquals(287.4, bottom, chart);
    }

    /** Geankoplis, 3rd ed., Example 5.5-1, p 361: beef of 203 mm in air at 1.7 C until its centre is at 10 C. */
    @Test
    void beefIsChilled() {
        double conductivity = 0.498;
        double diffusivity = conductivity / (1073 * 3480);
        Chain beef = body(Axis.SLAB, 0.1015, diffusivity, 39.7 / conductivity, kelvin(37.8), kelvin(1.7));
        double seconds = timeUntil(beef, CORE, kelvin(10), HOUR, 100 * HOUR);
        assertEquals(18.6125, seconds / HOUR, 0.5e-4);
        assertEquals(0.867414, diffusivity * seconds / (0.1015 * 0.1015), 0.5e-6);
        // Printed 19.3 h: X = 0.90, which the chart gives 3.7 % too high.
        assertEquals(19.3, seconds / HOUR, 0.04 * 19.3);
    }

    /**
     * Incropera and DeWitt, Fundamentals of Heat and Mass Transfer, 6th ed., Example 5.4, p 278: a pipe wall warmed by
     * oil for 8 min.
     */
    @Test
    void aPipeWallWarms() {
        Course course = body(Axis.SLAB, 0.040, 18.8e-6, 500 / 63.9, kelvin(-20), kelvin(60))
                .follow(8 * MINUTE);
        double outside = course.value(CORE, 0);
        double inside = course.value(SURFACE, 0);
        assertEquals(kelvin(43.0175), outside, 0.5e-4);
        assertEquals(kelvin(45.3635), inside, 0.5e-4);
        assertEquals(-7318.23, 500 * (inside - kelvin(60)), 0.5e-2);
        // Printed 42.9 C and -7360 W/m2, with root, coefficient and ratio rounded to three decimals: together 0.13 K.
        assertEquals(kelvin(42.9), outside, 0.13);
        assertEquals(-7360, 500 * (inside - kelvin(60)), 0.13 * 500);
    }

    /**
     * Incropera and DeWitt, 6th ed., Example 5.5, p 280: a sphere of 5 mm in water. Its printed 3.1 s comes from
     * coarse tables: not asserted.
     */
    @Test
    void aSphereIsQuenched() {
        Chain sphere = body(Axis.SPHERE, 5e-3, 6.66e-6, 6000 / 20.0, kelvin(335), kelvin(20));
        assertEquals(2.97916, timeUntil(sphere, CORE, kelvin(50), 1, 10), 0.5e-5);
    }

    /**
     * Cengel, Heat and Mass Transfer, Example 4.3: an egg in water at 95 C until its centre is at 70 C; printed 14.4
     * min.
     */
    @Test
    void anEggIsBoiled() {
        Chain egg = body(Axis.SPHERE, 0.025, 0.151e-6, 1200 / 0.627, kelvin(5), kelvin(95));
        double minutes = timeUntil(egg, CORE, kelvin(70), 5 * MINUTE, 30 * MINUTE) / MINUTE;
        assertEquals(14.3578, minutes, 0.5e-4);
        assertEquals(14.4, minutes, 0.05);
    }

    /**
     * Cengel, Example 4.5: a shaft of 0.2 m cools from 600 C in a chamber at 200 C for 45 min (diffusivity 3.95e-6
     * m2/s from memory). The printed 360 C and 0.62 are chart readings.
     */
    @Test
    void aShaftCools() {
        Course shaft = body(Axis.CYLINDER, 0.1, 3.95e-6, 80 / 14.9, kelvin(600), kelvin(200))
                .follow(45 * MINUTE);
        assertEquals(kelvin(364.298), shaft.value(CORE, 0), 0.5e-3);
        assertEquals(0.635764, (kelvin(600) - shaft.value(MEAN, 0)) / 400, 0.5e-6);
    }

    /**
     * Geankoplis, 3rd ed., Example 5.4-1: a slab at 100, one face at 0 from the start, the other insulated, at X =
     * 0.12 and 0.11875.
     */
    @Test
    void aSlabWithOneColdFaceCools() {
        Stage stage = new Stage(1, 1, new Surface.Open(), new Surroundings.Plenty(0), 0);
        Chain slab = Chain.of(List.of(new Grade(Axis.SLAB, 1, 1)), new Start.Uniform(100), List.of(stage));
        assertNodes(slab.follow(0.12), 0.2, 0.5e-5, 31.66771, 58.46939, 77.50620, 88.32237, 91.75463);
        assertNodes(slab.follow(0.11875), 0.2, 0.5e-5, 31.82663, 58.72042, 77.76730, 88.55168, 91.96523);
        // Printed: Schmidt's method, 20 slices and 95 steps; its grid is good to a few tenths of 100.
        assertNodes(slab.follow(0.11875), 0.2, 0.12, 31.81, 58.72, 77.81, 88.64, 92.08);
    }

    /**
     * Geankoplis, 3rd ed., Example 5.4-3: the same with a film of Bi 2.5, X = 0.12; its five slices are good to 0.7 of
     * 100.
     */
    @Test
    void aSlabWithAFilmOnOneFaceCools() {
        Chain slab = body(Axis.SLAB, 1, 2e-5, 2.5, 100, 0);
        Course course = slab.follow(6000);
        assertNodes(course, 0, 0.5e-5, 46.71461, 67.45097, 82.27573, 91.39160, 96.01105, 97.38124);
        assertNodes(course, 0, 0.7, 46.09, 66.98, 82.06, 91.42, 96.19, 97.60);
    }

    /** Contents at a depth below the wetted face, and every 0.2 farther in. */
    private static void assertNodes(Course course, double depth, double tolerance, double... expected) {
        for (int i = 0; i < expected.length; i++) {
            double position = Math.max(0, 1 - depth - 0.2 * i);
            assertEquals(expected[i], course.value(new Probe.At(0, position), 0), tolerance, "node " + i);
        }
    }
}
