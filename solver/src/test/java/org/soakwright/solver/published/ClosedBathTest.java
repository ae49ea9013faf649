package org.soakwright.solver.published;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.soakwright.solver.published.Dimensionless.LIQUOR;
import static org.soakwright.solver.published.Dimensionless.MEAN;
import static org.soakwright.solver.published.Dimensionless.assertRelative;
import static org.soakwright.solver.published.Dimensionless.bathModes;
import static org.soakwright.solver.published.Dimensionless.chain;
import static org.soakwright.solver.published.Dimensionless.closedBath;
import static org.soakwright.solver.published.Dimensionless.lot;
import static org.soakwright.solver.published.Dimensionless.plainModes;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.aggregator.ArgumentsAccessor;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.shape.Axis;
import org.soakwright.solver.stage.Bath;
import org.soakwright.solver.stage.Conditions;
import org.soakwright.solver.stage.Modes;
import org.soakwright.solver.stage.Surface;

/**
 * Uptake from a well-stirred bath of limited volume: Crank, The Mathematics of Diffusion, 2nd ed. 1975, ch. 4 to 6
 * (tables from memory, recomputed). His alpha is the bath's volume over K times the pieces' volume, K = content of the
 * piece over content of the liquor, as here.
 */
class ClosedBathTest {
    private static final double PAST_SIX_ROOTS = 500;

    /** Half a unit in the last of the 15 digits tabulated is at most 5e-15; the rest is the solver's rounding. */
    private static final double FIFTEEN_DIGITS = 6e-15;

    @ParameterizedTest(name = "{0} final fraction {1}")
    @CsvFileSource(resources = "finite-bath-roots.csv", useHeadersInDisplayName = true)
    void theRootsAreThoseOfCranksTables(ArgumentsAccessor row) {
        double fraction = row.getDouble(1);
        Modes modes = withFinalFraction(row.get(0, Axis.class), fraction);
        // Where pieces keep a share of the solute, the mode at rest comes first; it is no root of Crank's.
        int first = fraction == 0 ? 0 : 1;
        assertTrue(modes.upTo(PAST_SIX_ROOTS) >= first + 6);
        for (int n = 0; n < 6; n++) {
            double root = Math.sqrt(modes.rate(first + n));
            assertRelative(row.getDouble(2 + n), root, FIFTEEN_DIGITS, "root " + n);
            assertTrue(unitsApart(row.getDouble(8 + n), root) <= 1, "printed root " + n);
        }
    }

    /** Counted in the print's fourth decimal, after rounding: 34 of the 198 cells are one off. */
    private static long unitsApart(double printed, double value) {
        return Math.abs(Math.round(1e4 * printed) - Math.round(1e4 * value));
    }

    private static Modes withFinalFraction(Axis axis, double fraction) {
        if (fraction == 0) {
            return plainModes(axis, Double.POSITIVE_INFINITY);
        }
        if (fraction == 1) {
            // A bath that can hold nothing is no bath: the surface is sealed.
            return new Modes(lot(axis), new Conditions(1, 1, new Surface.Sealed(), new Bath.Unlimited()));
        }
        return bathModes(axis, Double.POSITIVE_INFINITY, (1 - fraction) / fraction);
    }

    @ParameterizedTest(name = "{0} alpha {1} Bi {2}")
    @CsvFileSource(resources = "bath-and-film-roots.csv", useHeadersInDisplayName = true)
    void aFilmMovesTheRootsAsItShould(ArgumentsAccessor row) {
        Modes modes = bathModes(row.get(0, Axis.class), row.getDouble(2), row.getDouble(1));
        assertTrue(modes.upTo(PAST_SIX_ROOTS) >= 7);
        assertEquals(0, modes.rate(0));
        for (int n = 0; n < 6; n++) {
            assertRelative(row.getDouble(3 + n), Math.sqrt(modes.rate(1 + n)), FIFTEEN_DIGITS, "root " + n);
        }
    }

    @ParameterizedTest(name = "{0} alpha {1} X {2}")
    @CsvFileSource(resources = "finite-bath-uptake.csv", useHeadersInDisplayName = true)
    void emptyPiecesTakeUpCranksShareOfABath(Axis axis, double alpha, double x, double uptake) {
        Course course =
                chain(axis, 0, closedBath(Double.POSITIVE_INFINITY, alpha, 1)).follow(x);
        double atLast = alpha / (1 + alpha);
        assertEquals(uptake, course.value(MEAN, 0) / atLast, 2e-15 + 0.5e-15);
        assertEquals(1 - uptake / (1 + alpha), course.value(LIQUOR, 0), 2e-15 + 0.5e-15);
    }
}
