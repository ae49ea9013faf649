package org.soakwright.solver.published;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.soakwright.solver.published.Dimensionless.CORE;
import static org.soakwright.solver.published.Dimensionless.MEAN;
import static org.soakwright.solver.published.Dimensionless.SURFACE;
import static org.soakwright.solver.published.Dimensionless.assertRelative;
import static org.soakwright.solver.published.Dimensionless.bathModes;
import static org.soakwright.solver.published.Dimensionless.chain;
import static org.soakwright.solver.published.Dimensionless.leached;
import static org.soakwright.solver.published.Dimensionless.plainModes;
import static org.soakwright.solver.published.Dimensionless.plenty;
import static org.soakwright.solver.published.Dimensionless.timeUntil;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.soakwright.solver.chain.Chain;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.shape.Axis;
import org.soakwright.solver.stage.Modes;

/**
 * Pieces in so much liquor that it does not change: Newman 1931; Crank 1975; the film condition of Carslaw and Jaeger
 * 1959.
 */
class UnlimitedLiquorTest {
    private static final double NO_FILM = Double.POSITIVE_INFINITY;

    @ParameterizedTest(name = "{0} X {1}")
    @CsvFileSource(resources = "newman.csv", useHeadersInDisplayName = true)
    void whatIsLeftIsNewmansE(Axis axis, double x, double mean, double core) {
        Course course = leached(axis, NO_FILM, x);
        assertRelative(mean, course.value(MEAN, 0), 5e-12, "E, twelve digits");
        assertRelative(core, course.value(CORE, 0), 5e-12, "Y at the core, twelve digits");
    }

    @ParameterizedTest(name = "{0} Bi {1} X {2}")
    @CsvFileSource(resources = "leaching-through-a-film.csv", useHeadersInDisplayName = true)
    void aFilmSlowsLeachingAsTabulated(Axis axis, double biot, double x, double mean, double core, double surface) {
        Course course = leached(axis, biot, x);
        // Fifteen digits tabulated; and where little is left, the rounding of the slowest rate times the duration.
        double relative = 5e-15 + 2e-15 * (1 - Math.log(mean));
        assertRelative(mean, course.value(MEAN, 0), relative, "mean");
        assertRelative(core, course.value(CORE, 0), relative, "core");
        assertRelative(surface, course.value(SURFACE, 0), relative, "surface");
    }

    @ParameterizedTest(name = "{0} {1}")
    @CsvFileSource(resources = "times-to-fraction.csv", useHeadersInDisplayName = true)
    void theTimeToLoseAFractionIsTheTabulatedOne(Axis axis, double fraction, double x) {
        Chain chain = chain(axis, 1, plenty(NO_FILM, 0));
        assertRelative(x, timeUntil(chain, MEAN, 1 - fraction, x / 2, 2 * x), 1e-12, "X");
    }

    /** Crank 1975, eq. 10.9: half of a slab is lost at D t / l^2 = 0.049, l its full thickness (from memory). */
    @Test
    void halfOfASlabIsLostAtCranksHalfTime() {
        double x = timeUntil(chain(Axis.SLAB, 1, plenty(NO_FILM, 0)), MEAN, 0.5, 0.1, 0.3);
        assertEquals(0.049, x / 4, 0.0005);
        assertEquals(0.0491826848809, x / 4, 0.5e-13);
    }

    @ParameterizedTest(name = "{0} X {1}")
    @CsvFileSource(resources = "short-times.csv", useHeadersInDisplayName = true)
    void shortTimeFormsHoldAsFarAsTabulated(
            Axis axis, double x, double uptake, double shortForm, double relativeError) {
        double found = 1 - leached(axis, NO_FILM, x).value(MEAN, 0);
        assertEquals(uptake, found, 2e-15);
        double root = Math.sqrt(x / Math.PI);
        double form = switch (axis) {
            case SLAB -> 2 * root;
            case CYLINDER -> 4 * root - x - x * Math.sqrt(x) / (3 * Math.sqrt(Math.PI));
            case SPHERE -> 6 * root - 3 * x;
        };
        assertRelative(shortForm, form, 1e-14, "the form itself");
        assertEquals(relativeError, form / found - 1, 5e-5 * Math.abs(relativeError) + 1e-13);
    }

