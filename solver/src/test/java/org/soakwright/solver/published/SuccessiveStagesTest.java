package org.soakwright.solver.published;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.soakwright.solver.published.Dimensionless.CORE;
import static org.soakwright.solver.published.Dimensionless.LIQUOR;
import static org.soakwright.solver.published.Dimensionless.MEAN;
import static org.soakwright.solver.published.Dimensionless.assertHonest;
import static org.soakwright.solver.published.Dimensionless.chain;
import static org.soakwright.solver.published.Dimensionless.closedBath;
import static org.soakwright.solver.published.Dimensionless.plenty;

import java.math.BigDecimal;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.soakwright.solver.chain.Chain;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Probe;
import org.soakwright.solver.chain.Stage;
import org.soakwright.solver.chain.Start;
import org.soakwright.solver.chain.Surroundings;
import org.soakwright.solver.shape.Axis;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.stage.Surface;

/** Profiles carried from stage to stage, against references of 15 to 30 digits. */
class SuccessiveStagesTest {
    /** Absolute, contents starting at 1: ten units in the last place of the start. */
    private static final double CARRIED = 2.2e-15;

    @ParameterizedTest(name = "{0} alpha {1} Bi {2} X {3} fill {4}")
    @CsvFileSource(resources = "successive-fills.csv", useHeadersInDisplayName = true)
    void equalFillsLeaveWhatTwentyDigitsSay(
            Axis axis, double alpha, double biot, double x, int fill, BigDecimal mean, BigDecimal bath) {
        Stage[] fills = Collections.nCopies(fill, closedBath(biot, alpha, 0)).toArray(Stage[]::new);
        double[] seconds = new double[fill];
        Arrays.fill(seconds, x);
        Course course = chain(axis, 1, fills).follow(seconds);
        assertHonest(mean, course.read(MEAN, fill - 1), CARRIED, "mean");
        assertHonest(bath, course.read(LIQUOR, fill - 1), CARRIED, "bath");
    }

    /** A second bath that met pieces evened out at their mean would leave 0.5236; true is 0.5678. */
    @Test
    void aSecondFillIsNotAFirstFillOfEvenedOutPieces() {
        Stage fill = closedBath(Double.POSITIVE_INFINITY, 1, 0);
        Course course = chain(Axis.SLAB, 1, fill, fill).follow(0.1, 0.1);
        double one = course.value(MEAN, 0);
        assertEquals(0.523567493, one * one, 0.5e-9);
        assertEquals(0.567777543, course.value(MEAN, 1), 0.5e-9);
    }

    @ParameterizedTest(name = "{0} Bi {1} X {2} then {3}")
    @CsvFileSource(resources = "soak-then-rinse.csv", useHeadersInDisplayName = true)
    void aRinseTakesBackWhatSuperpositionSays(
            Axis axis, double biot, double x1, double x2, double soaked, double rinsed, double core) {
        Course course = chain(axis, 0, plenty(biot, 1), plenty(biot, 0)).follow(x1, x2);
        assertEquals(soaked, course.value(MEAN, 0), CARRIED);
        assertEquals(rinsed, course.value(MEAN, 1), CARRIED);
        assertEquals(core, course.value(CORE, 1), CARRIED);
    }

    @ParameterizedTest(name = "{0} stage {1} {2} {3}")
    @CsvFileSource(resources = "shared-baths.csv", useHeadersInDisplayName = true)
    void gradesThatShareTheirBathsAreRightToFourteenDigits(
            SharedBaths lot, int stage, Quantity quantity, int grade, BigDecimal value) {
        assertHonest(value, lot.follow().read(quantity.probe(grade), stage), 2 * CARRIED, "content");
    }

    /** The cases that shared-baths.py states. */
    enum SharedBaths {
        FILM_BATH_SHORT,
        FILM_BATH_MIDDLE,
        FILM_BATH_LONG,
        CHAIN;

        Course follow() {
            return switch (this) {
                case FILM_BATH_SHORT -> filmBath().follow(0.03);
                case FILM_BATH_MIDDLE -> filmBath().follow(0.2);
                case FILM_BATH_LONG -> filmBath().follow(1.5);
                case CHAIN -> soakRinseRestAndBath().follow(0.15, 0.08, 0.05, 0.12);
            };
        }
    }

    enum Quantity {
        MEAN,
        CORE,
        SURFACE,
        LIQUOR;

        Probe probe(int grade) {
            return switch (this) {
                case MEAN -> new Probe.Mean(grade);
                case CORE -> new Probe.At(grade, 0);
                case SURFACE -> new Probe.At(grade, 1);
                case LIQUOR -> new Probe.Liquor();
            };
        }
    }

    private static Chain filmBath() {
        return Chain.of(
                List.of(new Grade(Axis.SLAB, 1, 1), new Grade(Axis.SPHERE, 0.6, 0.5)),
                new Start.Uniform(1),
                List.of(new Stage(1, 1.7, new Surface.Film(3.4), new Surroundings.Vessel(2.5, 0.05, 0, 0), 0)));
    }

    private static Chain soakRinseRestAndBath() {
        List<Grade> lot = List.of(
                new Grade(Axis.SLAB, 1, 1), new Grade(Axis.CYLINDER, 0.8, 0.7), new Grade(Axis.SPHERE, 1.3, 0.4));
        Stage soak = new Stage(1, 1.5, new Surface.Film(4), new Surroundings.Vessel(2, 0.4, 0, 0), 0.3);
        Stage rinse = new Stage(1.6, 0.8, new Surface.Film(6), new Surroundings.Vessel(1.2, 0.02, 5, 0.1), 0.25);
        Stage rest = new Stage(1.1, 0.8, new Surface.Sealed(), new Surroundings.Rest(), 0);
        Stage bath = new Stage(0.9, 1.2, new Surface.Open(), new Surroundings.Vessel(3, 0, 0, 0), 0);
        return Chain.of(lot, new Start.Uniform(1), List.of(soak, rinse, rest, bath));
    }
}
