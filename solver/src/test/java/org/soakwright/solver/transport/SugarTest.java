package org.soakwright.solver.transport;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.soakwright.solver.transport.Check.ICE_POINT;
import static org.soakwright.solver.transport.Check.assertRefused;
import static org.soakwright.solver.transport.Check.assertRelative;
import static org.soakwright.solver.transport.Check.texts;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class SugarTest {
    private static final Solution SUGAR = Solution.sugar();
    private static final double ROOM = ICE_POINT + 20;

    /**
     * CRC Handbook of Chemistry and Physics, 102nd ed., concentrative properties at 20 C (read): kg/m3, mPa s, mol/L.
     */
    @ParameterizedTest
    @CsvSource({
        "0.01, 1002.1, 1.028, 0.029", "0.05, 1017.8, 1.146, 0.149", "0.10, 1038.1, 1.336, 0.303",
        "0.15, 1059.2, 1.592, 0.464", "0.20, 1081.0, 1.945, 0.632", "0.30, 1127.0, 3.187, 0.988",
        "0.40, 1176.5, 6.162, 1.375", "0.44, 1197.2, 8.596, 1.539", "0.50, 1229.5, 15.431, 1.796",
        "0.60, 1286.4, 58.487, 2.255", "0.70, 1347.2, 481.561, 2.755"
    })
    void sugarSolutionIsThatOfTheHandbook(double fraction, double density, double viscosity, double molarity) {
        assertRelative(density, SUGAR.density(fraction, ROOM).value(), 3e-4, "density");
        assertRelative(1e-3 * viscosity, SUGAR.viscosity(fraction, ROOM).value(), 3e-2, "viscosity");
        assertEquals(molarity, 1e-3 * SUGAR.molarity(fraction, ROOM).value(), 1e-3, "mol/L");
    }

    /** Laliberté 2009 (read), density measured up to 50 %, 15 C to 55 C: another fit of other measurements. */
    @ParameterizedTest
    @CsvSource({"15", "25", "35", "45", "55"})
    void warmSyrupIsAsHeavyAsAnotherFitSays(double celsius) {
        for (double fraction = 0; fraction <= 0.5; fraction += 0.05) {
            Quantity density = SUGAR.density(fraction, ICE_POINT + celsius);
            double other = Sugar.LALIBERTE.density(fraction, ICE_POINT + celsius);
            assertRelative(other, density.value(), 2.5e-4, "at " + fraction);
        }
    }

    /** An older edition of the same handbook (read as a public copy): mPa s of 20, 40 and 60 % by temperature. */
    @ParameterizedTest
    @CsvSource({
        "0, 3.804, 14.77, 238", "15, 2.267, 7.468, 74.6", "20, 1.960, 6.200, 56.5", "30, 1.504, 4.382, 33.78",
                "40, 1.193, 3.249, 21.28",
        "50, 0.970, 2.497, 14.01", "55, 0.884, 2.219, 11.67", "60, 0.808, 1.982, 9.83", "70, 0.685, 1.608, 7.15",
                "85, 0.550, 1.221, 4.73"
    })
    void viscosityIsWithinWhatItSays(double celsius, double of20, double of40, double of60) {
        double[] printed = {of20, of40, of60};
        for (int i = 0; i < printed.length; i++) {
            double fraction = 0.2 * (i + 1);
            Quantity viscosity = SUGAR.viscosity(fraction, ICE_POINT + celsius);
            assertRelative(1e-3 * printed[i], viscosity.value(), viscosity.within(), fraction + " at " + celsius);
        }
    }

    /** The older handbook's solubilities after Herzfeld (read as a public copy), mass percent. */
    @ParameterizedTest
    @CsvSource({"0, 64.18", "10, 65.58", "20, 67.09", "40, 70.42", "60, 74.18", "80, 78.36", "100, 82.97"})
    void soMuchSugarDissolves(double celsius, double percent) {
        Quantity saturation = SUGAR.saturation(ICE_POINT + celsius);
        assertRelative(percent / 100, saturation.value(), 1e-2, "saturation");
        assertTrue(saturation.within() >= 1e-2);
    }

    /**
     * Freezing points of the CRC Handbook (read), K below 0 C, turned into the activity over ice as in {@link
     * BrineTest}; the correlation is of 25 C, which sugar hardly notices.
     */
    @ParameterizedTest
    @CsvSource({"0.10, 0.63", "0.20, 1.47", "0.30, 2.64", "0.42, 4.93"})
    void sugarSolutionFreezesWhereItsWaterActivitySays(double fraction, double depression) {
        double ice = Math.pow(10, -(0.004207 * depression + 2.1e-6 * depression * depression));
        assertRelative(ice, SUGAR.waterActivity(fraction, ICE_POINT).value(), 2e-3, "activity");
    }

    /** Saturated syrup of 25 C has a water activity of 0.84 to 0.85 (food chemistry, from memory). */
    @Test
    void saturatedSyrupKeepsMostOfItsWaterActivity() {
        assertEquals(
                0.845,
                SUGAR.waterActivity(SUGAR.saturation(298.15).value(), 298.15).value(),
                0.01);
    }

    @Test
    void withoutSugarItIsWater() {
        assertRelative(Water.density(300).value(), SUGAR.density(0, 300).value(), 1e-15, "density");
        assertRelative(Water.viscosity(300).value(), SUGAR.viscosity(0, 300).value(), 1e-15, "viscosity");
        assertEquals(1, SUGAR.waterActivity(0, 300).value());
    }

    @Test
    void moreSugarIsHeavierThickerAndDrierAcrossTheBlend() {
        for (double t = 274; t < 373; t += 9) {
            for (double w = 0; w < 0.84; w += 0.002) {
                double next = w + 0.002;
                assertTrue(SUGAR.density(next, t).value() > SUGAR.density(w, t).value());
                assertTrue(SUGAR.waterActivity(next, t).value()
                        < SUGAR.waterActivity(w, t).value());
                double rise =
                        SUGAR.viscosity(next, t).value() / SUGAR.viscosity(w, t).value();
                assertTrue(rise > 1 && (w > 0.6 || rise < 1.05), "by " + rise + " at " + w + ", " + t + " K");
            }
        }
    }

    @Test
    void aContentTellsTheFractionThatHasIt() {
        for (double celsius : new double[] {0, 20, 100}) {
            for (double fraction : new double[] {0, 0.01, 0.3, 0.67, 0.85}) {
                double content = SUGAR.content(fraction, ICE_POINT + celsius).value();
                assertEquals(
                        fraction, SUGAR.fraction(content, ICE_POINT + celsius).value(), 1e-15);
            }
        }
    }

    @Test
    void hotAndOverfullSyrupIsCautioned() {
        assertEquals(List.of(), SUGAR.fluid(0.2, ROOM).cautions());
        assertEquals(
                List.of(
                        "temperature 343.15 K is outside 288.15 to 328.15 K, the range of the viscosity of sugar solution "
                                + "(Laliberté 2009)"),
                texts(SUGAR.fluid(0.2, ICE_POINT + 70).cautions()));
        assertEquals(List.of(), SUGAR.fluid(0.6, ICE_POINT + 70).cautions());
        assertEquals(
                List.of("mass fraction 0.75 is outside 0 to 0.66718, the range of what stays dissolved"),
                texts(SUGAR.fluid(0.75, ROOM).cautions()));
    }

    @Test
    void whatIsNotSyrupIsRefused() {
        assertRefused(
                "mass fraction must be from 0 to 0.85 for sugar solution, found 0.9", () -> SUGAR.density(0.9, ROOM));
    }
}
