package org.soakwright.solver.published;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.soakwright.solver.published.Dimensionless.CORE;
import static org.soakwright.solver.published.Dimensionless.MEAN;
import static org.soakwright.solver.published.Dimensionless.assertRelative;
import static org.soakwright.solver.published.Dimensionless.film;
import static org.soakwright.solver.published.Dimensionless.leached;
import static org.soakwright.solver.published.Dimensionless.plenty;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.soakwright.solver.chain.Chain;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Stage;
import org.soakwright.solver.chain.Start;
import org.soakwright.solver.chain.Surroundings;
import org.soakwright.solver.shape.Axis;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.shape.Side;

/**
 * Short cylinders, bars and bricks in surroundings that they do not change: what is left is the product of what each axis alone would
 * leave (Newman, Transactions of the American Institute of Chemical Engineers 27 (1931) 203 and 310, the print from memory). Every
 * example is also followed after a closed bath in equilibrium with the pieces, which changes nothing but how they are computed.
 */
class FiniteShapesTest {
    private static final double ICE_POINT = 273.15;

    /** Of the starting difference: what polynomials may lose of means and of profiles that have had time to even out. */
    private static final double AFTER_A_BATH = 1e-8;

    /** The same at the core soon after the beginning. */
    private static final double CORE_SOON = 1e-6;

    /** How the pieces come to the surroundings. */
    enum Before {
        NOTHING,
        BATH;

        /** What may be lost of so many digits of a content that starts so far from its end. */
        double allowed(double digits, double difference) {
            return digits + (this == BATH ? AFTER_A_BATH * Math.abs(difference) : 0);
        }
    }

    private static Side slab(double half) {
        return new Side(Axis.SLAB, half);
    }

    private static Side cylinder(double radius) {
        return new Side(Axis.CYLINDER, radius);
    }

    /** The end of the last stage, of pieces with a uniform content. */
    private static Course follow(Before before, double start, Stage stage, double seconds, Side... sides) {
        List<Grade> lot = List.of(new Grade(List.of(sides), 1, 1));
        if (before == Before.NOTHING) {
            return Chain.of(lot, new Start.Uniform(start), List.of(stage)).follow(seconds);
        }
        Surroundings bath = new Surroundings.Vessel(1, start / stage.partition(), 0, 0);
        Stage still = new Stage(
                stage.diffusivity(), stage.partition(), stage.surfaces().of(0), bath, 0);
        return Chain.of(lot, new Start.Uniform(start), List.of(still, stage)).follow(seconds, seconds);
    }

    /** A body with a film in surroundings of another temperature: see {@link HeatingExamplesTest}. */
    private static Course heated(
            Before before,
            double diffusivity,
            double hOverConductivity,
            double start,
            double around,
            double seconds,
            Side... sides) {
        Surroundings surroundings = new Surroundings.Plenty(around + ICE_POINT);
        Stage stage = new Stage(diffusivity, 1, film(hOverConductivity * diffusivity), surroundings, 0);
        return follow(before, start + ICE_POINT, stage, seconds, sides);
    }

    private static double core(Course course) {
        return course.value(CORE, course.size() - 1);
    }

    private static double mean(Course course) {
        return course.value(MEAN, course.size() - 1);
    }

    /** On the cut along both sides of a short cylinder. */
    private static double at(Course course, double radially, double axially) {
        return course.section(0, course.size() - 1, 0, 1, new double[] {radially}, new double[] {axially})[0][0];
    }

    /** The table's spheres are no factors of anything. */
    @ParameterizedTest(name = "{0} X {1}")
    @CsvFileSource(resources = "newman.csv", useHeadersInDisplayName = true)
    void whatIsLeftIsNewmansProduct(Axis axis, double x, double left, double centre) {
        if (axis == Axis.SPHERE) {
            return;
        }
        Stage leach = plenty(Double.POSITIVE_INFINITY, 0);
        Side first = new Side(axis, 1);
        for (Before before : Before.values()) {
            Course twice = follow(before, 1, leach, x, first, slab(1));
            double slabMean = leached(Axis.SLAB, Double.POSITIVE_INFINITY, x).value(MEAN, 0);
            double slabCore = leached(Axis.SLAB, Double.POSITIVE_INFINITY, x).value(CORE, 0);
            // Twelve digits tabulated.
            assertEquals(left * slabMean, mean(twice), before.allowed(5e-12 * left, 1), "mean");
            double core = core(twice);
            assertEquals(centre * slabCore, core, 5e-12 * centre + (before == Before.BATH ? CORE_SOON : 0), "core");
            double stated = twice.read(CORE, twice.size() - 1).error();
            assertEquals(centre * slabCore, core, 5e-12 * centre + stated, "core, by what it states");
        }
        if (axis == Axis.SLAB) {
            assertRelative(
                    left * left * left, mean(follow(Before.NOTHING, 1, leach, x, first, first, first)), 2e-11, "cube");
        }
    }

