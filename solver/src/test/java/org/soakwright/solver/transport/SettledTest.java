package org.soakwright.solver.transport;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.soakwright.solver.transport.Check.ICE_POINT;
import static org.soakwright.solver.transport.Check.assertRelative;

import java.util.function.DoubleFunction;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.function.Executable;

class SettledTest {
    private static final Solution BRINE = Solution.brine();
    private static final double COLD = ICE_POINT + 8;
    private static final Body PLATE = new Body.Plate(0.15);
    private static final Medium LIQUOR = new Medium(BRINE.fluid(0.02, COLD), 1e-9);

    private static Estimate film(double difference) {
        return Film.still(PLATE, LIQUOR, new Buoyancy(difference));
    }

    /** A slab gives as much as its film takes: inside, D K over half the thickness; contents in kg/m3 of liquor. */
    private static double left(double film) {
        double inside = 5e-10 / 0.01;
        double surface = (inside * 150 + film * 20) / (inside + film);
        double heavy =
                BRINE.density(BRINE.fraction(surface, COLD).value(), COLD).value();
        double light = BRINE.density(BRINE.fraction(20, COLD).value(), COLD).value();
        return heavy - light;
    }

    @Test
    void filmAndDifferenceAgree() {
        Settled settled = Settled.of(SettledTest::film, SettledTest::left, 50);
        double coefficient = settled.estimate().coefficient();
        double step = Settled.ROUNDING * 50 / settled.densityDifference();
        assertRelative(left(coefficient), settled.densityDifference(), step, "difference");
        double searched = new BrentSolver(1e-15, 1e-12).solve(200, x -> left(film(x).coefficient()) - x, 1e-6, 100);
        assertRelative(searched, settled.densityDifference(), 1e-9, "another search");
        assertTrue(settled.evaluations() < 60, "evaluations " + settled.evaluations());
    }

    @Test
    void whereItStartsDoesNotMatter() {
        double from = Settled.of(SettledTest::film, SettledTest::left, 1e-6).densityDifference();
        for (double first : new double[] {0, 1, 100, 1e4}) {
            assertRelative(
                    from,
                    Settled.of(SettledTest::film, SettledTest::left, first).densityDifference(),
                    1e-8,
                    "from");
        }
    }

    @Test
    void nothingToGiveSettlesAtNothing() {
        assertEquals(0, Settled.of(SettledTest::film, k -> 0, 10).densityDifference(), 1e-10);
        assertEquals(1, Settled.of(SettledTest::film, k -> 0, 0).evaluations());
    }

    @Test
    void whatRunsAwayIsGivenUp() {
        DoubleFunction<Estimate> films = SettledTest::film;
        double once = film(1).coefficient();
        DoubleUnaryOperator feeding = k -> Math.pow(k / once, 8) + 1;
        assertGivenUp("density difference did not settle within ", () -> Settled.of(films, feeding, 1));
        assertGivenUp(
                "density difference did not settle within 200 evaluations; last ",
                () -> Settled.of(films, k -> 100 * Math.pow(once / k, 40), 1));
    }

    private static void assertGivenUp(String message, Executable call) {
        String found = String.valueOf(assertThrows(NotSettled.class, call).getMessage());
        assertTrue(found.startsWith(message), found);
    }

    @Test
    void whatIsNoDifferenceIsGivenUp() {
        NotSettled error = assertThrows(NotSettled.class, () -> Settled.of(SettledTest::film, k -> Double.NaN, 1));
        assertEquals("density difference did not settle within 1 evaluations; last NaN kg/m3", error.getMessage());
        assertThrows(NotSettled.class, () -> Settled.of(SettledTest::film, k -> -1, 1));
    }
}