    /**
     * Both have the roots (n - 1/2) pi. Carslaw and Jaeger 1959, ch. 3 and 9; both are 0.772311606859 at X = 0.2,
     * recomputed, to the digits of the table.
     */
    @ParameterizedTest
    @ValueSource(doubles = {0.01, 0.1, 0.2, 0.5, 1, 3})
    void theCoreOfASphereOfBiotOneIsTheCoreOfASlabWithoutFilm(double x) {
        double slab = leached(Axis.SLAB, NO_FILM, x).value(CORE, 0);
        assertRelative(slab, leached(Axis.SPHERE, 1, x).value(CORE, 0), 1e-14, "core");
        if (x == 0.2) {
            assertEquals(0.772311606859, slab, 0.5e-12);
        }
    }

    @Test
    void rootsWithoutFilmAreMultiplesOfPi() {
        Modes slab = plainModes(Axis.SLAB, NO_FILM);
        Modes sphere = plainModes(Axis.SPHERE, NO_FILM);
        Modes filmed = plainModes(Axis.SPHERE, 1);
        int roots = 30;
        double past = Math.pow((roots + 1) * Math.PI, 2);
        assertTrue(slab.upTo(past) >= roots && sphere.upTo(past) >= roots && filmed.upTo(past) >= roots);
        for (int n = 1; n <= roots; n++) {
            assertRelative((n - 0.5) * Math.PI, slab.frequency(0, n - 1), 3e-16, "slab");
            assertRelative((n - 0.5) * Math.PI, filmed.frequency(0, n - 1), 1e-15, "sphere of Bi 1");
            assertRelative(n * Math.PI, sphere.frequency(0, n - 1), 3e-16, "sphere");
        }
    }

    /**
     * tan q = -alpha q is Crank's slab bath (1975, ch. 4) and, with Bi = 1 + 1/alpha, the filmed sphere (1975, ch. 6).
     */
    @ParameterizedTest
    @ValueSource(doubles = {0.01, 0.25, 1, 4, 100})
    void aSlabInABathHasTheRootsOfASphereWithAFilm(double alpha) {
        Modes bath = bathModes(Axis.SLAB, NO_FILM, alpha);
        Modes sphere = plainModes(Axis.SPHERE, 1 + 1 / alpha);
        int roots = Math.min(bath.upTo(2000) - 1, sphere.upTo(2000));
        assertTrue(roots >= 13);
        for (int n = 0; n < roots; n++) {
            assertRelative(sphere.rate(n), bath.rate(1 + n), 2e-15, "rate " + n);
        }
    }

    /** The lumped rule "Bi < 0.1": at Bi 0.01 and X 50 the exact mean is 0.17 % above exp(-0.5). */
    @Test
    void theLumpedRuleIsAlmostRightAtSmallBiot() {
        double mean = leached(Axis.SLAB, 0.01, 50).value(MEAN, 0);
        assertEquals(0.6075383483, mean, 0.5e-10);
        assertEquals(-0.0017, Math.exp(-0.5) / mean - 1, 0.00005);
    }

    /** X to a share left, to the six digits given beside the chart readings of Treybal and Geankoplis. */
    @ParameterizedTest
    @CsvSource({
        "SLAB, 0.6, 0.125673, 0.128",
        "SLAB, 0.2, 0.567164, 0.568",
        "SLAB, 0.2, 0.567164, 0.56",
        "SPHERE, 0.2, 0.113519, 0.112",
        "SPHERE, 0.1, 0.182985, 0.18",
        "SPHERE, 0.030769230769230769, 0.302299, 0.30"
    })
    void chartReadingsOfNewmansCurvesAreWithinTwoPercent(Axis axis, double left, double x, double chart) {
        double found = timeUntil(chain(axis, 1, plenty(NO_FILM, 0)), MEAN, left, x / 2, 2 * x);
        assertEquals(x, found, 0.5e-6);
        assertRelative(found, chart, 0.02, "the chart");
    }
}