    /** Products recomputed from the exact series (mpmath, twelve digits). */
    @ParameterizedTest
    @EnumSource
    void bricksAndShortCylindersLoseWhatTheirProductsSay(Before before) {
        double x = 0.1;
        Stage leach = plenty(Double.POSITIVE_INFINITY, 0);
        double digits = before.allowed(0.6e-12, 1);
        assertEquals(0.266066811885, mean(follow(before, 1, leach, x, slab(1), slab(1), slab(1))), digits, "cube");
        assertEquals(0.465574083861, mean(follow(before, 1, leach, x, slab(1), slab(2), slab(3))), digits, "brick");
        double filmed = mean(follow(before, 1, plenty(2, 0), x, slab(1), slab(2), slab(3)));
        assertEquals(0.772474195780, filmed, digits, "brick behind films of Bi 2, 4 and 6");
        assertEquals(0.119087643130, mean(follow(before, 1, leach, x, cylinder(1), slab(0.5))), digits, "squat");
        assertEquals(0.253524654548, mean(follow(before, 1, leach, x, cylinder(1), slab(1))), digits, "square");
        assertEquals(0.323849949879, mean(follow(before, 1, leach, x, cylinder(1), slab(2))), digits, "tall");
    }

    /**
     * Geankoplis, Transport Processes and Unit Operations, 3rd ed., Example 5.3-4, p 347: the can of puree of Example 5.3-3 with its
     * ends exposed too. The printed 106.6 deg C is 1.8 low, like that of 5.3-3, and is not asserted.
     */
    @ParameterizedTest
    @EnumSource
    void aCanOfPureeIsHeatedFromItsEndsToo(Before before) {
        Side[] can = {cylinder(34.05e-3), slab(50.8e-3)};
        Course course = heated(before, 2.007e-7, 4540 / 0.830, 29.4, 115.6, 2700, can);
        double allowed = before.allowed(0.5e-6, 86.2);
        assertEquals(108.390565 + ICE_POINT, core(course), allowed);
        // The recomputed factors of the two axes.
        assertEquals(0.110474 * 0.757064, (115.6 + ICE_POINT - core(course)) / 86.2, 1e-6);
    }

    /**
     * Cengel, Heat and Mass Transfer, Examples 4.8 and 4.9: a brass cylinder, 10 cm wide and 12 cm high, cools in air for 15 min.
     * Printed from charts: 63 and 62.2 deg C at its centre and at the middle of its top.
     */
    @ParameterizedTest
    @EnumSource
    void aShortBrassCylinderCools(Before before) {
        Side[] brass = {cylinder(0.05), slab(0.06)};
        Course course = heated(before, 3.39e-5, 60 / 110.0, 120, 25, 900, brass);
        double allowed = before.allowed(0.5e-6, 95);
        assertEquals(62.731689 + ICE_POINT, core(course), allowed);
        assertEquals(62.122584 + ICE_POINT, at(course, 0, 1), allowed);
        assertEquals(0.607632964, (120 + ICE_POINT - mean(course)) / 95, before.allowed(0.6e-9, 1));
        assertEquals(63 + ICE_POINT, core(course), 0.5);
        assertEquals(62.2 + ICE_POINT, at(course, 0, 1), 0.1);
    }

    /**
     * Holman, Heat Transfer, Examples 4-9 and 4-10: an aluminium cylinder of 5 cm by 10 cm cools for a minute; read at half its
     * radius, 0.625 cm from an end. The printed 104.5 deg C and 0.649 are chart readings and are not asserted.
     */
    @ParameterizedTest
    @EnumSource
    void anAluminiumCylinderCools(Before before) {
        Side[] aluminium = {cylinder(0.025), slab(0.05)};
        Course course = heated(before, 8.4e-5, 525 / 215.0, 200, 70, 60, aluminium);
        assertEquals(108.190920 + ICE_POINT, at(course, 0.5, 0.875), before.allowed(0.6e-6, 130));
        assertEquals(0.700761494, (200 + ICE_POINT - mean(course)) / 130, before.allowed(0.6e-9, 1));
    }

    /**
     * Brodkey and Hershey, Transport Phenomena, Example 13.6, p 684: a short cylinder of 25.4 by 30.48 mm. Printed from charts, 0.42
     * and 0.75, each read to about 0.02.
     */
    @ParameterizedTest
    @EnumSource
    void aShortCylindersCentreIsTheProductOfTwoCharts(Before before) {
        Side[] sides = {cylinder(12.7e-3), slab(15.24e-3)};
        Stage stage = new Stage(1, 1, film(20 / 0.481), new Surroundings.Plenty(0), 0);
        double centre = core(follow(before, 1, stage, 1.7448e-4, sides));
        assertEquals(0.301161724, centre, before.allowed(0.6e-9, 1));
        assertEquals(0.42 * 0.75, centre, 0.02 * (0.42 + 0.75));
    }

    /**
     * Incropera and DeWitt, Fundamentals of Heat and Mass Transfer, the quenched steel cylinder of 80 by 60 mm (section 5.7; data and
     * print from memory): 405 K at its centre, 372 K at the middle of a face, 365 K half-way up its side, from
     * charts read to about 0.01 in each factor.
     */
    @ParameterizedTest
    @EnumSource
    void aSteelCylinderIsQuenched(Before before) {
        Side[] steel = {cylinder(0.04), slab(0.03)};
        double zero = -ICE_POINT;
        Course course = heated(before, 17.4 / (7900 * 526), 500 / 17.4, 600 + zero, 300 + zero, 180, steel);
        double allowed = before.allowed(0.6e-6, 300);
        double chart = 300 * 0.01 * 1.3;
        List<Double> exact = List.of(402.746247, 370.544298, 362.427134);
        List<Double> printed = List.of(405.0, 372.0, 365.0);
        List<Double> found = new ArrayList<>(List.of(core(course), at(course, 0, 1), at(course, 1, 0)));
        for (int i = 0; i < 3; i++) {
            assertEquals(exact.get(i), found.get(i), allowed);
            assertEquals(printed.get(i), found.get(i), chart);
        }
    }
}
